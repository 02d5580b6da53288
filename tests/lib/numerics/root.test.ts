import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { rootBetween } from "@/lib/numerics/root";
import { promised } from "@/lib/result";

describe("root between two limits", () => {
  it("finds the root of two", () => {
    expect(promised(rootBetween((x) => x * x - 2, 0, 2, 1e-15))).toBeCloseTo(Math.SQRT2, 14);
  });

  it("takes a limit that is a root", () => {
    expect(promised(rootBetween((x) => x, 0, 1, 1e-12))).toBe(0);
    expect(promised(rootBetween((x) => x - 1, 0, 1, 1e-12))).toBe(1);
  });

  it("stays within its tolerance on a curve flat on one side and steep on the other", () => {
    expect(Math.abs(promised(rootBetween((x) => Math.exp(30 * x) - 2, -5, 5, 1e-10)) - Math.log(2) / 30)).toBeLessThan(1e-10);
  });

  it("does not need many looks at a step", () => {
    let looks = 0;
    const step = (x: number) => {
      looks++;
      return x < 0.3 ? -1 : 1;
    };
    expect(promised(rootBetween(step, 0, 1, 1e-9))).toBeCloseTo(0.3, 8);
    expect(looks).toBeLessThan(120);
  });

  it("finds any root of a cubic that it brackets", () => {
    fc.assert(
      fc.property(fc.double({ min: -0.9, max: 0.9, noNaN: true }), (root) => {
        const found = promised(rootBetween((x) => (x - root) * (x * x + 1), -1, 1, 1e-12));
        expect(Math.abs(found - root)).toBeLessThan(1e-11);
      }),
    );
  });

  it("refuses limits without a change of sign, with the values there", () => {
    expect(rootBetween((x) => x * x + 1, -1, 2, 1e-9)).toEqual({
      ok: false,
      refusal: { type: "NoSignChange", low: -1, high: 2, atLow: 2, atHigh: 5 },
    });
    expect(rootBetween(() => Number.NaN, 0, 1, 1e-9).ok).toBe(false);
  });
});
