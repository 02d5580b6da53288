import fc from "fast-check";
import { linearRegression } from "simple-statistics";
import { describe, expect, it } from "vitest";
import { linearFit } from "@/lib/numerics/linear-fit";
import { promised } from "@/lib/result";

const points = fc
  .array(fc.tuple(fc.integer({ min: -100, max: 100 }), fc.double({ min: -1, max: 1, noNaN: true })), { minLength: 3, maxLength: 30 })
  .filter((pairs) => new Set(pairs.map(([x]) => x)).size > 1);

describe("linear fit", () => {
  it("finds an exact line and no residual", () => {
    const fit = promised(linearFit([0, 1, 2, 3], [1, 3, 5, 7]));
    expect(fit).toMatchObject({ slope: 2, intercept: 1, residuals: [0, 0, 0, 0], residualDeviation: 0, degreesOfFreedom: 2 });
  });

  it("gives the uncertainties of a worked case", () => {
    // by hand: means 2 and 7/3, Σ(x−x̄)² = 2, slope 1.5, residuals 1/6, −1/3, 1/6, s² = 1/6
    const fit = promised(linearFit([1, 2, 3], [1, 2, 4]));
    expect(fit.slope).toBeCloseTo(1.5, 14);
    expect(fit.intercept).toBeCloseTo(-2 / 3, 14);
    expect(fit.residualDeviation).toBeCloseTo(Math.sqrt(1 / 6), 14);
    expect(fit.slopeUncertainty).toBeCloseTo(Math.sqrt(1 / 12), 14);
    expect(fit.interceptUncertainty).toBeCloseTo(Math.sqrt((1 / 6) * (1 / 3 + 2)), 14);
  });

  it("keeps the slope where x is large", () => {
    const x = [0, 1, 2, 3].map((value) => 1e8 + value);
    const y = [0, 1, 2, 3].map((value) => 5 + 0.25 * value);
    expect(promised(linearFit(x, y)).slope).toBe(0.25);
  });

  it("agrees with a library of statistics", () => {
    fc.assert(
      fc.property(points, (pairs) => {
        const fit = promised(
          linearFit(
            pairs.map(([x]) => x),
            pairs.map(([, y]) => y),
          ),
        );
        const other = linearRegression(pairs.map(([x, y]) => [x, y]));
        // the library does not centre its sums: x² up to 1e4 costs it some digits
        expect(fit.slope).toBeCloseTo(other.m, 9);
        expect(fit.intercept).toBeCloseTo(other.b, 8);
      }),
    );
  });

  it("turns its sign with y and scales with x", () => {
    fc.assert(
      fc.property(points, (pairs) => {
        const x = pairs.map(([value]) => value);
        const y = pairs.map(([, value]) => value);
        const fit = promised(linearFit(x, y));
        const mirrored = promised(
          linearFit(
            x,
            y.map((value) => -value),
          ),
        );
        const scaled = promised(
          linearFit(
            x.map((value) => 4 * value),
            y,
          ),
        );
        expect(mirrored.slope + fit.slope).toBe(0);
        expect(4 * scaled.slope).toBe(fit.slope);
      }),
    );
  });

  it("refuses two points, with what it needs", () => {
    expect(linearFit([0, 1], [0, 1])).toEqual({ ok: false, refusal: { type: "TooFewPoints", got: 2, needed: 3 } });
  });

  it("refuses points that all stand at one x, also where their mean is rounded", () => {
    expect(linearFit([0.1, 0.1, 0.1], [1, 2, 3])).toMatchObject({ ok: false, refusal: { type: "NoSpread", points: 3 } });
    expect(linearFit([0, 0, 0], [1, 2, 3])).toMatchObject({ ok: false, refusal: { type: "NoSpread", value: 0 } });
  });
});
