import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { commonSlope } from "@/lib/inclining/common-slope";
import { weightedSlope } from "@/lib/inclining/weighted-slope";
import { promised } from "@/lib/result";
import { eightMovements } from "./sample-line";

const tangents = eightMovements.map((moment, i) => 0.01 + 1e-4 * moment + 1e-4 * Math.sin(3 * i));
const points = eightMovements.map((moment, i) => ({ moment, tan: tangents[i] as number, uncertainty: 1e-4 }));

describe("a weighted common slope", () => {
  it("is the unweighted one where all uncertainties are alike", () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1e-2, noNaN: true }), (uncertainty) => {
        const alike = points.map((point) => ({ ...point, uncertainty }));
        const weighted = promised(weightedSlope([alike, alike]));
        const plain = promised(commonSlope([points, points]));
        expect(weighted.slope / plain.slope).toBeCloseTo(1, 11);
        expect(weighted.intercepts[0]).toBeCloseTo(plain.intercepts[0] as number, 12);
      }),
    );
  });

  it("counts a reading of half the variance as two readings", () => {
    const [first, ...others] = points;
    if (first === undefined) throw new Error("no points");
    const half = promised(weightedSlope([[{ ...first, uncertainty: first.uncertainty / Math.SQRT2 }, ...others]]));
    expect(half.slope).toBeCloseTo(promised(commonSlope([[first, first, ...others]])).slope, 15);
  });

  it("follows the station that is far better known", () => {
    const steep = points.map(({ moment, tan }) => ({ moment, tan: 2 * tan, uncertainty: 1 }));
    expect(promised(weightedSlope([points, steep])).slope).toBeCloseTo(promised(commonSlope([points])).slope, 10);
  });

  it("refuses an uncertainty of zero, and one moment only", () => {
    const certain = points.map((point) => ({ ...point, uncertainty: 0 }));
    expect(weightedSlope([certain])).toEqual({ ok: false, refusal: { type: "UncertaintyNotPositive", uncertainty: 0 } });
    const still = points.map((point) => ({ ...point, moment: 5 }));
    expect(weightedSlope([still])).toEqual({ ok: false, refusal: { type: "NoSpreadInMoment", points: 9, moments: [5] } });
  });
});
