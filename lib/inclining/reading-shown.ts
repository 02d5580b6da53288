import { answer, type Result, refuse } from "@/lib/result";
import { type NoMarks, restingPoint, type TooFewTurningPoints } from "./resting-point";
import type { Station } from "./test-plan";
import type { BattenReading, BattenValue } from "./test-readings";

export type WrongKindOfValue = {
  readonly type: "WrongKindOfValue";
  readonly instrument: Station["instrument"];
  readonly needed: string;
  readonly path?: string;
};
export type ReadingRefusal = (TooFewTurningPoints | NoMarks | WrongKindOfValue) & { readonly path?: string };

/** The key under which each instrument's reading stands in a record. */
export const valueKeys = {
  pendulum: "valuesMm",
  "u-tube": "portMm and starboardMm",
  inclinometer: "valuesDegrees",
} as const;

/**
 * What an instrument showed in one reading, positive for heel to starboard whichever way it is mounted:
 * the bob's place [mm], the starboard leg's level less the port leg's [mm], or the angle [degrees].
 *
 * Refused: a value of another instrument, no mark, too few turning points.
 */
export function readingShown(station: Station, reading: BattenValue): Result<number, ReadingRefusal> {
  const shown = shownAsMounted(station, reading);
  return shown.ok && station.reversed ? answer(-shown.value) : shown;
}

/** Standard uncertainty that the scatter of a reading's own marks or swings gives its resting point, in its unit; null with one only. */
export function readingScatter(reading: BattenValue): number | null {
  if ("portMm" in reading) {
    const legs = [scatterOf(reading.mode, reading.portMm), scatterOf(reading.mode, reading.starboardMm)];
    return legs.some((leg) => leg === null) ? null : Math.hypot(...legs.map((leg) => leg ?? 0));
  }
  return scatterOf(reading.mode, "valuesMm" in reading ? reading.valuesMm : reading.valuesDegrees);
}

// of n turning points n − 2 centres are taken, each of three neighbours
function scatterOf(mode: BattenReading["mode"], values: readonly number[]): number | null {
  const point = restingPoint(mode, values);
  if (!point.ok || point.value.scatter === null) return null;
  return point.value.scatter / Math.sqrt(mode === "settled" ? values.length : values.length - 2);
}

function shownAsMounted({ instrument }: Station, reading: BattenValue): Result<number, ReadingRefusal> {
  if (instrument === "pendulum" && "valuesMm" in reading) return rest(reading.mode, reading.valuesMm, "valuesMm");
  if (instrument === "u-tube" && "portMm" in reading) return differenceOfLegs(reading.mode, reading.portMm, reading.starboardMm);
  if (instrument === "inclinometer" && "valuesDegrees" in reading) return rest(reading.mode, reading.valuesDegrees, "valuesDegrees");
  return refuse({ type: "WrongKindOfValue", instrument, needed: valueKeys[instrument] });
}

function differenceOfLegs(mode: BattenReading["mode"], portMm: readonly number[], starboardMm: readonly number[]) {
  const port = rest(mode, portMm, "portMm");
  const starboard = rest(mode, starboardMm, "starboardMm");
  if (!port.ok) return port;
  return starboard.ok ? answer(starboard.value - port.value) : starboard;
}

function rest(mode: BattenReading["mode"], values: readonly number[], path: string): Result<number, ReadingRefusal> {
  const point = restingPoint(mode, values);
  return point.ok ? answer(point.value.value) : refuse({ ...point.refusal, path });
}
