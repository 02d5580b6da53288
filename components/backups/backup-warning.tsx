"use client";

import type { BackupNews } from "@/lib/report/backup-words";
import { BackupWarnings } from "./backup-warnings";
import { useBackups } from "./use-backups";

/** Takes room on a page only while something is wrong with the backups; `first` is null for those whom it does not concern. */
export function BackupWarning({ first }: { first: BackupNews | null }) {
  return first === null ? null : <Watched first={first} />;
}

function Watched({ first }: { first: BackupNews }) {
  const { news } = useBackups(first);
  if (news.warnings.length === 0) return null;
  return (
    <div className="mb-4">
      <BackupWarnings warnings={news.warnings} />
    </div>
  );
}
