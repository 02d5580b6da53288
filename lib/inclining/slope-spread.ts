import { studentTTwoSided95 } from "@/lib/numerics/student-t";
import { mean, sum } from "@/lib/numerics/sum";
import type { SlopeSpread } from "./inclined-ship";
import { weightOf } from "./line-weights";

/** A point of the common line: its own uncertainty is that of the readings behind it. */
export type SpreadPoint = {
  readonly series: number;
  readonly move: string;
  readonly session: number;
  readonly moment: number;
  readonly residual: number;
  readonly uncertainty: number;
  readonly weighedBy?: number;
};

/**
 * How well the common slope is known. The readings of one move are not independent (a gust moves all stations at once),
 * so the scatter that counts is that of the move means ēₖ, K moves in S sessions:
 *
 *     s² = Σ ēₖ² / (K − 1 − S),   u(slope)² = s² / Σ (Mₖ − M̄)²
 *
 * and not less than the readings' own uncertainty gives, u(slope)² = Σ (Mⱼₖ − M̄ⱼ)²·uⱼₖ² / (Σ (Mⱼₖ − M̄ⱼ)²)².
 * Where readings are weighed (w), ēₖ is the weighted mean, and the slope is moved by each tangent as
 *
 *     pⱼₖ = wⱼₖ(Mⱼₖ − M̄ⱼ) / Σ w(M − M̄)²,   u(slope)² = s²·Σₖ (Σⱼ pⱼₖ)²,   and not less than Σ (p·u)²
 *
 * Half width at 95 % by Student's t of K − 1 − S degrees of freedom, relative to the slope.
 * Null where no degree of freedom is left.
 * Source: JCGM 100:2008, 4.2 and annex G *from memory*.
 */
export function slopeSpread(slope: number, points: readonly SpreadPoint[]): SlopeSpread | null {
  const moves = [...grouped(points, ({ move }) => move).values()].map(moveMean);
  const degreesOfFreedom = moves.length - 1 - new Set(moves.map(({ session }) => session)).size;
  if (degreesOfFreedom < 1) return null;
  const betweenMoves = Math.sqrt(sum(moves.map(({ residual }) => residual ** 2)) / degreesOfFreedom);
  const byScatter = betweenMoves * pullOfMoves(points, moves);
  const slopeUncertainty = Math.max(byScatter, uncertaintyByReadings(points));
  return {
    slopeUncertainty,
    byScatter,
    degreesOfFreedom,
    halfWidth95: (studentTTwoSided95(degreesOfFreedom) * slopeUncertainty) / Math.abs(slope),
    betweenMoves,
    withinMoves: scatterWithinMoves(points, moves.length),
  };
}

function moveMean(points: readonly SpreadPoint[]) {
  const { session, moment } = points[0] ?? { session: 1, moment: 0 };
  return { session, moment, residual: weightedMean(points, ({ residual }) => residual) };
}

/** How far the slope moves for an error of one that is common to all stations of a move, the moves' errors independent. */
function pullOfMoves(points: readonly SpreadPoint[], moves: readonly ReturnType<typeof moveMean>[]): number {
  if (points.every(({ weighedBy }) => weighedBy === undefined)) {
    return 1 / Math.sqrt(sum(aboutMeans(moves, ({ session }) => session).map(({ lever }) => lever ** 2)));
  }
  const byMove = [...grouped(pulls(points), ({ of }) => of.move).values()];
  return Math.sqrt(sum(byMove.map((ofMove) => sum(ofMove.map(({ pull }) => pull)) ** 2)));
}

function uncertaintyByReadings(points: readonly SpreadPoint[]): number {
  return Math.sqrt(sum(pulls(points).map(({ pull, of }) => (pull * of.uncertainty) ** 2)));
}

function pulls(points: readonly SpreadPoint[]) {
  const levers = aboutMeans(points, ({ series }) => series).map(({ of, lever }) => ({ of, lever, weight: weightOf(of) }));
  const all = sum(levers.map(({ lever, weight }) => weight * lever ** 2));
  return levers.map(({ of, lever, weight }) => ({ of, pull: (weight * lever) / all }));
}

/** Scatter of the stations about their move's mean; a station's own intercept and a move's mean each take a degree of freedom. */
function scatterWithinMoves(points: readonly SpreadPoint[], moves: number): number | null {
  const series = new Set(points.map((point) => point.series)).size;
  const sessions = new Set(points.map(({ session }) => session)).size;
  const degreesOfFreedom = points.length - moves - series + sessions;
  if (degreesOfFreedom < 1) return null;
  const deviations = [...grouped(points, ({ move }) => move).values()].flatMap((ofMove) => {
    const centre = mean(ofMove.map(({ residual }) => residual));
    return ofMove.map(({ residual }) => (residual - centre) ** 2);
  });
  return Math.sqrt(sum(deviations) / degreesOfFreedom);
}

function aboutMeans<T extends { readonly moment: number; readonly weighedBy?: number }>(
  points: readonly T[],
  groupOf: (point: T) => string | number,
) {
  return [...grouped(points, groupOf).values()].flatMap((group) => {
    const centre = weightedMean(group, ({ moment }) => moment);
    return group.map((of) => ({ of, lever: of.moment - centre }));
  });
}

function weightedMean<T extends { readonly weighedBy?: number }>(of: readonly T[], numberOf: (one: T) => number): number {
  if (of.every(({ weighedBy }) => weighedBy === undefined)) return mean(of.map(numberOf));
  return sum(of.map((one) => weightOf(one) * numberOf(one))) / sum(of.map(weightOf));
}

function grouped<T>(points: readonly T[], groupOf: (point: T) => string | number): Map<string | number, T[]> {
  const groups = new Map<string | number, T[]>();
  for (const point of points) groups.set(groupOf(point), [...(groups.get(groupOf(point)) ?? []), point]);
  return groups;
}
