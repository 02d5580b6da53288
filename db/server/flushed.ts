import { closeSync, fsyncSync, openSync } from "node:fs";

/** Waits until a file's bytes are on the disk. */
export function flushFile(file: string): void {
  flushed(file, "r+");
}

/** Waits until the names in a folder are on the disk; a disk that knows no such thing has them there already. */
export function flushFolder(folder: string): void {
  try {
    flushed(folder, "r");
  } catch (error) {
    if (!["EINVAL", "EISDIR", "EPERM", "ENOTSUP"].includes((error as NodeJS.ErrnoException).code ?? "")) throw error;
  }
}

function flushed(target: string, flags: string): void {
  const descriptor = openSync(target, flags);
  try {
    fsyncSync(descriptor);
  } finally {
    closeSync(descriptor);
  }
}
