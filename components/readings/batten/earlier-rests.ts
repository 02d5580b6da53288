import { restingPoint } from "@/lib/inclining/resting-point";
import type { BattenValue } from "@/lib/inclining/test-readings";
import type { ReadingValue } from "@/lib/sync/event";
import type { Slot } from "@/lib/sync/slot";
import type { Station } from "./batten-entry";

export type Read = { readonly slot: Slot; readonly value: ReadingValue };

/** One station's own readings, as single numbers: where the bob rested, or the difference of the levels (starboard − port). */
export function earlierRests(readings: readonly Read[], station: Station, exceptMove: number): number[] {
  return readings
    .filter(
      ({ slot }) => slot.kind === "batten" && slot.station === station.id && slot.series === station.series && slot.move !== exceptMove,
    )
    .map(({ value }) => restOfValue(value as BattenValue))
    .filter((rest) => rest !== null);
}

/** This station's own reading at move 0: where the zero stands on the strip; null before it was taken. */
export function restAtZero(readings: readonly Read[], station: Station): number | null {
  const atZero = readings.filter(({ slot }) => slot.kind === "batten" && slot.move === 0);
  return earlierRests(atZero, station, -1).at(-1) ?? null;
}

/** One number for a batten reading as it is kept; null where its marks give none. */
export function restOfValue(value: BattenValue): number | null {
  if ("valuesMm" in value) return restOn(value.mode, value.valuesMm);
  if ("valuesDegrees" in value) return restOn(value.mode, value.valuesDegrees);
  const port = restOn(value.mode, value.portMm);
  const starboard = restOn(value.mode, value.starboardMm);
  return port === null || starboard === null ? null : starboard - port;
}

/** The resting point of one scale or leg; null where its marks give none. */
export function restOn(mode: BattenValue["mode"], values: readonly number[]): number | null {
  const point = restingPoint(mode, values);
  return point.ok ? point.value.value : null;
}
