import { expect, test } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { accountByEmail, accountById } from "@/db/server/accounts";
import type { Database } from "@/db/server/connection";
import { ledgerOf } from "@/db/server/ledger-entries";
import { recordOf } from "@/db/server/record-as-it-stands";
import { type Imported, importRecord } from "@/db/server/record-import";
import { testById } from "@/db/server/tests";
import { vesselsByName } from "@/db/server/vessels";
import { chainHead } from "@/lib/ledger/hash-chain";
import { incliningResult } from "@/lib/lightship/inclining-result";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";
import { recordedReadings } from "@/lib/sync/recorded-reading";
import { at, yard } from "./yard";

const whole: TestRecord = { ...skerryTern().record, readings: skerryTernReadings(1) };
type Batten = TestRecord["readings"]["battens"][number];

function imported(record: TestRecord) {
  const { db, engineer } = yard();
  const { test: id } = promised(importRecord(db, record, { by: engineer.id, at }));
  return { db, engineer, id, record: recordOf(db, id) };
}

test("gives the same readings, plan and result as the file it came from", () => {
  const { record } = imported(whole);
  expect(counting(record)).toEqual(counting(whole));
  expect({ ...record, readings: null, moves: null }).toEqual({ ...whole, readings: null, moves: null });
  expect(record.moves).toEqual(whole.moves);
  const [before, after] = [promised(incliningResult(whole)), promised(incliningResult(record))];
  // the readings come back in another order: sums differ in their last binary places only
  expect(after.lightship.vcg).toBeCloseTo(before.lightship.vcg, 10);
  expect(after.fit.slope).toBeCloseTo(before.fit.slope, 14);
});

test("changes nothing when the same file is read in twice", () => {
  const { db, engineer, id } = imported(whole);
  const before = sizes(db, id);
  expect(importRecord(db, whole, { by: engineer.id, at })).toEqual({ ok: true, value: { test: id, isNew: false } satisfies Imported });
  expect(sizes(db, id)).toEqual(before);
});

test("refuses another file of a test that is here, and changes nothing", () => {
  const { db, engineer, id } = imported(whole);
  const before = sizes(db, id);
  const other = importRecord(db, { ...whole, aboard: [] }, { by: engineer.id, at });
  expect(other).toMatchObject({ ok: false, refusal: { faults: [{ path: "test.id" }] } });
  expect(sizes(db, id)).toEqual(before);
});

test("holds every reading as an event, in a chain that fits, in a test whose readings are over", () => {
  const { db, id } = imported(whole);
  expect(sizes(db, id).events).toBe(recordedReadings(whole.readings).length);
  expect(chainHead(ledgerOf(db, id)).ok).toBe(true);
  expect(testById(db, id)?.state).toBe("closed");
});

test("keeps what does not count from counting: void, superseded, relayed behind the station's own", () => {
  const [first, second, third, ...others] = whole.readings.battens as [Batten, Batten, Batten, ...Batten[]];
  const relayed: Batten = { ...third, id: crypto.randomUUID(), source: "radio", status: "superseded" };
  const battens: Batten[] = [{ ...first, status: "void" }, { ...second, status: "superseded" }, third, relayed, ...others];
  const given = { ...whole, readings: { ...whole.readings, battens } };
  const { record } = imported(given);
  expect(counting(record)).toEqual(counting(given));
  const statusOf = (id: string) => record.readings.battens.find((reading) => reading.id === id)?.status;
  expect([first.id, second.id, relayed.id].map(statusOf)).toEqual(["void", "void", "superseded"]);
});

test("counts together what the record counts together, though it lies beyond the limit", () => {
  const [first] = whole.readings.drafts;
  const second = { ...first, id: crypto.randomUUID(), value: (first?.value ?? 0) + 0.05 } as TestRecord["readings"]["drafts"][number];
  const given = { ...whole, readings: { ...whole.readings, drafts: [...whole.readings.drafts, second] } };
  expect(counting(imported(given).record)).toEqual(counting(given));
});

test("leaves a disagreement of the record open", () => {
  const [first, ...others] = whole.readings.drafts as [TestRecord["readings"]["drafts"][number]];
  const open = [first, { ...first, id: crypto.randomUUID(), value: first.value + 0.05 }].map((one) => ({
    ...one,
    status: "disagrees" as const,
  }));
  const given = { ...whole, readings: { ...whole.readings, drafts: [...open, ...others] } };
  const { record } = imported(given);
  expect(record.readings.drafts.filter(({ status }) => status === "disagrees")).toHaveLength(2);
  expect(counting(record)).toEqual(counting(given));
});

test("brings back repeats, moves left out, times, series and readers", () => {
  const closed = { openedAt: "2026-05-04T09:00:00.000Z", closedAt: "2026-05-04T09:10:00.000Z" };
  const moves = whole.moves.map((move) =>
    move.no === 2 ? { ...move, repeat: 2, ...closed } : move.no === 5 ? { ...move, ...closed, excluded: "gust" } : move,
  );
  const battens = whole.readings.battens.map((reading) => ({
    ...reading,
    reader: "Mara Quist",
    ...(reading.move === 2 ? { repeat: 2 } : {}),
  }));
  const stations = whole.stations.map((station) =>
    station.id === "A" ? { ...station, series: [{ no: 2, length: 4 }] } : station,
  ) as TestRecord["stations"];
  const given = { ...whole, stations, moves, readings: { ...whole.readings, battens } };
  const { record } = imported(given);
  expect(record.moves).toEqual(moves);
  expect(record.stations).toEqual(stations);
  expect(counting(record)).toEqual(counting(given));
  expect(new Set(record.readings.battens.map(({ reader }) => reader))).toEqual(new Set(["Mara Quist"]));
});

test("gives the readers it names accounts that nobody can sign in with", () => {
  const battens = whole.readings.battens.map((reading) => ({ ...reading, reader: "Mara Quist" }));
  const { db, record } = imported({ ...whole, readings: { ...whole.readings, battens } });
  const author = db.$client.prepare("select author from readings where slot_key like 'batten/%'").pluck().get() as string;
  expect(accountById(db, author)).toMatchObject({ name: "Mara Quist", email: null, passwordHash: null, closedAt: at });
  expect(record.readings.battens.length).toBe(battens.length);
});

test("refuses a reading that the plan has no place for, with its path, and leaves nothing behind", () => {
  const { db, engineer } = yard();
  const [first, ...others] = whole.readings.drafts as [TestRecord["readings"]["drafts"][number]];
  const given = {
    ...whole,
    vessel: { ...whole.vessel, name: "Other" },
    readings: { ...whole.readings, drafts: [first, { ...first, id: crypto.randomUUID(), mark: "XX" }, ...others] },
  };
  const refused = importRecord(db, given, { by: engineer.id, at });
  expect(refused).toMatchObject({ ok: false, refusal: { type: "RecordRefused", faults: [{ path: "readings.drafts[1]" }] } });
  expect(testById(db, whole.test.id)).toBeUndefined();
  expect(vesselsByName(db).map(({ name }) => name)).toEqual(["MV Skerry Tern"]);
  expect(ledgerOf(db, whole.test.id)).toEqual([]);
  expect(accountByEmail(db, "ellen@yard.example")?.id).toBe(engineer.id);
});

test("refuses one move number in two sessions: readings due know a move by its number", () => {
  const { db, engineer } = yard();
  const moves = [...whole.moves, { ...whole.moves[0], session: 2 } as TestRecord["moves"][number]];
  const refused = importRecord(db, { ...whole, moves }, { by: engineer.id, at });
  expect(refused).toMatchObject({ ok: false, refusal: { faults: [{ path: "moves[9].no" }] } });
});

test("knows the vessel again that is written in the same way, and makes another where she differs", () => {
  const { previous, ...withoutEarlier } = whole;
  expect(vesselsByName(imported(withoutEarlier).db)).toHaveLength(1);
  expect(vesselsByName(imported({ ...withoutEarlier, vessel: { ...whole.vessel, depth: 5.5 } }).db)).toHaveLength(2);
});

/** What the reduction takes of the readings, in an order of its own. */
function counting(record: TestRecord) {
  const accepted = recordedReadings(record.readings).filter(({ status = "accepted" }) => status === "accepted");
  return accepted.map(({ id, slot, value, source = "station" }) => ({ id, slot, value, source })).sort((a, b) => (a.id < b.id ? -1 : 1));
}

function sizes(db: Database, id: string) {
  const count = (sql: string) => db.$client.prepare(sql).pluck().get();
  const events = count("select count(*) from events where type = 'record'");
  return {
    events,
    entries: ledgerOf(db, id).length,
    all: count("select count(*) from ledger_entries"),
    accounts: count("select count(*) from accounts"),
  };
}
