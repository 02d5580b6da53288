import { promised } from "@/lib/result";
import { incompleteBeta } from "./incomplete-beta";
import { rootBetween } from "./root";

/**
 * Probability that F of the given degrees of freedom exceeds f: how often a variance ratio as large comes by chance.
 *
 *     P(F > f) = I_x(ν₂/2, ν₁/2),   x = ν₂/(ν₂ + ν₁·f)
 *
 * f ≥ 0; degrees of freedom of numerator and denominator > 0. The caller makes sure of them.
 * Source: NIST Digital Library of Mathematical Functions 8.17 *from memory*.
 */
export function fTail(f: number, numerator: number, denominator: number): number {
  if (!(f >= 0 && numerator > 0 && denominator > 0)) throw new RangeError(`F of ${numerator} and ${denominator} at ${f}`);
  const whole = denominator + numerator * f;
  return incompleteBeta(denominator / whole, denominator / 2, numerator / 2, (numerator * f) / whole);
}

/** The value that F of the given degrees of freedom exceeds with the given probability, between 0 and 1 excluded. */
export function fCritical(tail: number, numerator: number, denominator: number): number {
  if (!(tail > 0 && tail < 1)) throw new RangeError(`critical value of F at probability ${tail}`);
  const miss = (logF: number) => Math.log(fTail(Math.exp(logF), numerator, denominator) / tail);
  let high = 1;
  while (miss(high) > 0) high *= 2;
  let low = -1;
  while (miss(low) < 0) low *= 2;
  return Math.exp(promised(rootBetween(miss, low, high, 1e-14)));
}
