import type { Waterplane } from "@/lib/frame";
import { answer, type Result, refuse } from "@/lib/result";
import { type Balance, balanced, type NoBalance } from "./balance";
import { draftAtApFor } from "./draft-for-volume";
import type { Hull } from "./hull";
import { type AfloatRefusal, type Hydrostatics, hydrostaticsAt } from "./hydrostatics-at";

export type Weight = { readonly displacement: number; readonly lcg: number; readonly tcg: number; readonly vcg: number };

/** The frame of the search: sag is given, not found; `guess` is a waterplane near the answer, where one is known. */
export type Afloat = { readonly lbp: number; readonly sag?: number; readonly guess?: Waterplane };

export type AtRest = { readonly plane: Waterplane; readonly hydrostatics: Hydrostatics };

export type EquilibriumRefusal =
  | AfloatRefusal
  | NoBalance
  | { readonly type: "VolumeOutOfReach"; readonly volume: number; readonly smallest: number; readonly largest: number }
  | { readonly type: "UnstableAtRest"; readonly gmTransverse: number; readonly gmLongitudinal: number; readonly tanHeel: number };

/**
 * The waterplane at which a ship of given weight and centre floats at rest: sinkage, trim and heel are all free.
 *
 * Buoyancy equals weight, and G lies on the line of buoyancy, which stands square on the waterplane and so runs along (−b, −c, 1):
 *
 *     V = Δ/ρ,   x_B + b·z_B = x_G + b·z_G,   y_B + c·z_B = y_G + c·z_G
 *
 * Refuses a displacement that the hull can't carry, a rest that is not stable (GM ≤ 0 there), and a search that does not close.
 *
 * Source: equilibrium of a floating body, common practice.
 */
export function equilibrium(hull: Hull, weight: Weight, water: Afloat & { readonly density: number }): Result<AtRest, EquilibriumRefusal> {
  const balance = { volume: weight.displacement / water.density, lcg: weight.lcg, tcg: weight.tcg, vcg: weight.vcg, heelIsFree: true };
  const found = restOf(hull, balance, water, water.guess?.tanHeel ?? 0);
  if (!found.ok) return found;
  const { plane, hydrostatics } = found.value;
  const [gmTransverse, gmLongitudinal] = [hydrostatics.kmt - weight.vcg, hydrostatics.kml - weight.vcg];
  if (gmTransverse > 0 && gmLongitudinal > 0) return found;
  return refuse({ type: "UnstableAtRest", gmTransverse, gmLongitudinal, tanHeel: plane.tanHeel });
}

/**
 * The waterplane at a given heel with the volume kept and the trim free: where a moment athwartships would hold the ship.
 * Conditions and refusals as in `equilibrium`, without the athwartships condition and the question of stability.
 */
export function atDisplacementAndHeel(
  hull: Hull,
  held: Afloat & { readonly volume: number; readonly tanHeel: number; readonly lcg: number; readonly vcg: number },
): Result<AtRest, EquilibriumRefusal> {
  const balance = { volume: held.volume, lcg: held.lcg, tcg: 0, vcg: held.vcg, heelIsFree: false };
  return restOf(hull, balance, held, held.tanHeel);
}

function restOf(hull: Hull, balance: Balance, { lbp, sag = 0, guess }: Afloat, tanHeel: number): Result<AtRest, EquilibriumRefusal> {
  const near = guess && balanced(hull, balance, { ...guess, tanHeel, sag, lbp });
  const plane = near?.ok ? near : balancedFromLevel(hull, balance, { draftAtAp: 0, slopeAlong: 0, tanHeel, sag, lbp });
  if (!plane.ok) return plane;
  const hydrostatics = hydrostaticsAt(hull, plane.value);
  return hydrostatics.ok ? answer({ plane: plane.value, hydrostatics: hydrostatics.value }) : hydrostatics;
}

function balancedFromLevel(hull: Hull, balance: Balance, level: Waterplane): Result<Waterplane, EquilibriumRefusal> {
  const draftAtAp = draftAtApFor(hull, balance.volume, level);
  if (draftAtAp.ok) return balanced(hull, balance, { ...level, draftAtAp: draftAtAp.value });
  const { atLow, atHigh } = draftAtAp.refusal;
  const { volume } = balance;
  return refuse({ type: "VolumeOutOfReach", volume, smallest: atLow + volume, largest: atHigh + volume });
}
