import type { TestRecord } from "@/lib/record/test-record";
import { usualAgreement } from "@/lib/sync/agreement";
import type { EventOf, ReadingValue } from "@/lib/sync/event";
import type { LiveSnapshot, MoveProgress, ReadingDue } from "@/lib/sync/live";
import { type MoveEvent, moveProgress } from "@/lib/sync/move-progress";
import { type DuePlan, ordered, readingsDue } from "@/lib/sync/readings-due";
import type { Slot } from "@/lib/sync/slot";
import type { SlotEvent } from "@/lib/sync/slot-heads";
import { slotKey } from "@/lib/sync/slot-key";
import { slotProjection } from "@/lib/sync/slot-projection";
import { bargeRecord } from "./barge";

const device = "0190a5d1-5d00-4000-8000-0000000000d1";
const author = "0190a5d1-5d00-4000-8000-0000000000a1";
let seq = 0;

export type Called = { readonly slot: Slot; readonly value: ReadingValue; readonly source?: "station" | "radio"; readonly from?: string };

export function battenSlot(move: number, station: string): Slot {
  return { kind: "batten", move, repeat: 1, station, series: 1 };
}

/** A live view worked out by the project's own rules from what was recorded and ordered; no move is excluded. */
export function bargeSnapshot({
  read,
  open,
  called = [],
}: {
  read: number;
  open: number | null;
  called?: readonly Called[];
}): LiveSnapshot {
  const record = bargeRecord(read);
  const plan: DuePlan = { ...record, waterPlaces: [{ place: "midships", depth: 1 }], rounds: ["before"] };
  const recorded = [...record.readings.battens.map(calledFrom), ...called].map(recordedEvent);
  return {
    cursor: recorded.length,
    epoch: "0190a5d1-5d00-4000-8000-0000000000e1",
    state: "open",
    record: withStatuses(record, recorded),
    phones: [],
    due: readingsDue(plan, ordered(plan, [])).map((slot) => readingDue(slot, recorded)),
    moves: progress(record, read, open),
    quarantined: [],
    ledgerHead: "0".repeat(64),
  };
}

function calledFrom(reading: TestRecord["readings"]["battens"][number]): Called {
  const { move, station, id: _, ...rest } = reading;
  const value = Object.fromEntries(Object.entries(rest).filter(([key]) => /mode|Mm$|Degrees$/.test(key))) as ReadingValue;
  return { slot: battenSlot(move, station), value };
}

function recordedEvent({ slot, value, source = "station", from = author }: Called): SlotEvent {
  seq += 1;
  const id = `0190a5d1-5d00-7000-8000-${String(seq).padStart(12, "0")}`;
  const act = { v: 1, id, device, seq, test: "0190a5d1-5d00-7000-8000-000000000001", jobTag: "plan", author: from } as const;
  const taken = { capturedAt: "2026-05-04T09:12:31.250Z", clockOffsetMs: 0, reason: null };
  const body: EventOf<"record"> = { ...act, ...taken, type: "record", reading: id, base: null, slot, payload: value, source };
  return { body, serverSeq: seq, receivedAt: "2026-05-04T09:12:40.000Z" };
}

function readingDue(slot: Slot, recorded: readonly SlotEvent[]): ReadingDue {
  const events = recorded.filter(({ body }) => body.slot !== null && slotKey(body.slot) === slotKey(slot));
  const { state, readings, heads } = slotProjection(slot.kind, events, { limits: usualAgreement, reconciledAt: null });
  const standing = readings.map(({ corrects, ...reading }) => ({
    ...reading,
    corrected: corrects,
    late: false,
    capturedAfterClose: false,
  }));
  return { slot, slotKey: slotKey(slot), state, heads, readings: standing };
}

/** Readings called beside the record's own enter it with the status that the slot gives them. */
function withStatuses(record: TestRecord, recorded: readonly SlotEvent[]): TestRecord {
  const battens = recorded.flatMap(({ body }) => {
    if (body.type !== "record" || body.slot.kind !== "batten" || !("mode" in body.payload)) return [];
    const standing = readingDue(body.slot, recorded).readings.find((reading) => reading.event === body.id);
    const { move, station } = body.slot;
    return [{ id: body.id, move, station, source: body.source, status: standing?.status ?? ("accepted" as const), ...body.payload }];
  });
  return { ...record, readings: { ...record.readings, battens } };
}

function progress(record: TestRecord, read: number, open: number | null): MoveProgress[] {
  const opened = record.moves.filter(({ no }) => no <= read || no === open);
  const closed = opened.filter(({ no }) => no !== open);
  const events = [...opened.map(({ no }) => ordering("move.open", no)), ...closed.map(({ no }) => ordering("move.close", no))];
  return moveProgress(
    record.moves.map(({ no }) => no),
    events,
  ).map(({ move, ...run }) => ({ ...run, no: move, label: `Move ${move} of the plan` }));
}

function ordering(type: "move.open" | "move.close", move: number): MoveEvent {
  seq += 1;
  const id = `0190a5d1-5d00-7000-8000-${String(seq).padStart(12, "0")}`;
  const act = { v: 1, id, device, seq, test: "0190a5d1-5d00-7000-8000-000000000001", jobTag: "plan", author } as const;
  const at = { capturedAt: "2026-05-04T09:10:00.000Z", clockOffsetMs: 0, reason: null };
  const body = { ...act, ...at, type, reading: null, base: null, slot: null, source: null, payload: { move, repeat: 1 } } as const;
  return { body, serverSeq: seq, receivedAt: "2026-05-04T09:10:01.000Z" };
}
