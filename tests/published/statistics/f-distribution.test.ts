import { expect, it } from "vitest";
import { fCritical, fTail } from "@/lib/numerics/f-distribution";

/**
 * Degrees of freedom above and below, the value exceeded with the probability, the probability.
 * Source: rows with four decimals, table at atozmath.com/CONM/DistributionTables.aspx?q=f; rows with two decimals, table at
 * astarmathsandphysics.com, F distribution tables; 18 and 20: NIST/SEMATECH e-Handbook of Statistical Methods, 4.6.1.5.
 */
const table = [
  [1, 1, 161.4476, 0.05, 4],
  [10, 1, 241.8817, 0.05, 4],
  [1, 2, 98.5025, 0.01, 4],
  [5, 2, 19.2964, 0.05, 4],
  [1, 3, 17.4434, 0.025, 4],
  [3, 3, 9.2766, 0.05, 4],
  [20, 3, 8.6602, 0.05, 4],
  [3, 4, 6.59, 0.05, 2],
  [3, 4, 16.69, 0.01, 2],
  [2, 5, 5.79, 0.05, 2],
  [4, 6, 4.53, 0.05, 2],
  [5, 7, 7.46, 0.01, 2],
  [8, 9, 3.23, 0.05, 2],
  [18, 20, 2.15, 0.05, 2],
] as const;

it.each(table)("F of %i and %i degrees of freedom exceeds %f with probability %f", (above, below, value, tail, decimals) => {
  // a table is right to half of its last digit
  expect(Math.abs(fCritical(tail, above, below) - value)).toBeLessThan(0.5 * 10 ** -decimals + 1e-9);
  expect(fTail(value, above, below)).toBeCloseTo(tail, 3);
});
