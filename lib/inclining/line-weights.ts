import type { Result } from "@/lib/result";
import { type CommonSlope, commonSlope, type NoSpreadInMoment, type PointOnLine } from "./common-slope";
import { type UncertaintyNotPositive, weightedSlope } from "./weighted-slope";

/** How much each reading counts in the line: all alike, or each by how well it is known. */
export type LineWeights = "equal" | "readings";

/** A tangent, with the standard uncertainty that it is weighed by; left out where all count alike. */
export type WeighablePoint = PointOnLine & { readonly weighedBy?: number };

/**
 * The uncertainty that a reading is weighed by: the scatter of its own marks or looks, and not less than what is stated for
 * every reading, or two marks that fell together by chance would outweigh all others.
 * Source: type A beside type B evaluation, JCGM 100:2008, 4.2 and 4.3 *from memory*; the floor is a choice of ours.
 */
export function weighingUncertainty(
  weights: LineWeights,
  read: { readonly uncertainty: number; readonly scatter?: number },
): number | null {
  return weights === "readings" ? Math.max(read.uncertainty, read.scatter ?? 0) : null;
}

/** The common slope of series whose points are weighed, or all count alike. See `commonSlope` and `weightedSlope`. */
export function slopeThrough(
  series: readonly (readonly WeighablePoint[])[],
): Result<CommonSlope, UncertaintyNotPositive | NoSpreadInMoment> {
  const weighed = series.map((points) =>
    points.flatMap(({ weighedBy, ...point }) => (weighedBy === undefined ? [] : [{ ...point, uncertainty: weighedBy }])),
  );
  const areWeighed = weighed.some((points) => points.length > 0);
  return areWeighed ? weightedSlope(weighed) : commonSlope(series);
}

/** The weight of a point, up to a factor common to all. */
export function weightOf({ weighedBy }: { readonly weighedBy?: number }): number {
  return weighedBy === undefined ? 1 : 1 / weighedBy ** 2;
}
