import type { EventBody, EventOf, ReadingValue } from "@/lib/sync/event";
import type { Slot } from "@/lib/sync/slot";
import type { Stamped } from "@/lib/sync/slot-heads";

/** The n-th id; ids sort as their numbers do, as those of one phone sort by time. */
export function idOf(n: number): string {
  return `0190a5d1-0000-7000-8000-${String(n).padStart(12, "0")}`;
}

const person = (n: number) => `5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c${n}`;
export const people = { reader: person(10), otherReader: person(11), lead: person(12) };
export const phones = { aft: person(20), forward: person(21), wheelhouse: person(22) };
export const testId = person(30);

export const battenA: Extract<Slot, { kind: "batten" }> = { kind: "batten", move: 1, repeat: 1, station: "A", series: 1 };

/** What anybody does at 09:12 of the day of the test, from the phone aft. */
const act = {
  v: 1 as const,
  device: phones.aft,
  test: testId,
  jobTag: "tag",
  author: people.reader,
  capturedAt: "2026-05-04T09:12:00.000Z",
  clockOffsetMs: null,
  reason: null,
};
export const noReading = { reading: null, base: null, slot: null, source: null };

export function settled(...valuesMm: number[]): ReadingValue {
  return { mode: "settled", valuesMm };
}

export function record(n: number, payload: ReadingValue = settled(100), changes: Partial<EventOf<"record">> = {}): EventOf<"record"> {
  return {
    ...act,
    id: idOf(n),
    seq: n,
    type: "record",
    reading: idOf(n),
    base: null,
    slot: battenA,
    payload,
    source: "station",
    ...changes,
  };
}

export function correct(
  n: number,
  base: number,
  payload: ReadingValue = settled(100),
  changes: Partial<EventOf<"correct">> = {},
): EventOf<"correct"> {
  return { ...record(n), type: "correct", reading: idOf(base), base: idOf(base), payload, ...changes };
}

export function takenBack(n: number, base: number, changes: Partial<EventOf<"void">> = {}): EventOf<"void"> {
  return { ...record(n), type: "void", reading: idOf(base), base: idOf(base), payload: {}, source: null, reason: "Mistyped", ...changes };
}

export function resolve(n: number, bases: readonly number[], payload: EventOf<"resolve">["payload"]): EventOf<"resolve"> {
  const settling = { reading: null, base: bases.map(idOf), source: null, author: people.lead, reason: "Read again" };
  return { ...record(n), ...settling, type: "resolve", payload };
}

export function one(head: number): EventOf<"resolve">["payload"] {
  return { choice: "one", head: idOf(head) };
}

type WheelhouseType = "move.open" | "move.close" | "move.repeat" | "move.exclude";

/** An act of the wheelhouse on a run of a move. */
export function order<T extends WheelhouseType>(n: number, type: T, move: number, repeat = 1, changes: Partial<EventBody> = {}) {
  return {
    ...record(n),
    ...noReading,
    author: people.lead,
    device: phones.wheelhouse,
    type,
    payload: { move, repeat },
    ...changes,
  } as EventOf<T>;
}

/** As the server takes it in: in the order of their numbers, a minute after each other from 10:00. */
export function stamped<E extends EventBody>(body: E, receivedAt = received(body.seq)): Stamped<E> {
  return { body, serverSeq: body.seq, receivedAt };
}

/** When the n-th act came in. */
export function received(n: number): string {
  return `2026-05-04T10:${String(n).padStart(2, "0")}:00.000Z`;
}
