import { closeSync, mkdirSync, openSync } from "node:fs";
import path from "node:path";

/** The folder of everything this server keeps: database, secret, files. Nobody else on the machine may read it. */
export function dataFolder(): string {
  const folder = path.resolve(/* turbopackIgnore: true */ process.env.BATTENBOOK_DATA ?? ".data");
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  return folder;
}

export function databaseFile(): string {
  return path.join(dataFolder(), "battenbook.db");
}

/** Photographs and certificates, each under the hash of its content. */
export function filesFolder(): string {
  return path.join(dataFolder(), "files");
}

/** Makes an empty file that only its owner may read, where there is none; SQLite gives its -wal and -shm the same mode. */
export function makePrivateFile(file: string): void {
  closeSync(openSync(file, "a", 0o600));
}
