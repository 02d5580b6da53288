import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { incompleteBeta, logGamma } from "@/lib/numerics/incomplete-beta";

describe("incomplete beta", () => {
  it("has the closed forms of whole numbers", () => {
    for (const x of [0, 0.1, 0.5, 0.9, 1]) {
      expect(incompleteBeta(x, 1, 1)).toBeCloseTo(x, 14);
      expect(incompleteBeta(x, 3, 1)).toBeCloseTo(x ** 3, 14);
      expect(incompleteBeta(x, 2, 2)).toBeCloseTo(x * x * (3 - 2 * x), 14);
    }
  });

  it("is the arcsine law at halves", () => {
    for (const x of [0.01, 0.3, 0.75]) expect(incompleteBeta(x, 0.5, 0.5)).toBeCloseTo((2 / Math.PI) * Math.asin(Math.sqrt(x)), 13);
  });

  it("mirrors: I_x(a, b) + I_{1−x}(b, a) = 1", () => {
    const shape = fc.double({ min: 0.5, max: 200, noNaN: true });
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1024 }), shape, shape, (parts, a, b) => {
        // a binary fraction, so that 1 − x is exact; a steep curve would show its rounding
        const x = parts / 1024;
        expect(incompleteBeta(x, a, b) + incompleteBeta(1 - x, b, a)).toBeCloseTo(1, 11);
      }),
    );
  });

  it("takes arguments outside its range for a broken promise", () => {
    expect(() => incompleteBeta(1.1, 1, 1)).toThrow(RangeError);
    expect(() => incompleteBeta(0.5, 0, 1)).toThrow(RangeError);
  });
});

describe("ln Γ", () => {
  it("gives factorials and the root of π", () => {
    expect(logGamma(1)).toBeCloseTo(0, 14);
    expect(logGamma(11)).toBeCloseTo(Math.log(3_628_800), 12);
    expect(logGamma(0.5)).toBeCloseTo(Math.log(Math.PI) / 2, 14);
    expect(logGamma(0.25)).toBeCloseTo(Math.log(3.625609908221908), 13);
  });
});
