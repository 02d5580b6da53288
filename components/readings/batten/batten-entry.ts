import type { z } from "zod";
import { typedNumber, typedText } from "@/components/ui/typed-number";
import { restingPoint } from "@/lib/inclining/resting-point";
import type { BattenMode, BattenValue } from "@/lib/inclining/test-readings";
import type { battenValueSchema } from "@/lib/record/readings-schema";
import { answer, type Result, refuse } from "@/lib/result";
import type { JobSheet } from "@/lib/sync/job-sheet";
import { type PadKey, typedAfter } from "../pad/typed-keys";

export type Station = JobSheet["stations"][number];
export type Leg = "whole" | "port" | "starboard";

/** A batten reading while it is being typed: the marks taken and the digits of the next one, per leg. */
export type BattenEntry = {
  readonly mode: BattenMode;
  readonly leg: Leg;
  readonly marks: Readonly<Record<Leg, readonly string[]>>;
  readonly typing: Readonly<Record<Leg, string>>;
};

/** As an event holds it. */
export type KeptBatten = z.infer<typeof battenValueSchema>;

export type EntryRefusal =
  | { readonly type: "NothingTyped"; readonly leg: Leg; readonly otherLegRead: boolean }
  | { readonly type: "OutsideScale"; readonly value: number; readonly scale: readonly [number, number] }
  | { readonly type: "TooFewTurningPoints"; readonly got: number; readonly needed: number };

export function emptyBattenEntry(instrument: Station["instrument"]): BattenEntry {
  const leg = instrument === "u-tube" ? "port" : "whole";
  return { mode: "settled", leg, marks: { whole: [], port: [], starboard: [] }, typing: { whole: "", port: "", starboard: "" } };
}

export function legsOf(instrument: Station["instrument"]): readonly Leg[] {
  return instrument === "u-tube" ? ["port", "starboard"] : ["whole"];
}

export function withKey(entry: BattenEntry, key: PadKey): BattenEntry {
  return { ...entry, typing: { ...entry.typing, [entry.leg]: typedAfter(entry.typing[entry.leg], key) } };
}

/** The digits typed become a mark, and the next one starts empty. */
export function withMarkTaken(entry: BattenEntry): BattenEntry {
  const text = entry.typing[entry.leg];
  if (typedNumber(text) === null) return entry;
  return {
    ...entry,
    marks: { ...entry.marks, [entry.leg]: [...entry.marks[entry.leg], text] },
    typing: { ...entry.typing, [entry.leg]: "" },
  };
}

export function withoutMark(entry: BattenEntry, index: number): BattenEntry {
  return { ...entry, marks: { ...entry.marks, [entry.leg]: entry.marks[entry.leg].filter((_, i) => i !== index) } };
}

/** Every number of one leg: the marks taken, then the one being typed. */
export function legValues(entry: BattenEntry, leg: Leg): number[] {
  return [...entry.marks[leg], entry.typing[leg]].map(typedNumber).filter((value) => value !== null);
}

/** Where the bob or the level of one leg rests by what is typed so far; null while it can't be told. */
export function restOf(entry: BattenEntry, leg: Leg): number | null {
  const rest = restingPoint(entry.mode, legValues(entry, leg));
  return rest.ok ? rest.value.value : null;
}

/**
 * The reading as it is kept, in the order typed.
 * Refused: a leg without a number; a number the station's scale does not hold; too few turning points.
 */
export function battenValue(entry: BattenEntry, station: Station): Result<KeptBatten, EntryRefusal> {
  for (const leg of legsOf(station.instrument)) {
    const refusal = legRefusal(entry, leg, station);
    if (refusal) return refuse(refusal);
  }
  const { mode } = entry;
  if (station.instrument === "inclinometer") return answer({ mode, valuesDegrees: legValues(entry, "whole") });
  if (station.instrument === "pendulum") return answer({ mode, valuesMm: legValues(entry, "whole") });
  return answer({ mode, portMm: legValues(entry, "port"), starboardMm: legValues(entry, "starboard") });
}

function legRefusal(entry: BattenEntry, leg: Leg, station: Station): EntryRefusal | null {
  const { scale } = station;
  const values = legValues(entry, leg);
  if (values.length === 0)
    return { type: "NothingTyped", leg, otherLegRead: legsOf(station.instrument).some((each) => legValues(entry, each).length > 0) };
  const outside = values.find((value) => value < scale[0] || value > scale[1]);
  if (outside !== undefined) return { type: "OutsideScale", value: outside, scale };
  if (entry.mode === "settled" || values.length >= 3) return null;
  return { type: "TooFewTurningPoints", got: values.length, needed: 3 };
}

/** The entry that would give this value again: a correction starts from what was saved. */
export function entryOfBatten(value: BattenValue, instrument: Station["instrument"]): BattenEntry {
  const entry = { ...emptyBattenEntry(instrument), mode: value.mode };
  if ("valuesMm" in value) return withValues(entry, { whole: value.valuesMm });
  if ("valuesDegrees" in value) return withValues(entry, { whole: value.valuesDegrees });
  return withValues(entry, { port: value.portMm, starboard: value.starboardMm });
}

// the last number stays in the digits, where backspace reaches it
function withValues(entry: BattenEntry, values: Partial<Record<Leg, readonly number[]>>): BattenEntry {
  const marks = { ...entry.marks };
  const typing = { ...entry.typing };
  for (const [leg, numbers] of Object.entries(values) as [Leg, readonly number[]][]) {
    marks[leg] = numbers.slice(0, -1).map(typedText);
    typing[leg] = numbers.slice(-1).map(typedText).join("");
  }
  return { ...entry, marks, typing };
}
