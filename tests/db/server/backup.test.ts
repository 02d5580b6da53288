import { createHash } from "node:crypto";
import { chmodSync, mkdirSync, mkdtempSync, readdirSync, rmSync, statSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import SqliteDatabase from "better-sqlite3";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { backUp, faultOf } from "@/db/server/backup";
import { confirmedTo, isBackupDue, lastBackup } from "@/db/server/backups-made";
import { openDatabase } from "@/db/server/connection";
import { noteOpening } from "@/db/server/server-identity";
import { isLedgerKept, verifiedLedger } from "@/db/server/verify-ledger";
import { promised } from "@/lib/result";
import type { Slot } from "@/lib/sync/slot";
import { Phone } from "./phone";
import { at, hoursLater, personWith, type Yard, yardIn } from "./yard";

const slotAt = (move: number): Slot => ({ kind: "batten", move, repeat: 1, station: "A", series: 1 });

let base: string;
let folder: string;
let yard: Yard;
let phone: Phone;
beforeEach(() => {
  base = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  folder = path.join(base, "copies");
  process.env.BATTENBOOK_DATA = path.join(base, "data");
  mkdirSync(folder);
  mkdirSync(path.join(base, "data"));
  yard = yardIn(openDatabase(path.join(base, "data", "battenbook.db")));
  phone = new Phone(yard.db, yard.test, personWith(yard, "reader").id);
});
afterEach(() => {
  yard.db.$client.close();
  rmSync(base, { recursive: true });
});

const reads = (count: number) => {
  const batch = Array.from({ length: count }, (_, i) => phone.reads(slotAt(i % 8), { mode: "settled", valuesMm: [100 + i / 10] }));
  return phone.sends(batch);
};
const rootOf = (index: string) => Number(yard.db.$client.prepare("select rootpage from sqlite_schema where name = ?").pluck().get(index));
const copies = () => readdirSync(folder).sort();
const eventsIn = (file: string) => {
  const copy = new SqliteDatabase(path.join(folder, file), { readonly: true });
  const count = copy.prepare("select count(*) from events").pluck().get();
  copy.close();
  return count;
};

describe("a backup", () => {
  test("is one file for its owner alone, with everything that was done before it, and answers tell how far it reaches", async () => {
    reads(3);
    expect(isBackupDue(yard.db)).toBe(true);
    const backup = promised(await backUp(yard.db, folder, at));
    expect(copies()).toEqual(["battenbook-2026-05-04T07-00-00-000Z.db"]);
    expect(statSync(path.join(folder, backup.file)).mode & 0o777).toBe(0o600);
    expect(backup).toMatchObject({ serverSeq: 3, bytes: statSync(path.join(folder, backup.file)).size });
    expect(eventsIn(backup.file)).toBe(3);
    expect(lastBackup(yard.db)).toEqual(backup);
    expect(isBackupDue(yard.db)).toBe(false);
    expect(reads(2)).toMatchObject({ confirmedTo: 3, results: [{ serverSeq: 4 }, { serverSeq: 5 }] });
    expect(isBackupDue(yard.db)).toBe(true);
  });

  test("is consistent while writes go on: every entry with its event, every chain whole", async () => {
    for (let i = 0; i < 20; i++) reads(50);
    let isRunning = true;
    const writing = (async () => {
      let batches = 0;
      for (; isRunning; batches++) {
        reads(5);
        await new Promise((done) => setImmediate(done));
      }
      return batches;
    })();
    const backup = promised(await backUp(yard.db, folder, at));
    isRunning = false;
    expect(await writing).toBeGreaterThan(3);
    const copy = openDatabase(path.join(folder, backup.file));
    expect(isLedgerKept(verifiedLedger(copy))).toBe(true);
    const { n, last } = copy.$client.prepare("select count(*) as n, max(server_seq) as last from events").get() as {
      n: number;
      last: number;
    };
    copy.$client.close();
    expect([n, last]).toEqual([backup.serverSeq, backup.serverSeq]);
    // a batch of five stands whole in the copy or not at all
    expect([backup.serverSeq % 5, backup.serverSeq >= 1000]).toEqual([0, true]);
  });

  test("is made beside another process that never stops writing", async () => {
    for (let i = 0; i < 20; i++) reads(50);
    const other = openDatabase(yard.db.$client.name);
    let isRunning = true;
    let writes = 0;
    const writing = (async () => {
      for (; isRunning; writes++) {
        noteOpening(other);
        await new Promise((done) => setImmediate(done));
      }
    })();
    const backup = promised(await backUp(yard.db, folder, at));
    isRunning = false;
    await writing;
    other.$client.close();
    expect(backup.serverSeq).toBe(1000);
    expect(writes).toBeGreaterThan(2);
  });

  test("takes the files along that the folder lacks, and tells of one that is not what it was", async () => {
    const files = path.join(base, "data", "files");
    const named = (content: string) => createHash("sha256").update(content).digest("hex");
    mkdirSync(files);
    writeFileSync(path.join(files, named("batten at move 3")), "batten at move 3");
    promised(await backUp(yard.db, folder, at));
    expect(readdirSync(path.join(folder, "files"))).toEqual([named("batten at move 3")]);
    writeFileSync(path.join(files, named("certificate")), "certificate, spoiled");
    writeFileSync(path.join(files, named("hydrometer")), "hydrometer");
    const spoiled = await backUp(yard.db, folder, hoursLater(1));
    expect(spoiled).toEqual({ ok: false, refusal: { type: "FileDamaged", file: named("certificate") } });
    expect(readdirSync(path.join(folder, "files")).sort()).toEqual([named("batten at move 3"), named("hydrometer")].sort());
    expect(copies()).toHaveLength(3);
  });

  test("removes what a backup that was cut short left behind, and nothing of others", async () => {
    writeFileSync(path.join(folder, "battenbook-2026-05-04T06-00-00-000Z.db.partial"), "half");
    writeFileSync(path.join(folder, "battenbook-2026-05-04T06-00-00-000Z.db.partial-journal"), "half");
    writeFileSync(path.join(folder, "notes.txt.partial"), "somebody's");
    promised(await backUp(yard.db, folder, at));
    expect(copies()).toEqual(["battenbook-2026-05-04T07-00-00-000Z.db", "notes.txt.partial"]);
  });
});

describe("no backup is made and nothing is confirmed", () => {
  test.each([
    ["into a folder that is not there", () => path.join(base, "stick"), "BackupFolderMissing"],
    ["into a file", () => path.join(base, "data", "battenbook.db"), "BackupFolderMissing"],
    ["into the folder of the database", () => path.join(base, "data"), "BackupFolderIsDataFolder"],
    ["into a folder that nothing may be written into", closedFolder, "BackupFolderClosed"],
  ])("%s", async (_, folderOf, type) => {
    reads(1);
    const refused = await backUp(yard.db, folderOf(), at);
    expect(refused).toMatchObject({ ok: false, refusal: { type, folder: folderOf() } });
    expect([lastBackup(yard.db), confirmedTo(yard.db), isBackupDue(yard.db)]).toEqual([undefined, 0, true]);
  });

  test("of a database that is damaged, and the damaged copy does not stay", async () => {
    reads(50);
    yard.db.$client.unsafeMode();
    yard.db.$client.pragma("writable_schema = ON");
    // two indexes of one column each now point to each other's pages
    const [a, b] = ["events_id", "events_basis"].map((name) => rootOf(name));
    yard.db.$client.exec(`update sqlite_schema set rootpage = ${a} + ${b} - rootpage where rootpage in (${a}, ${b})`);
    const refused = await backUp(yard.db, folder, at);
    expect(refused).toMatchObject({ ok: false, refusal: { type: "BackupDamaged" } });
    expect(copies()).toEqual([]);
    expect(confirmedTo(yard.db)).toBe(0);
  });

  test("on a full disk, as SQLite tells of it", () => {
    const small = new SqliteDatabase(":memory:");
    small.pragma("max_page_count = 2");
    small.exec("create table readings (body)");
    const fill = () => small.prepare("insert into readings values (zeroblob(100000))").run();
    expect(faultThrownBy(fill)).toEqual({ type: "BackupDiskFull", folder: "/mnt/stick" });
    small.close();
  });
});

function faultThrownBy(work: () => unknown) {
  try {
    work();
  } catch (error) {
    return faultOf(error, "/mnt/stick");
  }
  return null;
}

/** Closed to whoever runs this: the rights of a folder do not stop the superuser, the kernel's own folder does. */
function closedFolder(): string {
  if (process.getuid?.() === 0) return "/sys";
  const closed = path.join(base, "closed");
  mkdirSync(closed, { recursive: true });
  chmodSync(closed, 0o500);
  return closed;
}
