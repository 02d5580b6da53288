import type { BuoyancyArm } from "@/lib/hydrostatics/buoyancy-arm";
import { sum } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";
import { weightOf } from "./line-weights";

/** A tangent observed by one series at one move, the moment that acted then, and the hull's arm where her trim was another then. */
export type Observed = { readonly moment: number; readonly tan: number; readonly weighedBy?: number; readonly arm?: BuoyancyArm };

/** The ship does not come back from the heel of a move: KG lies above the metacentre there. */
export type NoRestAtMove = { readonly type: "NoRestAtMove"; readonly moment: number; readonly vcg: number };

type Ship = { readonly arm: BuoyancyArm; readonly displacement: number; readonly tanHeelAtZero: number };

/**
 * The fluid KG with which the hull's own equilibrium gives the observed tangents, by least squares, one intercept for each
 * series. The heel c under a moment M, c₀ at zero moment by the marks:
 *
 *     f(c) − f(c₀) − KG·(c − c₀) = M/Δ,   f(c) = y_B + c·z_B
 *     minimise Σ wⱼₖ·(tⱼₖ − aⱼ − cₖ)²  over KG and the intercepts aⱼ;  w = 1 unless the readings are weighed
 *
 * Any form of hull, any heel inside the range of the arm; a move with weights shifted along the ship brings its own f.
 * Gauss–Newton from the classical KG.
 * Refused: a move at which the ship would find no rest.
 * Source: R. Dunworth, Back against the wall, and: The pursuit of better inclining, STAB 2014 and 2015 *from memory*, rederived
 * from G on the line of buoyancy.
 */
export function generalisedVcg(ship: Ship, series: readonly (readonly Observed[])[], classicalVcg: number): Result<number, NoRestAtMove> {
  let vcg = classicalVcg;
  for (let step = 0; step < 12; step++) {
    let [byGradient, byGradients] = [0, 0];
    for (const observed of series) {
      const rests = observed.map((each) => restUnder(ship, each, vcg));
      const failed = rests.indexOf(null);
      if (failed >= 0) return refuse({ type: "NoRestAtMove", moment: observed[failed]?.moment ?? 0, vcg });
      const weights = observed.map(weightOf);
      const left = centred(
        observed.map(({ tan }, k) => tan - (rests[k]?.tanHeel ?? 0)),
        weights,
      );
      const gradient = centred(
        rests.map((rest) => rest?.perVcg ?? 0),
        weights,
      );
      byGradient += sum(left.map((value, k) => (weights[k] ?? 1) * value * (gradient[k] ?? 0)));
      byGradients += sum(gradient.map((value, k) => (weights[k] ?? 1) * value ** 2));
    }
    const change = byGradient / byGradients;
    vcg += change;
    if (Math.abs(change) < 1e-10) break;
  }
  return answer(vcg);
}

/** The heel at which the ship rests without a moment athwartships but that of her own TCG. */
export function heelAtRest(arm: BuoyancyArm, vcg: number, tcg: number, near: number): number | null {
  let tanHeel = near;
  for (let step = 0; step < 30; step++) {
    const at = arm.at(tanHeel);
    const stiffness = at.slope - vcg;
    if (!(stiffness > 0)) return null;
    const change = (tcg - at.arm + vcg * tanHeel) / stiffness;
    tanHeel += change;
    if (Math.abs(change) < 1e-14) break;
  }
  return tanHeel;
}

/** Heel under a moment, and how it grows with KG; null where there is no rest. */
function restUnder({ arm: atZero, displacement, tanHeelAtZero }: Ship, { moment, arm = atZero }: Observed, vcg: number) {
  const tcg = atZero.at(tanHeelAtZero).arm - vcg * tanHeelAtZero;
  const tanHeel = heelAtRest(arm, vcg, tcg + moment / displacement, tanHeelAtZero);
  if (tanHeel === null) return null;
  return { tanHeel, perVcg: (tanHeel - tanHeelAtZero) / (arm.at(tanHeel).slope - vcg) };
}

function centred(values: readonly number[], weights: readonly number[]): number[] {
  const centre = sum(values.map((value, k) => (weights[k] ?? 1) * value)) / sum(weights);
  return values.map((value) => value - centre);
}
