import "server-only";
import { renameSync, rmSync, statSync } from "node:fs";
import path from "node:path";
import SqliteDatabase from "better-sqlite3";
import type { BackupFault } from "@/lib/report/backup-words";
import { answer, type Result, refuse } from "@/lib/result";
import { copyNamed, folderFault, tidyFolder } from "./backup-folder";
import { type Backup, noteBackup } from "./backups-made";
import type { Database } from "./connection";
import { filesFolder, makePrivateFile } from "./data-folder";
import { copyFiles, lackingFiles } from "./file-copies";
import { flushFile, flushFolder } from "./flushed";

const PAGES_AT_A_TIME = 100;

/**
 * Copies the database as it stands into the folder while work on it goes on, and the files beside it. The copy bears its name only
 * once it was found whole and is on the disk; then the older ones that are no longer kept go.
 */
export async function backUp(db: Database, folder: string, at: string): Promise<Result<Backup, BackupFault>> {
  const closed = folderFault(folder);
  if (closed) return refuse(closed);
  const copied = await copiedDatabase(db, folder, at);
  if (!copied.ok) return copied;
  noteBackup(db, copied.value);
  const fault = await backUpFiles(folder);
  return fault === null ? copied : refuse(fault);
}

/** Copies the files that the backup folder lacks; null: it has them all now. */
export async function backUpFiles(folder: string): Promise<BackupFault | null> {
  return folderFault(folder) ?? copyFiles(filesFolder(), copiesOfFiles(folder)).catch((error: unknown) => faultOf(error, folder));
}

/** Whether a photograph or certificate has come that the backup folder lacks: they travel apart from what the ledger tells. */
export function areFilesDue(folder: string): boolean {
  return lackingFiles(filesFolder(), copiesOfFiles(folder)).length > 0;
}

function copiesOfFiles(folder: string): string {
  return path.join(folder, "files");
}

async function copiedDatabase(db: Database, folder: string, at: string): Promise<Result<Backup, BackupFault>> {
  const file = copyNamed(at);
  const partial = path.join(folder, `${file}.partial`);
  try {
    tidyFolder(folder);
    makePrivateFile(partial);
    await db.$client.backup(partial, { progress: atOnceWhereDisturbed() });
    const { found, ...reach } = examined(partial);
    if (found !== "ok") return refuse({ type: "BackupDamaged", found });
    flushFile(partial);
    renameSync(partial, path.join(folder, file));
    flushFolder(folder);
    return answer({ at, file, bytes: statSync(path.join(folder, file)).size, ...reach });
  } catch (error) {
    return refuse(faultOf(error, folder));
  } finally {
    for (const part of [partial, `${partial}-journal`]) rmSync(part, { force: true });
  }
}

const ALL_PAGES = 0x7fff_ffff;

/**
 * A write by another process makes SQLite begin again, and under steady writes the copy would never be done: from the second beginning
 * on it is made in one go, which nobody disturbs. Writes by this process go into the copy as they come.
 */
function atOnceWhereDisturbed(): (at: { remainingPages: number }) => number {
  let left = Number.POSITIVE_INFINITY;
  return ({ remainingPages }) => {
    const isDisturbed = remainingPages > left;
    left = isDisturbed ? Number.NEGATIVE_INFINITY : remainingPages;
    return isDisturbed ? ALL_PAGES : PAGES_AT_A_TIME;
  };
}

type Examined = Pick<Backup, "serverSeq" | "ledgerEntry"> & { readonly found: string };

/** Whether the copy is whole, and how far it reaches: asked of the copy, not of the database it was made of. */
function examined(file: string): Examined {
  const copy = new SqliteDatabase(file);
  try {
    // one file by itself, also where nothing may be written beside it
    copy.pragma("journal_mode = DELETE");
    const found = String(copy.pragma("integrity_check", { simple: true }));
    const last = (column: string, table: string) => Number(copy.prepare(`select coalesce(max(${column}), 0) from ${table}`).pluck().get());
    return { found, serverSeq: last("server_seq", "events"), ledgerEntry: last("id", "ledger_entries") };
  } finally {
    copy.close();
  }
}

/** What an error of the disk or of SQLite means for a backup. */
export function faultOf(error: unknown, folder: string): BackupFault {
  const code = error instanceof Error && "code" in error ? String(error.code) : "";
  if (code === "ENOSPC" || code === "EDQUOT" || code === "SQLITE_FULL") return { type: "BackupDiskFull", folder };
  if (["EACCES", "EPERM", "EROFS", "SQLITE_CANTOPEN", "SQLITE_READONLY"].includes(code)) return { type: "BackupFolderClosed", folder };
  const message = error instanceof Error ? error.message : String(error);
  return /^SQLITE_(CORRUPT|NOTADB)/.test(code) ? { type: "BackupDamaged", found: message } : { type: "BackupFailed", message };
}
