import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import { type EventBody, type EventType, eventBodySchema, type ReadingValue, readingValueSchema, valueSchemas } from "@/lib/sync/event";
import type { SlotKind } from "@/lib/sync/slot";
import { battenA, correct, idOf, noReading, one, order, phones, record, resolve, settled, takenBack } from "./sample-acts";

const wheelhouseAct = { ...record(1), ...noReading };
const samples: Record<EventType, EventBody> = {
  record: record(1, { mode: "turning-points", valuesMm: [101, 97.5, 100.5] }),
  correct: correct(2, 1, settled(101.5), { reason: "Read the wrong side of the wire" }),
  void: takenBack(3, 1),
  resolve: resolve(4, [1, 2], one(2)),
  assign: { ...wheelhouseAct, type: "assign", slot: battenA, payload: { event: idOf(9) } },
  release: { ...wheelhouseAct, type: "release", payload: { event: idOf(9) } },
  "move.open": order(5, "move.open", 0),
  "move.close": order(6, "move.close", 1),
  "move.repeat": order(7, "move.repeat", 1, 2),
  "move.exclude": order(8, "move.exclude", 1, 1, { reason: "A tug went by" }),
  "station.series": { ...wheelhouseAct, type: "station.series", payload: { station: "A", series: 2, length: 3.215 } },
  "session.open": { ...wheelhouseAct, type: "session.open", payload: { session: 2 } },
  "session.close": { ...wheelhouseAct, type: "session.close", payload: { session: 1 } },
  "device.writeOff": { ...wheelhouseAct, type: "device.writeOff", reason: "Went overboard", payload: { device: phones.forward } },
  attest: { ...wheelhouseAct, type: "attest", payload: { head: "0".repeat(64) } },
};

const values: Record<SlotKind, ReadingValue> = {
  batten: { mode: "settled", portMm: [212], starboardMm: [187.5] },
  draft: { value: 2.013, estimates: [2.01, 2.016] },
  freeboard: { value: -0.02 },
  sounding: { value: 0 },
  ballast: { value: 1.2 },
  water: { density: 1.0232, hydrometer: "H1", temperature: 11.5 },
  position: { place: [25, -4, 5.6] },
  length: { length: 4.002 },
  condition: { wind: "NE 3", underKeel: 1.5, moorings: "slack", headcount: 9, bobFree: true, note: "A tug went by" },
  note: { text: "Lost the bob at 10:12" },
};

describe("the photographs of a reading", () => {
  const named = (photographs: unknown) => eventBodySchema.safeParse({ ...samples.record, photographs }).success;

  it("stand beside its value, by their hashes, and may be left out as before there were any", () => {
    expect(eventBodySchema.parse(samples.record)).not.toHaveProperty("photographs");
    expect([["0".repeat(64)], [], ["IMG_0412.jpg"], null].map(named)).toEqual([true, false, false, false]);
    expect(eventBodySchema.safeParse({ ...samples.void, photographs: ["0".repeat(64)] }).success).toBe(false);
  });
});

describe("an event", () => {
  it.each(Object.entries(samples))("%s is read from its canonical text as it was written", (_, body) => {
    expect(eventBodySchema.parse(JSON.parse(canonicalJson(body)))).toEqual(body);
  });

  it("for any reading is read as it was written", () => {
    // JSON reads minus zero back as zero
    const finite = fc.double({ noNaN: true, noDefaultInfinity: true }).map((mm) => mm + 0);
    const value = fc.record({
      mode: fc.constantFrom("settled" as const, "turning-points" as const),
      valuesMm: fc.array(finite, { minLength: 1, maxLength: 60 }),
    });
    fc.assert(
      fc.property(value, fc.maxSafeNat(), fc.option(fc.maxSafeInteger()), fc.uuid(), (payload, seq, clockOffsetMs, author) => {
        const body = record(1, payload, {
          seq: Math.max(1, seq),
          clockOffsetMs,
          author,
        });
        expect(eventBodySchema.parse(JSON.parse(canonicalJson(body)))).toEqual(body);
      }),
    );
  });

  it.each<[string, object]>([
    ["of another version", { v: 2 }],
    ["of a type nobody knows", { type: "reread" }],
    ["with a word nobody knows", { value: 100 }],
    ["numbered 0: a device counts from 1", { seq: 0 }],
    ["numbered between two numbers", { seq: 1.5 }],
    ["whose id is none", { id: "17" }],
    ["without an author", { author: undefined }],
    ["without the tag of its job sheet", { jobTag: "" }],
    ["captured at local time", { capturedAt: "2026-05-04T09:12:00+02:00" }],
    ["captured on a day, not at a time", { capturedAt: "2026-05-04" }],
    ["with an empty reason", { reason: " " }],
    ["with half a character, which has no bytes to sign", { reason: "Read again \ud83d" }],
    ["without a place for its reading", { slot: null }],
    ["that is new and yet stands on another", { base: idOf(2) }],
    ["that nobody can say how it came", { source: null }],
    ["without a figure", { payload: { mode: "settled", valuesMm: [] } }],
    ["with more figures than a swing has", { payload: settled(...new Array(61).fill(100)) }],
    ["with a figure of no kind", { payload: { mode: "settled", valuesMm: ["101"] } }],
  ])("is refused %s", (_, changes) => {
    expect(eventBodySchema.safeParse({ ...record(1), ...changes }).success).toBe(false);
  });

  it.each<[string, EventBody, object]>([
    ["a correction of nothing", samples.correct, { base: null }],
    ["a void with a value", samples.void, { payload: settled(100) }],
    ["a decision on no head", samples.resolve, { base: [] }],
    ["a decision without a choice", samples.resolve, { payload: {} }],
    ["a choice of one that says not which", samples.resolve, { payload: { choice: "one" } }],
    ["a mean that brings a value of its own", samples.resolve, { payload: { choice: "mean", value: settled(100) } }],
    ["an orphan that is given no place", samples.assign, { slot: null }],
    ["a repeat of a move below the first", samples["move.repeat"], { payload: { move: 1, repeat: 0 } }],
    ["a series of no length at all", samples["station.series"], { payload: { station: "A", series: 2, length: 0 } }],
    ["an attest of half a head", samples.attest, { payload: { head: "0".repeat(63) } }],
    ["an attest in capitals", samples.attest, { payload: { head: "A".repeat(64) } }],
  ])("refuses %s", (_, body, changes) => {
    expect(eventBodySchema.safeParse(body).success).toBe(true);
    expect(eventBodySchema.safeParse({ ...body, ...changes }).success).toBe(false);
  });

  it("lets a decision name a single head: a late reading may stand alone", () => {
    expect(eventBodySchema.safeParse(resolve(4, [1], one(1))).success).toBe(true);
  });
});

describe("a value", () => {
  it.each(Object.entries(values))("of a %s is read as one of its kind and as one of any", (kind, value) => {
    expect(valueSchemas[kind as SlotKind].parse(value)).toEqual(value);
    expect(readingValueSchema.parse(value)).toEqual(value);
  });

  it.each<[SlotKind, unknown]>([
    ["batten", { mode: "settled", valuesMm: [100], valuesDegrees: [0.7] }],
    ["batten", { mode: "settled", portMm: [100] }],
    ["draft", { value: Number.NaN }],
    ["sounding", { value: -0.01 }],
    ["ballast", { value: 1, estimates: [1] }],
    ["water", { density: 0 }],
    ["position", { place: [25, -4] }],
    ["length", { length: -4 }],
    ["condition", { headcount: -1 }],
    ["note", { text: "" }],
  ])("of a %s is refused as %j", (kind, value) => {
    expect(valueSchemas[kind].safeParse(value).success).toBe(false);
  });
});
