import { existsSync, readdirSync, rmSync, statSync } from "node:fs";
import path from "node:path";
import type { BackupFault } from "@/lib/report/backup-words";
import { dataFolder } from "./data-folder";

const MINUTES = 10;
const NEWEST_KEPT = 24;
const DAYS_KEPT = 30;
const copyName = /^battenbook-(\d{4}-\d{2}-\d{2})T[\d-]+Z\.db$/;

export type BackupSettings = { readonly folder: string | null; readonly everyMinutes: number };

/** Where copies go and how often, as the two variables say it. */
export function backupSettings(): BackupSettings {
  const { BATTENBOOK_BACKUP_FOLDER: folder, BATTENBOOK_BACKUP_MINUTES: minutes } = process.env;
  const everyMinutes = Number(minutes || MINUTES);
  if (!(everyMinutes > 0 && everyMinutes <= 24 * 60)) {
    throw new Error(`BATTENBOOK_BACKUP_MINUTES must be above 0 and at most a day of 1440, not "${minutes}"`);
  }
  return { folder: folder ? path.resolve(/* turbopackIgnore: true */ folder) : null, everyMinutes };
}

/** Why no copy can go into a folder. It is never made: an unplugged disk would be taken for an empty one. */
export function folderFault(folder: string | null): BackupFault | null {
  if (folder === null) return { type: "NoBackupFolder" };
  if (!existsSync(folder) || !statSync(folder).isDirectory()) return { type: "BackupFolderMissing", folder };
  const within = path.relative(dataFolder(), folder);
  const isInside = within === "" || !(within.startsWith("..") || path.isAbsolute(within));
  return isInside ? { type: "BackupFolderIsDataFolder", folder } : null;
}

/** Whether copies go to the disk that the database is on. */
export function isOnDataDisk(folder: string): boolean {
  return existsSync(folder) && statSync(folder).dev === statSync(dataFolder()).dev;
}

export function copyNamed(at: string): string {
  return `battenbook-${at.replaceAll(/[:.]/g, "-")}.db`;
}

/** Removes the copies that are no longer kept, and what a backup that was cut short left behind. */
export function tidyFolder(folder: string): void {
  const names = readdirSync(folder);
  const leftBehind = names.filter((name) => copyName.test(name.replace(/\.partial(-journal)?$/, "")) && name.includes(".partial"));
  for (const name of [...copiesToRemove(names), ...leftBehind]) rmSync(path.join(folder, name), { force: true });
}

/** All but the newest 24 copies and the last of each of 30 days. */
export function copiesToRemove(names: readonly string[]): string[] {
  const copies = names
    .filter((name) => copyName.test(name))
    .sort()
    .reverse();
  const lastOfDay = copies.filter((name, i) => i === 0 || dayOf(name) !== dayOf(copies[i - 1] ?? ""));
  const kept = new Set([...copies.slice(0, NEWEST_KEPT), ...lastOfDay.slice(0, DAYS_KEPT)]);
  return copies.filter((name) => !kept.has(name));
}

function dayOf(name: string): string {
  return copyName.exec(name)?.[1] ?? "";
}
