import { v5 } from "uuid";
import type { TestRecord } from "@/lib/record/test-record";
import { type RecordedReading, recordedReadings } from "@/lib/sync/recorded-reading";
import { slotKey } from "@/lib/sync/slot-key";
import { noReading, type WrittenAct } from "./event-writer";

/** An act that brings a part of a record into the events, and the place of that part in the document. */
export type ImportAct = { readonly act: WrittenAct; readonly path: string };

/** Who stands behind the acts: the person who imports, and an account for each reader that the record names. */
export type Authors = { readonly importer: string; readonly of: (reader: string | undefined) => string };

/** The same act of the same record has the same id: reading a file in twice can't double it. */
export function actId(test: string, what: string): string {
  return v5(what, test);
}

/** The acts of the wheelhouse that a record tells of: repeats, series beyond the plan, moves opened, closed and left out. */
export function movesToActs(record: TestRecord, { importer }: Authors): ImportAct[] {
  const { test } = record;
  return record.moves.flatMap((move, i) => {
    const { no, openedAt, closedAt, excluded } = move;
    const repeat = highestRepeat(record, no);
    const payload = { move: no, repeat };
    const told: [WrittenAct["type"], string | undefined, string | null][] = [
      ["move.repeat", repeat > 1 ? noonOf(record) : undefined, null],
      ["move.open", openedAt, null],
      ["move.close", closedAt, null],
      ["move.exclude", excluded === undefined ? undefined : (closedAt ?? noonOf(record)), excluded ?? null],
    ];
    return told.flatMap(([type, capturedAt, reason]) => {
      if (capturedAt === undefined) return [];
      const id = actId(test.id, `${type} ${no} ${repeat}`);
      const act = { type, ...noReading, id, payload, author: importer, capturedAt, clockOffsetMs: null, reason } as WrittenAct;
      return [{ act, path: `moves[${i}]` }];
    });
  });
}

/** Series that readings speak of and the plan does not. */
export function seriesToActs(record: TestRecord, { importer }: Authors): ImportAct[] {
  const planned = new Map(record.stations.map(({ id, series = [] }) => [id, Math.max(1, ...series.map(({ no }) => no))]));
  const read = new Map<string, number>();
  for (const { station, series = 1 } of record.readings.battens) read.set(station, Math.max(read.get(station) ?? 1, series));
  return [...read].flatMap(([station, series]) => {
    if (series <= (planned.get(station) ?? Number.POSITIVE_INFINITY)) return [];
    const id = actId(record.test.id, `station.series ${station} ${series}`);
    const common = { id, author: importer, capturedAt: noonOf(record), clockOffsetMs: null, reason: null };
    return [{ act: { type: "station.series" as const, ...noReading, ...common, payload: { station, series } }, path: "stations" }];
  });
}

/** Every reading, whatever has become of it. */
export function readingsToActs(record: TestRecord, authors: Authors): ImportAct[] {
  return recordedReadings(record.readings).map((reading) => ({ path: reading.path, act: recordAct(record, reading, authors) }));
}

/** What takes a reading out again that the record itself does not count; a value stepping back behind the station's own does so by itself. */
export function withdrawalsToActs(record: TestRecord, authors: Authors): ImportAct[] {
  const all = recordedReadings(record.readings);
  return all
    .filter((reading) => isWithdrawn(reading, all))
    .map((reading) => ({ path: reading.path, act: voidAct(record, reading, authors) }));
}

/** The readings of a record that count, by slot. */
export function acceptedBySlot(record: TestRecord): Map<string, RecordedReading[]> {
  const bySlot = new Map<string, RecordedReading[]>();
  for (const reading of recordedReadings(record.readings).filter(isAccepted)) {
    const key = slotKey(reading.slot);
    bySlot.set(key, [...(bySlot.get(key) ?? []), reading]);
  }
  return bySlot;
}

/** Lets readings stand together that the record counts although they lie further apart than the limit. */
export function meanAct(record: TestRecord, key: string, heads: readonly string[], { importer }: Authors): WrittenAct {
  const reason = "Counted together in the record that was read in";
  const common = { id: actId(record.test.id, `resolve ${key}`), author: importer, capturedAt: noonOf(record), clockOffsetMs: null, reason };
  return { type: "resolve", reading: null, base: [...heads], slot: null, source: null, payload: { choice: "mean" }, ...common };
}

export function readingEvent(record: TestRecord, reading: string): string {
  return actId(record.test.id, `record ${reading}`);
}

/** Where the record gives no time: noon of its day. */
function noonOf({ test }: TestRecord): string {
  return `${test.date}T12:00:00.000Z`;
}

function recordAct(record: TestRecord, reading: RecordedReading, authors: Authors): WrittenAct {
  const { id, slot, value, source = "station", takenAt, reason = null } = reading;
  const common = { author: authors.of(reading.reader), capturedAt: takenAt ?? noonOf(record), clockOffsetMs: null, reason };
  return { type: "record", id: readingEvent(record, id), reading: id, base: null, slot, payload: value, source, ...common };
}

function voidAct(record: TestRecord, { id, slot, takenAt, status }: RecordedReading, { importer }: Authors): WrittenAct {
  const common = { id: actId(record.test.id, `void ${id}`), author: importer, capturedAt: takenAt ?? noonOf(record), clockOffsetMs: null };
  const reason = `Marked ${status} in the record that was read in`;
  return { type: "void", reading: id, base: readingEvent(record, id), slot, source: null, payload: {}, reason, ...common };
}

function isWithdrawn(reading: RecordedReading, all: readonly RecordedReading[]): boolean {
  if (isAccepted(reading) || reading.status === "disagrees") return false;
  const isRelayed = (reading.source ?? "station") !== "station";
  return !(reading.status === "superseded" && isRelayed && hasOwnReading(reading, all));
}

function hasOwnReading({ slot }: RecordedReading, all: readonly RecordedReading[]): boolean {
  const key = slotKey(slot);
  return all.some((other) => isAccepted(other) && (other.source ?? "station") === "station" && slotKey(other.slot) === key);
}

function isAccepted({ status = "accepted" }: RecordedReading): boolean {
  return status === "accepted";
}

function highestRepeat({ moves, readings }: TestRecord, no: number): number {
  const told = moves.filter((move) => move.no === no).map(({ repeat = 1 }) => repeat);
  const read = readings.battens.filter(({ move }) => move === no).map(({ repeat = 1 }) => repeat);
  return Math.max(1, ...told, ...read);
}
