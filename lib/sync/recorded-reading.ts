import type { TestRecord } from "@/lib/record/test-record";
import { type ReadingValue, valueSchemas } from "./event";
import type { Slot, SlotKind } from "./slot";

/** A reading as a test record writes it, and as a value in a slot: the one place that knows both. */

type Readings = TestRecord["readings"];
type Draft = Readings["drafts"][number];
type Provenance = Pick<Draft, "reader" | "device" | "takenAt" | "source" | "reason" | "status">;
export type RecordedReading = Provenance & {
  readonly id: string;
  readonly slot: Slot;
  readonly value: ReadingValue;
  /** its place in the document */
  readonly path: string;
};

/** All readings of a record, each with its slot and its value. What the document leaves out (round, repeat, series) is what it means. */
export function recordedReadings({ battens, drafts, freeboards = [], soundings, water, conditions = [] }: Readings): RecordedReading[] {
  return [
    ...drafts.map((reading, i) => markReading("draft", reading, `readings.drafts[${i}]`)),
    ...freeboards.map((reading, i) => markReading("freeboard", reading, `readings.freeboards[${i}]`)),
    ...soundings.map((reading, i) => soundingReading(reading, `readings.soundings[${i}]`)),
    ...water.map((reading, i) => waterReading(reading, `readings.water[${i}]`)),
    ...battens.map((reading, i) => battenReading(reading, `readings.battens[${i}]`)),
    ...conditions.map((reading, i) => conditionReading(reading, `readings.conditions[${i}]`)),
  ];
}

/** The readings of a record from values in slots. Positions, lengths and notes are no readings of a record and are left out. */
export function readingsOfRecord(
  given: readonly Omit<RecordedReading, "path">[],
  sessionOf: (move: number) => number | undefined = () => undefined,
): Required<Readings> {
  const soundings = [...listOf(given, "sounding"), ...listOf(given, "ballast")];
  return {
    battens: listOf(given, "batten").map(({ slot, value, head }) => {
      const { move, station, series, repeat } = slot;
      const session = sessionOf(move);
      return { ...head, move, station, series, repeat, ...(session === undefined ? {} : { session }), ...value };
    }),
    drafts: listOf(given, "draft").map(({ slot: { mark, round }, value, head }) => ({ ...head, mark, round, ...value })),
    freeboards: listOf(given, "freeboard").map(({ slot: { mark, round }, value, head }) => ({ ...head, mark, round, ...value })),
    soundings: soundings.map(({ slot: { kind, ...place }, value, head }) => ({ ...head, ...place, ...value })),
    water: listOf(given, "water").map(({ slot: { kind, ...place }, value, head }) => ({ ...head, ...place, ...value })),
    conditions: listOf(given, "condition").map(({ slot: { move }, value, head }) => ({ ...head, move, ...value })),
  };
}

type SlotOf<K extends SlotKind> = Extract<Slot, { kind: K }>;
type ValueOf<K extends SlotKind> = ReturnType<(typeof valueSchemas)[K]["parse"]>;
type Listed<K extends SlotKind> = { readonly slot: SlotOf<K>; readonly value: ValueOf<K>; readonly head: { id: string } & Provenance };

function listOf<K extends SlotKind>(given: readonly Omit<RecordedReading, "path">[], kind: K): Listed<K>[] {
  return given.flatMap(({ id, slot, value, ...rest }) => {
    if (slot.kind !== kind) return [];
    return [{ slot: slot as SlotOf<K>, value: valueSchemas[kind].parse(value) as ValueOf<K>, head: { id, ...provenanceOf(rest) } }];
  });
}

function markReading(kind: "draft" | "freeboard", { mark, round, value, estimates, ...head }: Draft, path: string): RecordedReading {
  return { ...head, path, slot: { kind, mark, round }, value: { value, ...(estimates ? { estimates } : {}) } };
}

function soundingReading({ tank, round, move, value, ...head }: Readings["soundings"][number], path: string): RecordedReading {
  const slot: Slot = move === undefined ? { kind: "sounding", tank, round: round ?? "before" } : { kind: "ballast", tank, move };
  return { ...head, path, slot, value: { value } };
}

function waterReading(reading: Readings["water"][number], path: string): RecordedReading {
  const { place, depth, round = "before", density, hydrometer, temperature, ...head } = reading;
  const value = { density, ...(hydrometer === undefined ? {} : { hydrometer }), ...(temperature === undefined ? {} : { temperature }) };
  return { ...head, path, slot: { kind: "water", place, depth, round }, value };
}

function battenReading(reading: Readings["battens"][number], path: string): RecordedReading {
  const { id, move, station, series = 1, repeat = 1, session, reader, device, takenAt, source, reason, status, ...value } = reading;
  return {
    id,
    ...provenanceOf({ reader, device, takenAt, source, reason, status }),
    path,
    slot: { kind: "batten", move, repeat, station, series },
    value,
  };
}

function conditionReading(reading: NonNullable<Readings["conditions"]>[number], path: string): RecordedReading {
  const { id, move, reader, device, takenAt, source, reason, status, ...value } = reading;
  return { id, ...provenanceOf({ reader, device, takenAt, source, reason, status }), path, slot: { kind: "condition", move }, value };
}

function provenanceOf({ reader, device, takenAt, source, reason, status }: Provenance): Provenance {
  const all = { reader, device, takenAt, source, reason, status };
  return Object.fromEntries(Object.entries(all).filter(([, value]) => value !== undefined));
}
