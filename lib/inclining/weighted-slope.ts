import { sum } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";
import type { CommonSlope, NoSpreadInMoment, PointOnLine } from "./common-slope";

export type WeighedPoint = PointOnLine & { /** standard uncertainty of the tangent */ readonly uncertainty: number };
export type UncertaintyNotPositive = { readonly type: "UncertaintyNotPositive"; readonly uncertainty: number };

/**
 * The common slope with each tangent weighed by its own uncertainty: an option beside the unweighted fit, for stations of very
 * different lengths or kinds.
 *
 *     w = 1/u²,   slope = Σⱼ Σₖ w(M − M̄ⱼ)(t − t̄ⱼ) / Σⱼ Σₖ w(M − M̄ⱼ)²,   interceptⱼ = t̄ⱼ − slope·M̄ⱼ
 *
 * Means are weighted too; moments in t·m. Gusts that move all stations alike are not in u: where they rule, equal weights are right.
 * Refused: an uncertainty that is not above zero; series none of which has two different moments.
 * Source: generalised least squares with a diagonal covariance, *common practice*.
 */
export function weightedSlope(
  series: readonly (readonly WeighedPoint[])[],
): Result<CommonSlope, UncertaintyNotPositive | NoSpreadInMoment> {
  const unweighed = series.flat().find(({ uncertainty }) => !(uncertainty > 0));
  if (unweighed) return refuse({ type: "UncertaintyNotPositive", uncertainty: unweighed.uncertainty });
  const centred = series.map(aboutCentre);
  const spread = sum(centred.flatMap(({ points }) => points.map(({ weight, moment }) => weight * moment ** 2)));
  if (!hasSpread(series, centred)) {
    const moments = series.flatMap((points) => points.map(({ moment }) => moment));
    return refuse({ type: "NoSpreadInMoment", points: moments.length, moments: [...new Set(moments)] });
  }
  const slope = sum(centred.flatMap(({ points }) => points.map(({ weight, moment, tan }) => weight * moment * tan))) / spread;
  return answer({ slope, intercepts: centred.map(({ centre }) => centre.tan - slope * centre.moment) });
}

type Centred = ReturnType<typeof aboutCentre>;

function aboutCentre(points: readonly WeighedPoint[]) {
  const weights = points.map(({ uncertainty }) => 1 / uncertainty ** 2);
  const all = sum(weights);
  const centre = {
    moment: sum(points.map(({ moment }, i) => (weights[i] as number) * moment)) / all,
    tan: sum(points.map(({ tan }, i) => (weights[i] as number) * tan)) / all,
  };
  const off = points.map(({ moment, tan }, i) => ({
    weight: weights[i] as number,
    moment: moment - centre.moment,
    tan: tan - centre.tan,
  }));
  return { centre, points: off };
}

// what rounding leaves of equal moments is no spread
function hasSpread(series: readonly (readonly WeighedPoint[])[], centred: readonly Centred[]): boolean {
  const largest = Math.max(0, ...series.flat().map(({ moment }) => Math.abs(moment)));
  return Math.max(0, ...centred.flatMap(({ points }) => points.map(({ moment }) => Math.abs(moment)))) > 1e-12 * largest;
}
