import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readdirSync, statSync } from "node:fs";
import { readFile, rename, writeFile } from "node:fs/promises";
import path from "node:path";
import type { BackupFault } from "@/lib/report/backup-words";
import { flushFolder } from "./flushed";

/**
 * Copies the files that the folder lacks. They never change, so a name that is there with its size is there. The first whose content is
 * not what its name says is told of; the others are copied all the same.
 */
export async function copyFiles(from: string, to: string): Promise<BackupFault | null> {
  let damaged: string | null = null;
  const lacking = lackingFiles(from, to);
  if (lacking.length > 0) mkdirSync(to, { recursive: true, mode: 0o700 });
  for (const name of lacking) {
    const content = await readFile(path.join(from, name));
    if (createHash("sha256").update(content).digest("hex") !== name) damaged ??= name;
    else await writeWhole(path.join(to, name), content);
  }
  if (lacking.length > 0) flushFolder(to);
  return damaged === null ? null : { type: "FileDamaged", file: damaged };
}

/** The files that are not in the other folder yet. */
export function lackingFiles(from: string, to: string): string[] {
  return namesIn(from).filter((name) => !isThere(path.join(from, name), path.join(to, name)));
}

function namesIn(folder: string): string[] {
  return existsSync(folder) ? readdirSync(folder).filter((name) => /^[0-9a-f]{64}$/.test(name)) : [];
}

function isThere(file: string, copy: string): boolean {
  return existsSync(copy) && statSync(copy).size === statSync(file).size;
}

async function writeWhole(file: string, content: Uint8Array): Promise<void> {
  await writeFile(`${file}.partial`, content, { mode: 0o600, flush: true });
  await rename(`${file}.partial`, file);
}
