import { mkdtempSync, readFileSync, rmSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";
import { inTransaction, openDatabase } from "@/db/server/connection";
import { beginEpoch, identityOf } from "@/db/server/server-identity";
import { Phone } from "./phone";
import { personWith, yardIn } from "./yard";

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
});
afterEach(() => rmSync(folder, { recursive: true }));

test("waits for the disk at every commit, also after the first write", () => {
  const db = openDatabase(path.join(folder, "a.db"));
  beginEpoch(db);
  expect(db.$client.pragma("synchronous", { simple: true })).toBe(2);
  expect(db.$client.pragma("journal_mode", { simple: true })).toBe("wal");
  expect(db.$client.pragma("foreign_keys", { simple: true })).toBe(1);
  expect(db.$client.pragma("busy_timeout", { simple: true })).toBe(5000);
  db.$client.close();
});

test("still waits for the disk after phones have been answered", () => {
  const db = openDatabase(path.join(folder, "a.db"));
  const yard = yardIn(db);
  const phone = new Phone(db, yard.test, personWith(yard, "reader").id);
  const slot = { kind: "batten", move: 1, repeat: 1, station: "A", series: 1 } as const;
  expect(phone.sends([phone.reads(slot, { mode: "settled", valuesMm: [101.5] })]).results).toMatchObject([{ outcome: "applied" }]);
  expect(db.$client.pragma("synchronous", { simple: true })).toBe(2);
  db.$client.close();
});

test("has the bytes of every commit on the disk when the commit returns, as the kernel counts them", () => {
  const commits = 40;
  // here and not in the temporary folder, which may be in memory: there nothing is ever written to a disk
  const onDisk = mkdtempSync(path.resolve(import.meta.dirname, "../../../.data-durability-"));
  try {
    const db = openDatabase(path.join(onDisk, "battenbook.db"));
    db.$client.pragma("wal_autocheckpoint = 0");
    const commit = () => inTransaction(db, () => beginEpoch(db));
    const pages = () => {
      db.$client.pragma("wal_checkpoint(TRUNCATE)");
      return pagesWrittenTwice(`${db.$client.name}-wal`, () => Array.from({ length: commits }, commit));
    };
    const durable = pages();
    expect(db.$client.pragma("synchronous", { simple: true })).toBe(2);
    db.$client.pragma("synchronous = NORMAL");
    const relaxed = pages();
    db.$client.close();
    expect(durable).toBeGreaterThan(0.9 * commits);
    // the same measure where nobody waits: what it finds above is not its own noise
    expect(relaxed).toBeLessThan(0.2 * commits);
  } finally {
    rmSync(onDisk, { recursive: true });
  }
});

test("makes the file, its journal and its index readable by the owner alone", () => {
  const file = path.join(folder, "a.db");
  const db = openDatabase(file);
  for (const name of [file, `${file}-wal`, `${file}-shm`]) expect(statSync(name).mode & 0o777).toBe(0o600);
  db.$client.close();
});

test("keeps the server's id and epoch when it is opened again, and changes the epoch only when told to", () => {
  const file = path.join(folder, "a.db");
  const first = openDatabase(file);
  const before = identityOf(first);
  first.$client.close();
  const second = openDatabase(file);
  expect(identityOf(second)).toEqual(before);
  const restored = beginEpoch(second);
  expect(restored.id).toBe(before.id);
  expect(restored.epoch).not.toBe(before.epoch);
  second.$client.close();
});

test("undoes an inner piece of work that fails without undoing what was done around it", () => {
  const db = openDatabase(":memory:");
  const epochs: string[] = [];
  inTransaction(db, () => {
    epochs.push(beginEpoch(db).epoch);
    expect(() =>
      inTransaction(db, () => {
        beginEpoch(db);
        throw new Error("fails");
      }),
    ).toThrow("fails");
  });
  expect(identityOf(db).epoch).toBe(epochs[0]);
  db.$client.close();
});

/**
 * How often a page of the journal was handed to the disk and begun again. Commits are written one after the other, and each begins in
 * the page in which the last one ended: Linux counts that page anew (`write_bytes`) only where it had been written out in between, and
 * that is what a commit waits for. Source: proc(5), /proc/pid/io.
 */
function pagesWrittenTwice(journal: string, work: () => unknown): number {
  const [bytes, length] = [bytesToDisk(), statSync(journal).size];
  work();
  return (bytesToDisk() - bytes - (statSync(journal).size - length)) / 4096;
}

function bytesToDisk(): number {
  const counted = /^write_bytes: (\d+)$/m.exec(readFileSync("/proc/self/io", "utf8"))?.[1];
  if (counted === undefined) throw new Error("the kernel does not count what is written to the disk: durability can't be proved here");
  return Number(counted);
}
