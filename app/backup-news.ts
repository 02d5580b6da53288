import { backupStanding } from "@/db/server/backup-schedule";
import { database } from "@/db/server/connection";
import type { Person } from "@/db/server/sessions";
import { type BackupNews, backupNews } from "@/lib/report/backup-words";
import { mayBackUp } from "./access";

/** How it stands with the backups, for those whom it concerns; null for everybody else. */
export function backupNewsFor(person: Person): BackupNews | null {
  return mayBackUp(person) ? backupNews(backupStanding(database()), Date.now()) : null;
}
