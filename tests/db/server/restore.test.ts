import { copyFileSync, existsSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import SqliteDatabase from "better-sqlite3";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { backUp } from "@/db/server/backup";
import { openDatabase } from "@/db/server/connection";
import { ledgerHead, ledgerOf } from "@/db/server/ledger-entries";
import { restore } from "@/db/server/restore";
import { identityOf } from "@/db/server/server-identity";
import { isLedgerKept, verifiedLedger } from "@/db/server/verify-ledger";
import { promised } from "@/lib/result";
import { Phone } from "./phone";
import { at, hoursLater, personWith, testIn, type Yard, yardIn } from "./yard";

const wish = { at: hoursLater(5), force: false };
const kept = "battenbook-before-restore-2026-05-04T12-00-00-000Z.db";

let base: string;
let data: string;
let copy: string;
let yard: Yard;
let phone: Phone;
beforeEach(async () => {
  base = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  data = path.join(base, "data");
  process.env.BATTENBOOK_DATA = data;
  mkdirSync(path.join(base, "copies"));
  mkdirSync(data);
  yard = yardIn(openDatabase(path.join(data, "battenbook.db")));
  phone = new Phone(yard.db, yard.test, personWith(yard, "reader").id);
  reads(3);
  copy = path.join(base, "copies", promised(await backUp(yard.db, path.join(base, "copies"), at)).file);
});
afterEach(() => {
  yard.db.$client.close();
  rmSync(base, { recursive: true });
});

function reads(count: number) {
  const slot = { kind: "batten", move: 1, repeat: 1, station: "A", series: 1 } as const;
  phone.sends(Array.from({ length: count }, () => phone.reads(slot, { mode: "settled", valuesMm: [101.5] })));
}
/** What is in place now, or under another name. */
function looked<T>(look: (db: Yard["db"]) => T, file = "battenbook.db"): T {
  const db = openDatabase(path.join(data, file));
  try {
    return look(db);
  } finally {
    db.$client.close();
  }
}
const eventCount = (db: Yard["db"]) => db.$client.prepare("select count(*) from events").pluck().get();
const spoil = (statement: string) => {
  const client = new SqliteDatabase(copy);
  client.exec(statement);
  client.close();
};

describe("a restore", () => {
  test("puts the copy in place, keeps what was there, and begins a new epoch of the same server", async () => {
    reads(2);
    const before = identityOf(yard.db);
    yard.db.$client.close();
    const bytes = readFileSync(copy);
    const restored = promised(await restore(copy, wish));
    expect(restored).toMatchObject({ kept, passedOver: [], fileFault: null });
    expect(looked(identityOf)).toEqual({ id: before.id, epoch: restored.epoch });
    expect(restored.epoch).not.toBe(before.epoch);
    expect([looked(eventCount), looked(eventCount, kept)]).toEqual([3, 5]);
    expect(statSync(path.join(data, "battenbook.db")).mode & 0o777).toBe(0o600);
    expect(readFileSync(copy)).toEqual(bytes);
    expect(readdirSync(data).sort()).toEqual([kept, "battenbook.db"]);
  });

  test("names in the ledger the heads that can no longer be shown, and only those; the chains stay whole", async () => {
    const other = testIn(yard.db, yard.vessel, yard.engineer.id);
    reads(2);
    const [head, otherHead] = [ledgerHead(yard.db, yard.test), ledgerHead(yard.db, other)];
    const seq = ledgerOf(yard.db, yard.test).length;
    const otherSeq = ledgerOf(yard.db, other).length;
    yard.db.$client.close();
    const { headsLost, epoch } = promised(await restore(copy, wish));
    expect(headsLost).toHaveLength(2);
    expect(headsLost).toEqual(
      expect.arrayContaining([
        { chain: yard.test, seq, head },
        { chain: other, seq: otherSeq, head: otherHead },
      ]),
    );
    looked((db) => {
      expect(ledgerOf(db, null).at(-1)).toMatchObject({ what: "restored", at: wish.at, who: null, after: { epoch, headsLost } });
      expect(ledgerOf(db, yard.test).at(-1)).toMatchObject({ what: "restored", after: { epoch, headLost: { seq, head } } });
      // the copy knows nothing of a test that was made after it: its loss stands in the server's chain alone
      expect(ledgerOf(db, other)).toEqual([]);
      expect(isLedgerKept(verifiedLedger(db))).toBe(true);
    });
  });

  test("writes nothing into the chain of a test that lost nothing", async () => {
    const entries = ledgerOf(yard.db, yard.test);
    yard.db.$client.close();
    expect(promised(await restore(copy, wish)).headsLost).toEqual([]);
    expect(looked((db) => ledgerOf(db, yard.test))).toEqual(entries);
  });

  test("works in an empty folder, as on a new machine, and brings the files along", async () => {
    const name = "5891b5b522d5df086d0ff0b110fbd9d21bb4fc7163af34d08286a2e846f6be03";
    mkdirSync(path.join(base, "copies", "files"));
    writeFileSync(path.join(base, "copies", "files", name), "hello\n");
    yard.db.$client.close();
    data = path.join(base, "new");
    process.env.BATTENBOOK_DATA = data;
    expect(promised(await restore(copy, wish))).toMatchObject({ kept: null, headsLost: [], fileFault: null });
    expect(looked(eventCount)).toBe(3);
    expect(readFileSync(path.join(data, "files", name), "utf8")).toBe("hello\n");
  });

  test("says that it does not know what was lost where the database before can't be read, and keeps that one too", async () => {
    yard.db.$client.close();
    writeFileSync(path.join(data, "battenbook.db"), "torn ".repeat(2000));
    expect(promised(await restore(copy, wish))).toMatchObject({ kept, headsLost: null });
    expect(readFileSync(path.join(data, kept), "utf8")).toBe("torn ".repeat(2000));
    expect(looked(eventCount)).toBe(3);
  });
});

describe("nothing is changed", () => {
  const unchanged = () => {
    expect(readdirSync(data).filter((name) => !/-(wal|shm)$/.test(name))).toEqual(["battenbook.db"]);
    expect(looked(eventCount)).toBe(3);
  };

  test("while the server runs", async () => {
    expect(await restore(copy, wish)).toEqual({ ok: false, refusal: { type: "ServerRuns" } });
    reads(1);
    expect(eventCount(yard.db)).toBe(4);
    expect(readdirSync(data).sort()).toEqual(["battenbook.db", "battenbook.db-shm", "battenbook.db-wal"]);
  });

  test("by a file that is not there, is no database, or is somebody else's", async () => {
    yard.db.$client.close();
    const strange = path.join(base, "strange.db");
    expect(await restore(strange, wish)).toMatchObject({ refusal: { type: "CopyMissing", file: strange } });
    writeFileSync(strange, "this is no database, and long enough to be looked at as one ".repeat(40));
    expect(await restore(strange, wish)).toMatchObject({ refusal: { type: "CopyOfSomethingElse", file: strange } });
    rmSync(strange);
    new SqliteDatabase(strange).exec("create table events (id)").close();
    expect(await restore(strange, { ...wish, force: true })).toMatchObject({ refusal: { type: "CopyOfSomethingElse", file: strange } });
    unchanged();
  });

  test("by a copy whose ledger does not fit, unless forced", async () => {
    yard.db.$client.close();
    spoil(`drop trigger events_never_change; update events set body = replace(body, '101.5', '101.9') where server_seq = 2`);
    const refused = await restore(copy, wish);
    expect(refused).toMatchObject({ refusal: { type: "CopyLedgerBroken", fault: { type: "EventChanged", serverSeq: 2 } } });
    unchanged();
    expect(promised(await restore(copy, { ...wish, force: true })).passedOver).toMatchObject([{ type: "CopyLedgerBroken" }]);
    expect(existsSync(path.join(data, kept))).toBe(true);
  });

  test("by a copy that is damaged", async () => {
    yard.db.$client.close();
    const bytes = readFileSync(copy);
    copyFileSync(copy, `${copy}.whole`);
    const client = new SqliteDatabase(copy);
    const page = Number(client.prepare("select rootpage from sqlite_schema where name = 'events_id'").pluck().get());
    client.close();
    bytes.fill(0, (page - 1) * 4096, page * 4096);
    writeFileSync(copy, bytes);
    expect(await restore(copy, wish)).toMatchObject({ refusal: { type: "CopyDamaged" } });
    unchanged();
    expect(promised(await restore(`${copy}.whole`, wish)).kept).toBe(kept);
  });
});
