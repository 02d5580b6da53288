import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { mean, standardDeviation, sum, sumOfProducts } from "@/lib/numerics/sum";

const number = fc.double({ min: -1e6, max: 1e6, noNaN: true });

describe("sum", () => {
  it("keeps what a plain loop loses", () => {
    expect(sum([1e100, 1, -1e100])).toBe(1);
    expect(sum(Array.from({ length: 10 }, () => 0.1))).toBe(1);
    expect(sum([])).toBe(0);
  });

  it("does not depend on the order of its terms beyond one rounding", () => {
    fc.assert(
      fc.property(fc.array(number, { maxLength: 40 }), (values) => {
        // one rounding of a total below 4e7
        expect(Math.abs(sum(values) - sum(values.toReversed()))).toBeLessThan(1e-8);
      }),
    );
  });

  it("sums products", () => {
    expect(sumOfProducts([1, 2, 3], [4, 5, 6])).toBe(32);
  });
});

describe("mean and standard deviation", () => {
  it("are those of the definition", () => {
    expect(mean([2, 4, 4, 4, 5, 5, 7, 9])).toBe(5);
    expect(standardDeviation([2, 4, 4, 4, 5, 5, 7, 9])).toBeCloseTo(Math.sqrt(32 / 7), 15);
  });

  it("keep the deviation of numbers far from zero", () => {
    expect(standardDeviation([1e9 + 1, 1e9 + 2, 1e9 + 3])).toBe(1);
  });

  it("take a mean of nothing for a broken promise", () => {
    expect(() => mean([])).toThrow(RangeError);
    expect(() => standardDeviation([1])).toThrow(RangeError);
  });
});
