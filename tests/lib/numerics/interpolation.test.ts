import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { between, interpolated, placeInTable, valueAt } from "@/lib/numerics/interpolation";
import { promised } from "@/lib/result";

describe("table look-up", () => {
  const knots = [1, 2, 4];
  const values = [10, 20, 0];

  it("gives the table's own values at its knots", () => {
    expect(knots.map((x) => promised(interpolated(knots, values, x)))).toEqual(values);
  });

  it("is linear between them", () => {
    expect(promised(interpolated(knots, values, 3))).toBe(10);
    expect(promised(interpolated(knots, values, 1.5))).toBe(15);
  });

  it("answers for a single knot alone", () => {
    expect(promised(interpolated([5], [7], 5))).toBe(7);
    expect(interpolated([5], [7], 5.1).ok).toBe(false);
  });

  it("reproduces any straight line", () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 4, noNaN: true }), (x) => {
        const place = promised(placeInTable(knots, x));
        expect(valueAt([5, 7, 11], place)).toBeCloseTo(3 + 2 * x, 13);
      }),
    );
  });

  it("refuses to go beyond the table, with its limits", () => {
    const refusal = { type: "OutsideTable", lowest: 1, highest: 4 };
    expect(interpolated(knots, values, 0.99)).toEqual({ ok: false, refusal: { ...refusal, value: 0.99 } });
    expect(interpolated(knots, values, 4.01)).toEqual({ ok: false, refusal: { ...refusal, value: 4.01 } });
    expect(interpolated(knots, values, Number.NaN).ok).toBe(false);
  });

  it("reaches both ends exactly", () => {
    expect(between(0.1, 0.7, 0)).toBe(0.1);
    expect(between(0.1, 0.7, 1)).toBe(0.7);
  });
});
