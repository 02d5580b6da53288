import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { commonSlope } from "@/lib/inclining/common-slope";
import { promised } from "@/lib/result";

const points = (slope: number, intercept: number, moments: readonly number[]) =>
  moments.map((moment) => ({ moment, tan: intercept + slope * moment }));

describe("common slope", () => {
  it("finds the slope and every intercept of parallel lines", () => {
    const fit = promised(commonSlope([points(2e-4, 0.03, [0, 50, -50]), points(2e-4, -0.01, [0, 100])]));
    expect(fit.slope).toBeCloseTo(2e-4, 16);
    expect(fit.intercepts[0]).toBeCloseTo(0.03, 15);
    expect(fit.intercepts[1]).toBeCloseTo(-0.01, 15);
  });

  it("weighs slopes by the spread of their moments: (1·2 + 3·8)/(2 + 8)", () => {
    // about their means the moments of the first spread by 2, of the second by 8
    const fit = promised(commonSlope([points(1, 0, [-1, 1]), points(3, 0, [-2, 2])]));
    expect(fit.slope).toBeCloseTo(2.6, 14);
  });

  it("keeps its digits where moments count from far away", () => {
    const fit = promised(commonSlope([points(2e-4, 0, [1e7, 1e7 + 50, 1e7 - 50])]));
    // ten digits of the moments are their common part; six of sixteen are left
    expect(fit.slope / 2e-4).toBeCloseTo(1, 6);
  });

  it("does not change with any station's zero", () => {
    const moments = [0, 40, 80, -40, -80];
    const scatter = fc.array(fc.double({ min: -1e-4, max: 1e-4, noNaN: true }), { minLength: 5, maxLength: 5 });
    fc.assert(
      fc.property(scatter, scatter, fc.double({ min: -0.2, max: 0.2, noNaN: true }), (first, second, zero) => {
        const series = [first, second].map((noise) => moments.map((moment, i) => ({ moment, tan: 2e-4 * moment + (noise[i] ?? 0) })));
        const moved = series.map((each, j) => (j === 0 ? each.map(({ moment, tan }) => ({ moment, tan: tan + zero })) : each));
        expect(promised(commonSlope(moved)).slope).toBeCloseTo(promised(commonSlope(series)).slope, 14);
      }),
    );
  });

  it("refuses series that stand at one moment each", () => {
    expect(commonSlope([points(1, 0, [5, 5]), points(1, 0, [7])])).toEqual({
      ok: false,
      refusal: { type: "NoSpreadInMoment", points: 3, moments: [5, 7] },
    });
  });
});
