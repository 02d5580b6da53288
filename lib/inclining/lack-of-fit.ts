import { fTail } from "@/lib/numerics/f-distribution";
import { mean, sum } from "@/lib/numerics/sum";
import type { MoveOnLine } from "./inclined-ship";
import { type MeanResidual, meanResiduals } from "./mean-residuals";
import { roundingOf } from "./standardised-residuals";

export type LackOfFit = {
  readonly ratio: number;
  /** how often a straight line shows a ratio as large by chance */
  readonly probability: number;
  readonly degreesOfFreedom: readonly [lack: number, pure: number];
};

/**
 * Whether a line fits as well as moves of one moment repeat each other.
 *
 *     F = ((Σ ē² − Σ (ē − ē_g)²) / (G − 1 − S)) / (Σ (ē − ē_g)² / (K − G))
 *
 * K moves in S sessions fall into G groups of one moment and one session; ē_g: the group's mean. Moments within 1 % of the
 * largest are one. `floor` [tangent]: the pure error is never taken for smaller than the readings' own uncertainty.
 * Null where no moment was repeated, or no group is left to judge by.
 * Source: NIST/SEMATECH e-Handbook of Statistical Methods, 4.4.4.6 *from memory*.
 */
export function lackOfFit(moves: readonly MoveOnLine[], floor = 0): LackOfFit | null {
  const { points, degreesOfFreedom } = meanResiduals(moves);
  const groups = groupsOfOneMoment(points);
  const pureDof = points.length - groups.length;
  const lackDof = degreesOfFreedom - pureDof;
  if (pureDof < 1 || lackDof < 1) return null;
  const all = sum(points.map(({ residual }) => residual ** 2));
  const pure = sum(groups.flatMap(squaresAboutMean));
  const pureVariance = Math.max(pure / pureDof, Math.max(floor, roundingOf(moves)) ** 2);
  if (pureVariance === 0) return null;
  const ratio = Math.max(0, all - pure) / lackDof / pureVariance;
  return { ratio, probability: fTail(ratio, lackDof, pureDof), degreesOfFreedom: [lackDof, pureDof] };
}

function groupsOfOneMoment(points: readonly MeanResidual[]): readonly (readonly MeanResidual[])[] {
  const near = Math.max(0, ...points.map(({ moment }) => Math.abs(moment))) / 100;
  const groups: MeanResidual[][] = [];
  for (const point of points) {
    const alike = groups.find(([first]) => first?.session === point.session && Math.abs(first.moment - point.moment) <= near);
    if (alike) alike.push(point);
    else groups.push([point]);
  }
  return groups;
}

function squaresAboutMean(group: readonly MeanResidual[]): number[] {
  const centre = mean(group.map(({ residual }) => residual));
  return group.map(({ residual }) => (residual - centre) ** 2);
}
