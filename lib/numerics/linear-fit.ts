import { answer, type Result, refuse } from "@/lib/result";
import { mean, sum, sumOfProducts } from "./sum";

export type LinearFit = {
  readonly slope: number;
  readonly intercept: number;
  /** measured − fitted, in the order of the points */
  readonly residuals: readonly number[];
  readonly slopeUncertainty: number;
  readonly interceptUncertainty: number;
  readonly residualDeviation: number;
  readonly degreesOfFreedom: number;
};

export type TooFewPoints = { readonly type: "TooFewPoints"; readonly got: number; readonly needed: number };
export type NoSpread = { readonly type: "NoSpread"; readonly value: number; readonly points: number };

/**
 * The straight line y = intercept + slope·x by ordinary least squares, all error in y.
 *
 *     slope = Σ(x−x̄)(y−ȳ) / Σ(x−x̄)²,  intercept = ȳ − slope·x̄
 *     s² = Σr²/(n−2),  u(slope)² = s²/Σ(x−x̄)²,  u(intercept)² = s²·(1/n + x̄²/Σ(x−x̄)²)
 *
 * Sums are centred on the means: without that the slope is lost when x is large.
 * Refuses fewer than three points (two leave no scatter to judge by) and points that all stand at one x.
 *
 * Source: JCGM 100:2008 (GUM) H.3; NIST StRD, Norris.
 */
export function linearFit(x: readonly number[], y: readonly number[]): Result<LinearFit, TooFewPoints | NoSpread> {
  if (x.length !== y.length) throw new RangeError(`${x.length} abscissae, ${y.length} ordinates`);
  if (x.length < 3) return refuse({ type: "TooFewPoints", got: x.length, needed: 3 });
  const meanX = mean(x);
  const meanY = mean(y);
  const dx = x.map((value) => value - meanX);
  const dy = y.map((value) => value - meanY);
  if (hasNoSpread(x, dx)) return refuse({ type: "NoSpread", value: meanX, points: x.length });

  const spread = sumOfProducts(dx, dx);
  const slope = sumOfProducts(dx, dy) / spread;
  const residuals = dy.map((value, i) => value - slope * (dx[i] as number));
  const degreesOfFreedom = x.length - 2;
  const variance = sum(residuals.map((r) => r * r)) / degreesOfFreedom;
  return answer({
    slope,
    intercept: meanY - slope * meanX,
    residuals,
    slopeUncertainty: Math.sqrt(variance / spread),
    interceptUncertainty: Math.sqrt(variance * (1 / x.length + meanX ** 2 / spread)),
    residualDeviation: Math.sqrt(variance),
    degreesOfFreedom,
  });
}

// what is left of equal numbers after rounding is no spread
function hasNoSpread(x: readonly number[], dx: readonly number[]): boolean {
  const largest = Math.max(...x.map(Math.abs));
  return Math.max(...dx.map(Math.abs)) <= 1e-13 * largest || largest === 0;
}
