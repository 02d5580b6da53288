import { expect, it } from "vitest";
import type { MoveOnLine } from "@/lib/inclining/inclined-ship";
import { lackOfFit } from "@/lib/inclining/lack-of-fit";
import { linearFit } from "@/lib/numerics/linear-fit";
import { promised } from "@/lib/result";
import { agreeingDigits } from "./agreeing-digits";

/**
 * Load cell calibration, 20 loads, each twice, with a straight line that does not fit.
 * Source: NIST/SEMATECH e-Handbook of Statistical Methods, 4.6.1.5, www.itl.nist.gov/div898/handbook/pmd/section6/pmd615.htm:
 * residual standard deviation 0.0021712694 of 38 degrees of freedom, lack of fit F = 214.7464 of 18 and 20; data as in the
 * Statistical Reference Datasets, Pontius. The handbook's figures hold to five digits: the same sums in exact fractions of the
 * data as printed give 0.00217127259605676 and 214.746923653909.
 */
const deflections = [
  0.11019, 0.21956, 0.32949, 0.43899, 0.54803, 0.65694, 0.76562, 0.87487, 0.98292, 1.09146, 1.20001, 1.30822, 1.41599, 1.52399, 1.63194,
  1.73947, 1.84646, 1.95392, 2.06128, 2.16844, 0.11052, 0.22018, 0.32939, 0.43886, 0.54798, 0.65739, 0.76596, 0.87474, 0.983, 1.0915,
  1.20004, 1.30818, 1.41613, 1.52408, 1.63159, 1.73965, 1.84696, 1.95445, 2.06177, 2.16829,
];
const loads = deflections.map((_, i) => 150_000 * (1 + (i % 20)));

it("a load cell's straight line lacks fit as NIST found", () => {
  const fit = promised(linearFit(loads, deflections));
  expect(agreeingDigits(fit.residualDeviation, 0.0021712694)).toBeGreaterThan(5);
  expect(agreeingDigits(fit.residualDeviation, 0.00217127259605676)).toBeGreaterThan(10);
  const moves: MoveOnLine[] = loads.map((moment, no) => ({
    no,
    session: 1,
    moment,
    along: 0,
    tanHeel: deflections[no] as number,
    residual: fit.residuals[no] as number,
    stations: 1,
  }));
  const found = lackOfFit(moves);
  expect(found?.degreesOfFreedom).toEqual([18, 20]);
  expect(agreeingDigits(found?.ratio ?? 0, 214.7464)).toBeGreaterThan(5);
  expect(agreeingDigits(found?.ratio ?? 0, 214.746923653909)).toBeGreaterThan(9);
  expect(found?.probability).toBeLessThan(1e-6);
});
