import { Notice } from "@/components/ui/notice";

/** What is wrong with the backups, a sentence each; nothing where all is well. */
export function BackupWarnings({ warnings }: { warnings: readonly string[] }) {
  if (warnings.length === 0) return null;
  return (
    <Notice tone="caution" title="Backup">
      <ul>
        {warnings.map((warning) => (
          <li key={warning}>{warning}</li>
        ))}
      </ul>
    </Notice>
  );
}
