import "server-only";
import { createHash } from "node:crypto";
import { chmodSync, copyFileSync, existsSync, readFileSync, rmSync } from "node:fs";
import path from "node:path";
import SqliteDatabase from "better-sqlite3";
import { and, eq } from "drizzle-orm";
import type { BackupFault } from "@/lib/report/backup-words";
import type { HeadLost, RestoreFault } from "@/lib/report/restore-words";
import { answer, type Result, refuse } from "@/lib/result";
import { ledgerEntries } from "../schema/ledger";
import { type Database, inTransaction, openDatabase } from "./connection";
import { databaseFile, dataFolder, filesFolder } from "./data-folder";
import { copyFiles } from "./file-copies";
import { flushFile, flushFolder } from "./flushed";
import { chainsKept, writeEntry } from "./ledger-entries";
import { heldAlone, type Present, putInPlace } from "./present-database";
import { beginEpoch, identityOf } from "./server-identity";
import { verifiedLedger } from "./verify-ledger";

export type Restored = {
  readonly epoch: string;
  /** what was in place before, kept under this name; null: nothing was */
  readonly kept: string | null;
  /** null: the database before could not be read */
  readonly headsLost: readonly HeadLost[] | null;
  /** what force has passed over */
  readonly passedOver: readonly RestoreFault[];
  readonly fileFault: BackupFault | null;
};

type Wish = { readonly at: string; readonly force: boolean };

/**
 * Puts a copy in the place of the database. The copy itself is not touched, the database before it is kept under another name. The
 * server gets a new epoch, at which every phone sends again what the copy lacks, and the ledger an entry `restored` with the heads that
 * it can no longer show.
 */
export async function restore(copy: string, { at, force }: Wish): Promise<Result<Restored, RestoreFault>> {
  const incoming = `${databaseFile()}.restoring`;
  const present = heldAlone(databaseFile());
  if (present === "in use") return refuse({ type: "ServerRuns" });
  try {
    const faults = faultsOf(copy, incoming, force);
    const grave = faults.find(({ type }) => !force || !yieldsToForce.includes(type));
    if (grave) return refuse(grave);
    const entered = asNewEpoch(incoming, present, copy, at);
    const kept = existsSync(databaseFile()) ? `battenbook-before-restore-${at.replaceAll(/[:.]/g, "-")}.db` : null;
    putInPlace(incoming, databaseFile(), path.join(dataFolder(), kept ?? ""));
    flushFolder(dataFolder());
    return answer({
      ...entered,
      kept,
      passedOver: faults,
      fileFault: await copyFiles(path.join(path.dirname(copy), "files"), filesFolder()),
    });
  } catch (error) {
    return refuse({ type: "RestoreFailed", message: error instanceof Error ? error.message : String(error) });
  } finally {
    present.release();
    remove(incoming);
  }
}

const yieldsToForce: readonly RestoreFault["type"][] = ["CopyDamaged", "CopyLedgerBroken"];

/** Takes a copy of the copy beside the database and looks it through. */
function faultsOf(copy: string, incoming: string, force: boolean): RestoreFault[] {
  if (!existsSync(copy)) return [{ type: "CopyMissing", file: copy }];
  remove(incoming);
  // a file that was copied by hand may have its journal beside it
  for (const part of ["", "-wal"]) if (existsSync(copy + part)) copyFileSync(copy + part, incoming + part);
  chmodSync(incoming, 0o600);
  const found = integrityOf(incoming);
  if (found === null) return [{ type: "CopyOfSomethingElse", file: copy }];
  const damaged: RestoreFault[] = found === "ok" ? [] : [{ type: "CopyDamaged", found }];
  return damaged.length > 0 && !force ? damaged : [...damaged, ...ledgerFaults(incoming)];
}

/** "ok", or what is damaged; null: it is something else altogether. */
function integrityOf(file: string): string | null {
  const client = new SqliteDatabase(file);
  try {
    const tables = client.prepare("select count(*) from sqlite_schema where name in ('server_identity', 'events', 'ledger_entries')");
    return tables.pluck().get() === 3 ? String(client.pragma("integrity_check", { simple: true })) : null;
  } catch (error) {
    return error instanceof Error && "code" in error && error.code === "SQLITE_NOTADB" ? null : String(error);
  } finally {
    client.close();
  }
}

function ledgerFaults(file: string): RestoreFault[] {
  const db = openDatabase(file);
  try {
    const { chains, notEntered } = verifiedLedger(db);
    const faults = [...chains.flatMap(({ fault }) => fault ?? []), ...notEntered];
    return faults.slice(0, 1).map((fault) => ({ type: "CopyLedgerBroken", fault }));
  } finally {
    db.$client.close();
  }
}

function asNewEpoch(file: string, { heads }: Present, copy: string, at: string): Pick<Restored, "epoch" | "headsLost"> {
  const db = openDatabase(file);
  try {
    const lost = heads?.filter((head) => !isHeld(db, head)) ?? null;
    return { epoch: inTransaction(db, () => entered(db, lost, copy, at)), headsLost: lost };
  } finally {
    db.$client.close();
    flushFile(file);
  }
}

/** The server's chain names everything that was lost; the chain of a test that lost something says so itself. */
function entered(db: Database, lost: readonly HeadLost[] | null, copy: string, at: string): string {
  const before = identityOf(db).epoch;
  const { epoch } = beginEpoch(db);
  const from = { name: path.basename(copy), sha256: createHash("sha256").update(readFileSync(copy)).digest("hex") };
  const what = { by: null, at, what: "restored" };
  writeEntry(db, null, { ...what, before: { epoch: before }, after: { epoch, from, headsLost: lost } });
  const kept = chainsKept(db);
  for (const { chain, seq, head } of lost ?? []) {
    if (chain !== null && kept.includes(chain)) writeEntry(db, chain, { ...what, after: { epoch, headLost: { seq, head } } });
  }
  return epoch;
}

function isHeld(db: Database, { chain, head }: HeadLost): boolean {
  const same = and(eq(ledgerEntries.chain, chain ?? "server"), eq(ledgerEntries.hash, head));
  return db.select({ id: ledgerEntries.id }).from(ledgerEntries).where(same).get() !== undefined;
}

function remove(file: string): void {
  for (const part of ["", "-wal", "-shm", "-journal"]) rmSync(file + part, { force: true });
}
