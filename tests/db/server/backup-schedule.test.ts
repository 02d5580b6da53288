import { createHash } from "node:crypto";
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { backUpNow, backupStanding, startBackups } from "@/db/server/backup-schedule";
import { database } from "@/db/server/connection";
import { backupWarnings } from "@/lib/report/backup-words";
import { personWith, type Yard, yardIn } from "./yard";

type Shared = { battenbookDatabase?: unknown; battenbookBackups?: { timer: NodeJS.Timeout | null } };
const shared = globalThis as Shared;

let base: string;
let folder: string;
let yard: Yard;
beforeEach(() => {
  base = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  folder = path.join(base, "copies");
  mkdirSync(folder);
  process.env.BATTENBOOK_DATA = path.join(base, "data");
  process.env.BATTENBOOK_BACKUP_FOLDER = folder;
  process.env.BATTENBOOK_BACKUP_MINUTES = "0.002";
  yard = yardIn(database());
});
afterEach(async () => {
  clearInterval(shared.battenbookBackups?.timer ?? undefined);
  await backUpNow();
  shared.battenbookBackups = undefined;
  yard.db.$client.close();
  shared.battenbookDatabase = undefined;
  rmSync(base, { recursive: true });
});

const copies = () => readdirSync(folder).filter((name) => name.endsWith(".db"));
const pause = (ms: number) => new Promise((done) => setTimeout(done, ms));

test("copies at the start and again after something was done, and not while nothing is", async () => {
  startBackups();
  await vi.waitFor(() => expect(backupStanding(yard.db).isDue).toBe(false), 5_000);
  await pause(500);
  expect(copies()).toHaveLength(1);
  personWith(yard, "reader");
  expect(backupStanding(yard.db).isDue).toBe(true);
  await vi.waitFor(() => expect(backupStanding(yard.db).isDue).toBe(false), 5_000);
  await pause(500);
  expect(copies()).toHaveLength(2);
});

test("copies a photograph that comes when all else is in a backup, and nothing besides", async () => {
  await backUpNow();
  const bytes = "a batten, photographed";
  const name = createHash("sha256").update(bytes).digest("hex");
  mkdirSync(path.join(base, "data", "files"));
  writeFileSync(path.join(base, "data", "files", name), bytes);
  expect(backupStanding(yard.db).isDue).toBe(true);
  startBackups();
  await vi.waitFor(() => expect(backupStanding(yard.db).isDue).toBe(false), 5_000);
  expect(readFileSync(path.join(folder, "files", name), "utf8")).toBe(bytes);
  expect(copies()).toHaveLength(1);
});

test("makes one at a time: whoever asks meanwhile gets the same", async () => {
  const [first, second] = await Promise.all([backUpNow(), backUpNow()]);
  expect(first.ok).toBe(true);
  expect(second).toBe(first);
  expect(copies()).toHaveLength(1);
});

test("does not keep a process from ending", () => {
  startBackups();
  expect(shared.battenbookBackups?.timer?.hasRef()).toBe(false);
});

test("warns in words when the disk is unplugged, and takes the warning back after a backup that works", async () => {
  const told = vi.spyOn(console, "error").mockImplementation(() => undefined);
  process.env.BATTENBOOK_BACKUP_FOLDER = path.join(base, "stick");
  expect((await backUpNow()).ok).toBe(false);
  const sentence = `There is no folder ${path.join(base, "stick")}: is its disk connected?`;
  expect(told.mock.calls).toEqual([[`No backup was made. ${sentence}`]]);
  told.mockRestore();
  expect(backupWarnings(backupStanding(yard.db), Date.now())).toEqual([sentence, "Nothing on this server is in a backup yet."]);
  mkdirSync(path.join(base, "stick"));
  expect((await backUpNow()).ok).toBe(true);
  expect(backupStanding(yard.db)).toMatchObject({ fault: null, isDue: false, last: { bytes: expect.any(Number) } });
});

test("says that one disk is no second place, and that no folder is set", () => {
  expect(backupStanding(yard.db)).toMatchObject({ folder, isOnDataDisk: true, last: null });
  process.env.BATTENBOOK_BACKUP_FOLDER = "";
  expect(backupStanding(yard.db)).toMatchObject({ folder: null, isOnDataDisk: false, fault: { type: "NoBackupFolder" } });
});
