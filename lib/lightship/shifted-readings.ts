import type { BattenReading, MarkReading } from "@/lib/inclining/test-readings";
import type { LightshipTestData } from "./inclining-result";

/** A test as it would stand if one of its readings had been another. Shifts in the unit of the reading. */

export type MarkRead = { readonly list: "drafts" | "freeboards"; readonly id: string };

/** Every reading stretched alike about its batten's zero: the slope is stretched, and nothing else. */
export function withSlope(given: LightshipTestData, by: number): LightshipTestData {
  const battens = given.readings.battens.map((reading) => stretched(reading, 1 + by));
  return { ...given, readings: { ...given.readings, battens } };
}

function stretched(reading: BattenReading, factor: number): BattenReading {
  const times = (values: readonly number[]) => values.map((value) => factor * value);
  if ("valuesMm" in reading) return { ...reading, valuesMm: times(reading.valuesMm) };
  if ("valuesDegrees" in reading) return { ...reading, valuesDegrees: times(reading.valuesDegrees) };
  return { ...reading, portMm: times(reading.portMm), starboardMm: times(reading.starboardMm) };
}

/** A draft or freeboard read otherwise, its estimates with it. */
export function withMarkReading(given: LightshipTestData, { list, id }: MarkRead, by: number): LightshipTestData {
  const readings = changed(given.readings[list] ?? [], id, (reading): MarkReading => {
    const estimates = reading.estimates?.map((estimate) => estimate + by);
    return { ...reading, value: reading.value + by, ...(estimates && { estimates }) };
  });
  return { ...given, readings: { ...given.readings, [list]: readings } };
}

/** A water sample read otherwise. */
export function withDensity(given: LightshipTestData, id: string, by: number): LightshipTestData {
  const water = changed(given.readings.water, id, (sample) => ({ ...sample, density: sample.density + by }));
  return { ...given, readings: { ...given.readings, water } };
}

/** A tank sounded otherwise. */
export function withSounding(given: LightshipTestData, id: string, by: number): LightshipTestData {
  const soundings = changed(given.readings.soundings, id, (reading) => ({ ...reading, value: reading.value + by }));
  return { ...given, readings: { ...given.readings, soundings } };
}

function changed<T extends { readonly id: string }>(list: readonly T[], id: string, change: (one: T) => T): readonly T[] {
  return list.map((one) => (one.id === id ? change(one) : one));
}
