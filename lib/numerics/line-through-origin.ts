import { answer, type Result, refuse } from "@/lib/result";
import type { NoSpread, TooFewPoints } from "./linear-fit";
import { sum, sumOfProducts } from "./sum";

export type LineThroughOrigin = {
  readonly slope: number;
  readonly residuals: readonly number[];
  readonly slopeUncertainty: number;
  readonly residualDeviation: number;
  readonly degreesOfFreedom: number;
};

/**
 * The line y = slope·x by least squares, for relations known to pass through the origin (never for an inclining plot).
 *
 *     slope = Σxy/Σx²,  s² = Σr²/(n−1),  u(slope)² = s²/Σx²
 *
 * Refuses fewer than two points, and points that all stand at x = 0.
 *
 * Source: NIST StRD, NoInt1 and NoInt2.
 */
export function lineThroughOrigin(x: readonly number[], y: readonly number[]): Result<LineThroughOrigin, TooFewPoints | NoSpread> {
  if (x.length !== y.length) throw new RangeError(`${x.length} abscissae, ${y.length} ordinates`);
  if (x.length < 2) return refuse({ type: "TooFewPoints", got: x.length, needed: 2 });
  const spread = sumOfProducts(x, x);
  if (spread === 0) return refuse({ type: "NoSpread", value: 0, points: x.length });

  const slope = sumOfProducts(x, y) / spread;
  const residuals = y.map((value, i) => value - slope * (x[i] as number));
  const degreesOfFreedom = x.length - 1;
  const variance = sum(residuals.map((r) => r * r)) / degreesOfFreedom;
  return answer({
    slope,
    residuals,
    slopeUncertainty: Math.sqrt(variance / spread),
    residualDeviation: Math.sqrt(variance),
    degreesOfFreedom,
  });
}
