import { z } from "zod";
import type { Refusal } from "@/lib/result";

/** Why a copy of the server's database was not made, or is not to be trusted. */
export type BackupFault = Refusal &
  (
    | { readonly type: "NoBackupFolder" }
    | { readonly type: "BackupFolderMissing"; readonly folder: string }
    | { readonly type: "BackupFolderIsDataFolder"; readonly folder: string }
    | { readonly type: "BackupFolderClosed"; readonly folder: string }
    | { readonly type: "BackupDiskFull"; readonly folder: string }
    | { readonly type: "BackupDamaged"; readonly found: string }
    | { readonly type: "FileDamaged"; readonly file: string }
    | { readonly type: "BackupFailed"; readonly message: string }
  );

/** How it stands with the backups of a server. */
export type BackupStanding = {
  readonly folder: string | null;
  readonly everyMinutes: number;
  readonly last: { readonly at: string; readonly file: string; readonly bytes: number } | null;
  /** something was done that is in no backup */
  readonly isDue: boolean;
  readonly isOnDataDisk: boolean;
  /** what the last try came to; null: all is well */
  readonly fault: BackupFault | null;
};

/** Backups missed in a row before it is called late. */
const LATE = 3;

/** Why there is no backup, as one plain sentence. */
export function backupFaultSentence(fault: BackupFault): string {
  switch (fault.type) {
    case "NoBackupFolder":
      return "No backup folder is set: BATTENBOOK_BACKUP_FOLDER names it.";
    case "BackupFolderMissing":
      return `There is no folder ${fault.folder}: is its disk connected?`;
    case "BackupFolderIsDataFolder":
      return `The backup folder ${fault.folder} is the folder of the database itself, or inside it.`;
    case "BackupFolderClosed":
      return `Nothing can be written into the backup folder ${fault.folder}.`;
    case "BackupDiskFull":
      return `The disk of the backup folder ${fault.folder} is full.`;
    case "BackupDamaged":
      return `The copy was not whole and was thrown away: ${fault.found}.`;
    case "FileDamaged":
      return `The file ${fault.file} is not what it was when it was added.`;
    case "BackupFailed":
      return `The backup failed: ${fault.message}.`;
  }
}

/** What somebody must hear about the backups at a time [ms since 1970]; empty: nothing. */
export function backupWarnings({ fault, last, isDue, isOnDataDisk, everyMinutes }: BackupStanding, now: number): string[] {
  const age = last === null ? 0 : now - Date.parse(last.at);
  const isLate = last !== null && isDue && age > LATE * everyMinutes * 60_000;
  return [
    ...(fault === null ? [] : [backupFaultSentence(fault)]),
    ...(last === null && isDue ? ["Nothing on this server is in a backup yet."] : []),
    ...(isLate ? [`The last backup is ${ageInWords(age)} old, and what came in since is in none.`] : []),
    ...(isOnDataDisk ? ["The backup folder is on the same disk as the database: if that disk fails, both are gone."] : []),
  ];
}

/** How long ago, as near as a person wants it: `12 min`, `3 h`, `2 days`. */
export function ageInWords(ms: number): string {
  const minutes = Math.max(0, Math.round(ms / 60_000));
  if (minutes < 120) return `${minutes} min`;
  const hours = Math.round(minutes / 60);
  return hours < 48 ? `${hours} h` : `${Math.round(hours / 24)} days`;
}

/** What a screen shows of the backups. */
export const backupNewsSchema = z.object({
  last: z.object({ at: z.string(), file: z.string(), bytes: z.number() }).nullable(),
  isDue: z.boolean(),
  everyMinutes: z.number(),
  canBackUp: z.boolean(),
  warnings: z.array(z.string()),
});
export type BackupNews = z.infer<typeof backupNewsSchema>;

/** The standing as a screen shows it at a time [ms since 1970]. */
export function backupNews(standing: BackupStanding, now: number): BackupNews {
  const { last, isDue, everyMinutes, folder } = standing;
  return { last, isDue, everyMinutes, canBackUp: folder !== null, warnings: backupWarnings(standing, now) };
}
