import { promised } from "@/lib/result";
import { incompleteBeta } from "./incomplete-beta";
import { rootBetween } from "./root";

/**
 * Quantile of Student's t: the value that a t of `dof` degrees of freedom stays below with the given probability.
 * Any probability between 0 and 1 (excluded), any dof > 0, also fractional ones. The caller makes sure of both.
 *
 * Source: JCGM 100:2008 (GUM) annex G.3; tail probability by DLMF 8.17 (from memory).
 */
export function studentT(probability: number, dof: number): number {
  if (!(probability > 0 && probability < 1)) throw new RangeError(`quantile of Student's t at probability ${probability}`);
  if (probability === 0.5) return 0;
  if (probability < 0.5) return -studentT(1 - probability, dof);
  return upperQuantile(1 - probability, dof);
}

/** The factor k for which ±k standard uncertainties hold 95 % of Student's t. */
export function studentTTwoSided95(dof: number): number {
  return upperQuantile(0.025, dof);
}

/** Probability that Student's t exceeds t. */
export function studentTTail(t: number, dof: number): number {
  if (!(dof > 0)) throw new RangeError(`Student's t of ${dof} degrees of freedom`);
  const whole = dof + t * t;
  const oneSide = incompleteBeta(dof / whole, dof / 2, 0.5, (t * t) / whole) / 2;
  return t >= 0 ? oneSide : 1 - oneSide;
}

// solved in ln t and ln tail, where the curve is nearly straight at both ends
function upperQuantile(tail: number, dof: number): number {
  const miss = (logT: number) => Math.log(studentTTail(Math.exp(logT), dof) / tail);
  let high = 1;
  while (miss(high) > 0) high *= 2;
  let low = -1;
  while (miss(low) < 0) low *= 2;
  return Math.exp(promised(rootBetween(miss, low, high, 1e-15)));
}
