"use client";

import { Sign } from "@/components/ui/sign";
import type { BackupNews } from "@/lib/report/backup-words";
import { useBackups } from "./use-backups";

/** A line above a page's own work, only while something is wrong with the backups; `first` is null for those whom it does not concern. */
export function BackupWarning({ first }: { first: BackupNews | null }) {
  return first === null ? null : <Watched first={first} />;
}

function Watched({ first }: { first: BackupNews }) {
  const { news } = useBackups(first);
  if (news.warnings.length === 0) return null;
  return (
    <p className="mb-3 flex items-baseline gap-2 text-redlead-text text-small">
      <Sign kind="alert" />
      <span>
        <b>Backup:</b> {news.warnings.join(" ")}
      </span>
    </p>
  );
}
