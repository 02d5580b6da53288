import { mean, standardDeviation } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";
import { seawaterDensity } from "./seawater-density";

export type HydrometerScale = "density-vacuum" | "density-air" | "specific-gravity";

/** `correction` of the certificate is added to the reading, in the scale's own unit. */
export type Hydrometer = { readonly id: string; readonly scale: HydrometerScale; readonly correction?: number };

export type WaterSample = {
  readonly place: string;
  /** below the surface [m] */
  readonly depth: number;
  /** as read [t/m³, or the specific gravity] */
  readonly density: number;
  readonly hydrometer?: string;
};

export type PlaceDensity = { readonly place: string; readonly density: number; readonly samples: number };

export type WaterDensity = {
  /** in vacuum [t/m³] */
  readonly density: number;
  readonly places: readonly PlaceDensity[];
  readonly samples: number;
  /** highest − lowest over all samples [t/m³] */
  readonly spread: number;
  /** standard uncertainty of the mean, from the places' scatter; null with one place */
  readonly scatter: number | null;
};

export type WaterRefusal =
  | { readonly type: "NoWaterSamples"; readonly got: number; readonly needed: number }
  | { readonly type: "UnknownHydrometer"; readonly hydrometer: string; readonly place: string };

/** A hydrometer that reads density in air reads low by the air's own buoyancy [t/m³]. */
export const airBuoyancy = 0.0011;

/** Fresh water at 15 °C, to which specific-gravity hydrometers for ships' drafts refer (15/15 °C) [t/m³]. */
export const freshWaterAtReference = seawaterDensity(15, 0);

/**
 * Density of the water around the ship, in vacuum: mean over the depths of each place, then over the places.
 * No correction for temperature: the water was read where it is. A sample without hydrometer is taken as density in vacuum.
 * Refuses no sample at all, and a hydrometer that is not on the list.
 *
 * Source: UN/ECE code of uniform standards for draught surveys, ECE/ENERGY/19 (1992) (from memory).
 */
export function waterDensity(samples: readonly WaterSample[], hydrometers: readonly Hydrometer[] = []): Result<WaterDensity, WaterRefusal> {
  if (samples.length === 0) return refuse({ type: "NoWaterSamples", got: 0, needed: 1 });
  const inVacuum: { readonly place: string; readonly density: number }[] = [];
  for (const { place, density, hydrometer } of samples) {
    const instrument = hydrometers.find(({ id }) => id === hydrometer);
    if (hydrometer !== undefined && !instrument) return refuse({ type: "UnknownHydrometer", hydrometer, place });
    inVacuum.push({ place, density: instrument ? densityInVacuum(density, instrument) : density });
  }
  const places = meansByPlace(inVacuum);
  const means = places.map(({ density }) => density);
  const all = inVacuum.map(({ density }) => density);
  return answer({
    density: mean(means),
    places,
    samples: samples.length,
    spread: Math.max(...all) - Math.min(...all),
    scatter: means.length > 1 ? standardDeviation(means) / Math.sqrt(means.length) : null,
  });
}

/**
 * Density in vacuum [t/m³] from a hydrometer's reading.
 *
 *     density in vacuum = reading + correction
 *     density in air: + 0.0011;  specific gravity: × density of fresh water at 15 °C (0.9991)
 *
 * A hydrometer marked 60/60 °F differs from 15/15 °C by less than 1e-4, which is neglected.
 *
 * Source: difference of the scales as worked in a published comparison of load line and draught survey hydrometers,
 * myseatime.com/discussion/load-line-hydrometer-vs-draught-survey-hydrometer.
 */
export function densityInVacuum(reading: number, { scale, correction = 0 }: Hydrometer): number {
  const corrected = reading + correction;
  if (scale === "density-air") return corrected + airBuoyancy;
  return scale === "specific-gravity" ? corrected * freshWaterAtReference : corrected;
}

function meansByPlace(samples: readonly { readonly place: string; readonly density: number }[]): PlaceDensity[] {
  return [...new Set(samples.map(({ place }) => place))].map((place) => {
    const densities = samples.filter((sample) => sample.place === place).map(({ density }) => density);
    return { place, density: mean(densities), samples: densities.length };
  });
}
