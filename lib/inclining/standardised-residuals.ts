import { studentT } from "@/lib/numerics/student-t";
import { sum } from "@/lib/numerics/sum";
import type { MoveOnLine } from "./inclined-ship";
import { type MeanResidual, meanResiduals } from "./mean-residuals";

export type StandardisedResidual = MeanResidual & {
  /** how many of its own standard deviations a move stands off the line through the others; null where that can't be told */
  readonly standardised: number | null;
};

export type StandardisedResiduals = {
  readonly points: readonly StandardisedResidual[];
  /** what the largest of all moves of a straight line exceeds with the given probability; null with too few moves */
  readonly limit: number | null;
};

/**
 * Each move's standardised residual: off the line through the other moves, by the scatter of the others.
 *
 *     tₖ = ēₖ / (s₍ₖ₎·√(1 − hₖ)),   s₍ₖ₎² = (Σ ē² − ēₖ²/(1 − hₖ)) / (ν − 1),   ν = K − 1 − S
 *
 * K moves in S sessions. Student's t of ν − 1 degrees of freedom; the limit is two-sided for the largest of K
 * (Bonferroni), at 95 % unless `probability` says otherwise. `floor` [tangent]: scatter is never taken for smaller than the readings' own uncertainty.
 * Null throughout below two degrees of freedom.
 * Source: R. D. Cook and S. Weisberg, Residuals and Influence in Regression (1982), externally studentised *from memory*.
 */
export function standardisedResiduals(moves: readonly MoveOnLine[], floor = 0, probability = 0.05): StandardisedResiduals {
  const { points, degreesOfFreedom } = meanResiduals(moves);
  if (degreesOfFreedom < 2) return { points: points.map((point) => ({ ...point, standardised: null })), limit: null };
  const squares = sum(points.map(({ residual }) => residual ** 2));
  const least = Math.max(floor, roundingOf(moves));
  const standardised = points.map((point) => ({ ...point, standardised: standardise(point, squares, degreesOfFreedom, least) }));
  return { points: standardised, limit: studentT(1 - probability / 2 / moves.length, degreesOfFreedom - 1) };
}

/** Below this tangent a residual is rounding and no scatter. */
export function roundingOf(moves: readonly MoveOnLine[]): number {
  return 1e-9 * Math.max(0, ...moves.map(({ tanHeel }) => Math.abs(tanHeel)));
}

function standardise({ residual, leverage }: MeanResidual, squares: number, dof: number, floor: number): number | null {
  const free = 1 - leverage;
  if (free < 1e-9) return null;
  const variance = Math.max(0, (squares - residual ** 2 / free) / (dof - 1));
  const deviation = Math.max(Math.sqrt(variance), floor);
  return deviation === 0 ? null : residual / (deviation * Math.sqrt(free));
}
