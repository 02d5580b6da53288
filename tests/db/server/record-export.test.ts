import { beforeAll, expect, test } from "vitest";
import { loadDemo } from "@/db/seed/demo";
import { demoPeople } from "@/db/seed/demo-people";
import { type Database, openDatabase } from "@/db/server/connection";
import { ledgerHead, ledgerOf } from "@/db/server/ledger-entries";
import { exportedRecord } from "@/db/server/record-export";
import { chainHead, type LedgerEntry } from "@/lib/ledger/hash-chain";
import { type TestRecord, testRecordSchema } from "@/lib/record/test-record";
import { promised } from "@/lib/result";

const at = "2026-05-04T12:00:00.000Z";
let db: Database;
let id: string;
let record: TestRecord;

beforeAll(async () => {
  db = openDatabase(":memory:");
  id = promised(await loadDemo(db));
  record = exportedRecord(db, id, { by: demoPeople.witness.id, at });
});

test("is a test record by its own schema", () => {
  expect(testRecordSchema.safeParse(JSON.parse(JSON.stringify(record))).error?.issues ?? []).toEqual([]);
});

test("carries the chain, with the export as its last entry, and every exact event with its signature", () => {
  const chain = record.ledger as LedgerEntry[];
  expect(promised(chainHead(chain)).hash).toBe(ledgerHead(db, id));
  expect(chain.at(-1)).toMatchObject({ what: "record.export", who: demoPeople.witness.id });
  const bodies = db.$client.prepare("select body from events order by server_seq").pluck().all();
  expect((record.events as { body: string; signature: string }[]).map(({ body }) => body)).toEqual(bodies);
  expect(record.devices).toHaveLength(3);
});

test("marks each reading with what has become of it", () => {
  const disagreeing = record.readings.drafts.filter(({ status }) => status === "disagrees");
  expect(disagreeing.map(({ mark, reader }) => [mark, reader]).sort()).toEqual([
    ["FS", "Mara Quist"],
    ["FS", "Nils Aker"],
  ]);
  expect(record.readings.battens.filter(({ source }) => source === "radio").map(({ move, station }) => [move, station])).toEqual([
    [3, "C"],
  ]);
  expect(record.moves.map(({ closedAt }) => closedAt !== undefined)).toEqual([true, true, true, true, true, true, false, false, false]);
});

test("writes each export into the ledger", () => {
  const before = ledgerOf(db, id).length;
  exportedRecord(db, id, { by: demoPeople.engineer.id, at });
  expect(ledgerOf(db, id).slice(before)).toMatchObject([{ what: "record.export", who: demoPeople.engineer.id }]);
});
