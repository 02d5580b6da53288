import { beforeEach, expect, test } from "vitest";
import { loadDemo } from "@/db/seed/demo";
import { type Database, openDatabase } from "@/db/server/connection";
import { isLedgerKept, type LedgerFound, verifiedLedger } from "@/db/server/verify-ledger";
import { promised } from "@/lib/result";

let db: Database;
let id: string;

beforeEach(async () => {
  db = openDatabase(":memory:");
  id = promised(await loadDemo(db));
});

test("finds every chain of the demo whole, every event entered, every signature good", () => {
  const found = verifiedLedger(db);
  expect(isLedgerKept(found)).toBe(true);
  expect(found.chains.map(({ chain }) => chain).sort()).toEqual([id, null].sort());
  const events = db.$client.prepare("select count(*) from events").pluck().get();
  expect(chainOf(found)?.events).toBe(events);
});

test("names the entry that was changed", () => {
  forge("update ledger_entries set reason = 'otherwise' where chain = ? and seq = 30");
  expect(chainOf(verifiedLedger(db))?.fault).toMatchObject({ type: "EntryChanged", seq: 30 });
});

test("names the first entry after one that was taken out", () => {
  forge("delete from ledger_entries where chain = ? and seq = 30");
  expect(chainOf(verifiedLedger(db))?.fault).toMatchObject({ type: "ChainOutOfOrder", seq: 31, expected: 30 });
});

test("names the entry of an event whose bytes were changed, by one character", () => {
  const [serverSeq, seq] = someEvent();
  forge(`update events set body = replace(body, '"v":1', '"v":2') where server_seq = ${serverSeq} and test = ?`);
  expect(chainOf(verifiedLedger(db))?.fault).toEqual({ type: "EventChanged", seq, serverSeq });
});

test("names the entry of an event whose signature was changed", () => {
  const [serverSeq, seq] = someEvent();
  const other = "case substr(signature, 1, 1) when 'A' then 'B' else 'A' end || substr(signature, 2)";
  forge(`update events set signature = ${other} where server_seq = ${serverSeq} and test = ?`);
  expect(chainOf(verifiedLedger(db))?.fault).toEqual({ type: "SignatureBad", seq, serverSeq });
});

test("names the entry of an event that is gone, and the event that has no entry", () => {
  const [serverSeq, seq] = someEvent();
  forge(`update events set server_seq = 9999 where server_seq = ${serverSeq} and test = ?`);
  const found = verifiedLedger(db);
  expect(chainOf(found)?.fault).toEqual({ type: "EventMissing", seq, serverSeq });
  expect(found.notEntered).toEqual([{ type: "EventNotEntered", seq: null, serverSeq: 9999 }]);
  expect(isLedgerKept(found)).toBe(false);
});

/** As somebody would who has the file: past the triggers that refuse it. */
function forge(sql: string): void {
  for (const table of ["events", "ledger_entries"]) {
    db.$client.exec(`drop trigger if exists ${table}_never_change; drop trigger if exists ${table}_never_go`);
  }
  db.$client.prepare(sql).run(id);
}

function someEvent(): [serverSeq: number, seq: number] {
  const sql =
    "select json_extract(after, '$.serverSeq') as serverSeq, seq from ledger_entries where chain = ? and what = 'record' limit 1 offset 20";
  const { serverSeq, seq } = db.$client.prepare(sql).get(id) as { serverSeq: number; seq: number };
  return [serverSeq, seq];
}

function chainOf({ chains }: LedgerFound) {
  return chains.find(({ chain }) => chain === id);
}
