import { mean, sum } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";

export type PointOnLine = { readonly moment: number; readonly tan: number };
export type CommonSlope = { readonly slope: number; readonly intercepts: readonly number[] };
export type NoSpreadInMoment = { readonly type: "NoSpreadInMoment"; readonly points: number; readonly moments: readonly number[] };

/**
 * One slope of tangent on moment common to all series, and an intercept for each of them.
 *
 *     slope = Σⱼ Σₖ (Mₖ − M̄ⱼ)(tⱼₖ − t̄ⱼ) / Σⱼ Σₖ (Mₖ − M̄ⱼ)²,   interceptⱼ = t̄ⱼ − slope · M̄ⱼ
 *
 * Ordinary least squares, unweighted: moments are known, tangents are measured. Sums are centred on each series' own means,
 * so that no zero of a batten is ever mixed with another's. Moments in t·m, slope in 1/(t·m).
 * Refused: series none of which has two different moments.
 * Source: analysis of covariance with parallel lines, *common practice*.
 */
export function commonSlope(series: readonly (readonly PointOnLine[])[]): Result<CommonSlope, NoSpreadInMoment> {
  const centres = series.map((points) => ({ moment: mean(points.map(momentOf)), tan: mean(points.map(tanOf)) }));
  const centred = series.flatMap((points, j) => points.map((point) => fromCentre(point, centres[j])));
  if (!hasSpread(series, centred)) {
    const moments = series.flatMap((points) => points.map(momentOf));
    return refuse({ type: "NoSpreadInMoment", points: moments.length, moments: [...new Set(moments)] });
  }
  const slope = sum(centred.map(({ moment, tan }) => moment * tan)) / sum(centred.map(({ moment }) => moment ** 2));
  return answer({ slope, intercepts: centres.map(({ moment, tan }) => tan - slope * moment) });
}

function fromCentre(point: PointOnLine, centre: PointOnLine = { moment: 0, tan: 0 }): PointOnLine {
  return { moment: point.moment - centre.moment, tan: point.tan - centre.tan };
}

// what rounding leaves of equal moments is no spread
function hasSpread(series: readonly (readonly PointOnLine[])[], centred: readonly PointOnLine[]): boolean {
  const largest = Math.max(0, ...series.flat().map(({ moment }) => Math.abs(moment)));
  return Math.max(0, ...centred.map(({ moment }) => Math.abs(moment))) > 1e-12 * largest;
}

function momentOf({ moment }: PointOnLine): number {
  return moment;
}

function tanOf({ tan }: PointOnLine): number {
  return tan;
}
