import { mkdtempSync, rmSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";
import { inTransaction, openDatabase } from "@/db/server/connection";
import { beginEpoch, identityOf } from "@/db/server/server-identity";

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
