import type { AsInclined } from "@/lib/inclining/inclined-ship";
import type { Defence } from "@/lib/lightship/defended-lightship";
import type { InclinedUncertainty } from "@/lib/lightship/inclined-uncertainty";
import type { Lightship } from "@/lib/lightship/lightship";
import { decimalsFor } from "./rounding";

/** Decimals with which the numbers of a ship are shown: displacement [t], the others [m]. */
export type ShipDigits = Readonly<Record<"displacement" | "gm" | "vcg" | "lcg" | "tcg", number>>;

/** The marks, tapes and battens of a test are read to the millimetre, and no hydrostatics give less than a tenth of a tonne. */
const finestLength = 3;
const finestMass = 1;

/**
 * The one place that says with which digits displacement, GM, KG, LCG and TCG as inclined are shown: as many as their
 * uncertainty leaves, and none finer than the instruments of a test.
 */
export function inclinedDigits(known: InclinedUncertainty): ShipDigits {
  return {
    displacement: massDecimals(known.displacement),
    gm: lengthDecimals(known.gm),
    vcg: lengthDecimals(known.vcg),
    lcg: lengthDecimals(known.lcg),
    tcg: lengthDecimals(known.tcg),
  };
}

/**
 * The same of the lightship: by its 95 % intervals, and until they are drawn by what is known as inclined. What is taken off
 * a ship leaves its centres less well known, by the ratio of the displacements.
 */
export function lightshipDigits(
  lightship: Pick<Lightship, "displacement">,
  { displacement, uncertainty }: Pick<AsInclined, "displacement"> & { readonly uncertainty: InclinedUncertainty },
  intervals: Defence["interval95"] | null,
): Omit<ShipDigits, "gm"> {
  const enlarged = displacement / lightship.displacement;
  const within = (interval: readonly [number, number] | undefined, otherwise: number) =>
    interval === undefined ? otherwise : (interval[1] - interval[0]) / 4;
  return {
    displacement: massDecimals(within(intervals?.displacement, uncertainty.displacement)),
    vcg: lengthDecimals(within(intervals?.vcg, uncertainty.vcg * enlarged)),
    lcg: lengthDecimals(within(intervals?.lcg, uncertainty.lcg * enlarged)),
    tcg: lengthDecimals(uncertainty.tcg * enlarged),
  };
}

function massDecimals(uncertainty: number): number {
  return Math.min(finestMass, decimalsFor(uncertainty));
}

function lengthDecimals(uncertainty: number): number {
  return Math.min(finestLength, decimalsFor(uncertainty));
}
