"use client";

import { useMinute } from "@/components/control/use-minute";
import { Button } from "@/components/ui/button";
import { Facts } from "@/components/ui/facts";
import { Notice } from "@/components/ui/notice";
import { Panel } from "@/components/ui/panel";
import { TimeOfDay } from "@/components/ui/time-of-day";
import { ageInWords, type BackupNews } from "@/lib/report/backup-words";
import { figure } from "@/lib/report/rounding";
import { BackupWarnings } from "./backup-warnings";
import { useBackups } from "./use-backups";

/** The last backup of this server, and one more at a press; nothing for those whom it does not concern. */
export function BackupPanel({ first }: { first: BackupNews | null }) {
  return first === null ? null : <Backups first={first} />;
}

function Backups({ first }: { first: BackupNews }) {
  const { news, backUp, busy, refused } = useBackups(first);
  return (
    <Panel title="Backup of this server" className="mt-6 max-w-hand" aside={news.isDue ? "not all is in it" : "all is in it"}>
      <div className="flex flex-col gap-4">
        <BackupWarnings warnings={news.warnings} />
        {news.last ? <LastBackup news={news} last={news.last} /> : null}
        {news.canBackUp ? (
          <div>
            <Button disabled={busy} onClick={backUp}>
              {busy ? "Backing up" : "Back up now"}
            </Button>
          </div>
        ) : null}
        {refused ? <Notice tone="refused">{refused}</Notice> : null}
      </div>
    </Panel>
  );
}

function LastBackup({ news, last }: { news: BackupNews; last: NonNullable<BackupNews["last"]> }) {
  const now = useMinute();
  return (
    <Facts
      facts={[
        ["Last backup", <TimeOfDay key="at" at={last.at} dated />],
        ["Age", now === null ? "–" : ageInWords(now - Date.parse(last.at))],
        ["Size", `${figure(last.bytes / 1e6, 1)} MB`],
        ["Looked through", "whole"],
        ["Done since", news.isDue ? `yes: in a backup within ${figure(news.everyMinutes, 0)} min` : "nothing"],
      ]}
    />
  );
}
