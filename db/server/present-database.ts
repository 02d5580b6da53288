import "server-only";
import { existsSync, linkSync, renameSync } from "node:fs";
import SqliteDatabase from "better-sqlite3";
import type { HeadLost } from "@/lib/report/restore-words";

/** The database that a copy is to replace, held so that nobody else can open it meanwhile. */
export type Present = {
  /** the last entry of each chain; null: the file can't be read, and what it held is not known */
  readonly heads: readonly HeadLost[] | null;
  readonly release: () => void;
};

/** Takes the database for itself alone; "in use": somebody has it open, which in WAL shows as a lock on the file. */
export function heldAlone(file: string): Present | "in use" {
  if (!existsSync(file)) return { heads: [], release: () => undefined };
  const client = new SqliteDatabase(file, { timeout: 0 });
  const release = () => void client.close();
  try {
    // leaving WAL needs the file for oneself, and leaves it whole without its journal
    client.pragma("journal_mode = DELETE");
    client.exec("begin exclusive");
    return { heads: headsIn(client), release };
  } catch (error) {
    if (!isBusy(error)) return { heads: null, release };
    release();
    return "in use";
  }
}

/** Puts the file in the place of the present one, which keeps its content under another name. At no time is there neither. */
export function putInPlace(file: string, present: string, kept: string): void {
  for (const part of ["-wal", "-shm"]) if (existsSync(present + part)) renameSync(present + part, kept + part);
  if (existsSync(present)) keepAs(present, kept);
  renameSync(file, present);
}

// a disk that knows no second names for a file
function keepAs(present: string, kept: string): void {
  try {
    linkSync(present, kept);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === "EEXIST") throw error;
    renameSync(present, kept);
  }
}

function headsIn(client: SqliteDatabase.Database): HeadLost[] {
  const rows = client.prepare("select chain, max(seq) as seq, hash as head from ledger_entries group by chain order by chain").all();
  return (rows as { chain: string; seq: number; head: string }[]).map(({ chain, ...at }) => ({
    chain: chain === "server" ? null : chain,
    ...at,
  }));
}

function isBusy(error: unknown): boolean {
  return error instanceof Error && "code" in error && String(error.code).startsWith("SQLITE_BUSY");
}
