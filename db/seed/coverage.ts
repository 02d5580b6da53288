import { defendedLightship } from "@/lib/lightship/defended-lightship";
import type { LightshipTestData } from "@/lib/lightship/inclining-result";
import { statedUncertainty } from "@/lib/lightship/stated-uncertainty";
import { type Cause, uncertainInputs } from "@/lib/lightship/uncertain-inputs";
import { type Noise, seededNoise } from "@/lib/numerics/seeded-noise";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";
import { perfectReadings, simulatedReadings } from "./simulated-readings";
import { type SimulatedTruth, simulatedShip } from "./simulated-ship";

/** A plan and the ship it is carried out on. */
export type CoverageShip = { readonly record: TestRecord; readonly truth: SimulatedTruth };

/** For each number of a lightship, whether its interval held the truth. */
export type Held = Readonly<Record<string, boolean>>;

/** Of the heel at each move, felt by all stations alike, in every other test [tangent]. */
const gust = 2e-4;

/**
 * One test of many on a ship whose lightship is known: everything that the record states as uncertain is off by chance, as
 * far as the record states; in every other test a gust moves all stations of a move together, of which the record knows
 * nothing. The record as written is reduced, and its 95 % intervals are held against the truth.
 */
export function coverageTrial({ record, truth }: CoverageShip, trial: number, draws: number): Held {
  const noise = seededNoise(1000 + trial);
  const stated = statedUncertainty(record.uncertainty);
  const real = asItReallyWas(record, noise);
  const gusts = trial % 2 === 0 ? gust : 0;
  const quality = { ...perfectReadings, gust: gusts, draft: stated.draft, density: stated.density };
  const readings = promised(simulatedReadings(promised(simulatedShip(real, truth)), quality, noise));
  const test = { ...record, readings: withReadingErrors(readings, stated.readingMm, noise), settings: { seed: trial, draws } };
  const { interval95 } = promised(defendedLightship(withSoundingErrors(test, noise)));
  const held = Object.entries(interval95).map(([number, [low, high]]) => {
    const real = number === "vcgGeneralised" ? truth.lightship.vcg : truth.lightship[number as "displacement" | "vcg" | "lcg"];
    return [number, low <= real && real <= high] as const;
  });
  return Object.fromEntries(held);
}

/** What is laid down in a plan and known only so far; readings are made uncertain where they are read. */
const planned: readonly Cause[] = [
  "weights",
  "weight-places",
  "lengths",
  "mark-zeros",
  "items",
  "persons",
  "tank-tables",
  "liquid-density",
];

function asItReallyWas(record: TestRecord, noise: Noise): TestRecord {
  return shiftedByChance(record, planned, noise);
}

function withSoundingErrors(record: TestRecord, noise: Noise): TestRecord {
  return shiftedByChance(record, ["soundings"], noise);
}

function shiftedByChance(record: TestRecord, causes: readonly Cause[], noise: Noise): TestRecord {
  const inputs = uncertainInputs(record, statedUncertainty(record.uncertainty), { relative: 0, degreesOfFreedom: null });
  const shifted = inputs
    .filter(({ cause }) => causes.includes(cause))
    .reduce<LightshipTestData>((given, { shifted: shift, standard }) => shift(given, noise.normal(standard)), record);
  return { ...record, ...shifted } as TestRecord;
}

/** Each resting point is off by the stated uncertainty: all marks of one look together. */
function withReadingErrors(readings: TestRecord["readings"], readingMm: number, noise: Noise): TestRecord["readings"] {
  const off = (values: readonly number[]) => {
    const by = noise.normal(readingMm);
    return values.map((value) => value + by);
  };
  const battens = readings.battens.map((reading): typeof reading => {
    if ("valuesMm" in reading) return { ...reading, valuesMm: off(reading.valuesMm) };
    return "portMm" in reading ? { ...reading, portMm: off(reading.portMm), starboardMm: off(reading.starboardMm) } : reading;
  });
  return { ...readings, battens };
}
