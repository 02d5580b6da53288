import { type BackupFault, type BackupStanding, backupFaultSentence } from "@/lib/report/backup-words";
import { type Result, refuse } from "@/lib/result";
import { areFilesDue, backUp, backUpFiles, faultOf } from "./backup";
import { backupSettings, folderFault, isOnDataDisk } from "./backup-folder";
import { type Backup, isBackupDue, lastBackup } from "./backups-made";
import { type Database, database } from "./connection";

type Made = Result<Backup, BackupFault>;
type Keeping = { timer: NodeJS.Timeout | null; running: Promise<Made> | null; fault: BackupFault | null };

/** From now on the database is copied into the backup folder every so often, while something was done since the last copy. */
export function startBackups(): void {
  const { folder, everyMinutes } = backupSettings();
  const shared = keeping();
  if (folder === null) console.warn(backupFaultSentence({ type: "NoBackupFolder" }));
  if (folder === null || shared.timer) return;
  shared.timer = setInterval(backUpIfDue, everyMinutes * 60_000).unref();
  backUpIfDue();
}

/** Makes a backup. One at a time: whoever asks while one is being made gets that one. */
export function backUpNow(): Promise<Made> {
  const shared = keeping();
  shared.running ??= made().finally(() => {
    shared.running = null;
  });
  return shared.running;
}

/** How it stands with the backups, as people are told. */
export function backupStanding(db: Database): BackupStanding {
  const { folder, everyMinutes } = backupSettings();
  const last = lastBackup(db);
  return {
    folder,
    everyMinutes,
    last: last ? { at: last.at, file: last.file, bytes: last.bytes } : null,
    isDue: isBackupDue(db) || (folder !== null && areFilesDue(folder)),
    isOnDataDisk: folder !== null && isOnDataDisk(folder),
    fault: folderFault(folder) ?? keeping().fault,
  };
}

async function made(): Promise<Made> {
  const { folder } = backupSettings();
  const at = new Date().toISOString();
  const backup: Made =
    folder === null
      ? refuse({ type: "NoBackupFolder" })
      : await backUp(database(), folder, at).catch((error) => refuse(faultOf(error, folder)));
  keeping().fault = backup.ok ? null : backup.refusal;
  if (!backup.ok) console.error(`No backup was made. ${backupFaultSentence(backup.refusal)}`);
  return backup;
}

function backUpIfDue(): void {
  try {
    const { folder } = backupSettings();
    if (isBackupDue(database())) void backUpNow();
    else if (folder !== null && areFilesDue(folder)) void filesNow(folder);
  } catch (error) {
    console.error("Whether a backup is due could not be found out:", error);
  }
}

async function filesNow(folder: string): Promise<void> {
  if (keeping().running) return;
  const fault = await backUpFiles(folder);
  keeping().fault = fault;
  if (fault) console.error(`Not every file is in the backup. ${backupFaultSentence(fault)}`);
}

// Next loads this module once per bundle: timer and handlers must share one
function keeping(): Keeping {
  const shared = globalThis as { battenbookBackups?: Keeping };
  shared.battenbookBackups ??= { timer: null, running: null, fault: null };
  return shared.battenbookBackups;
}
