import fc from "fast-check";
import { expect, test } from "vitest";
import { oddOnes } from "@/lib/numerics/odd-ones";

const xs = Array.from({ length: 9 }, (_, i) => i);
const squares = xs.map((x) => x * x);

test("finds nothing on a curve, however steep", () => {
  expect(oddOnes(xs, squares, 0.01)).toEqual([]);
  expect(oddOnes(xs, xs.map(Math.exp), 0.01)).toEqual([]);
});

test("finds the one wrong figure with what its neighbours would have it", () => {
  const wrong = squares.with(4, 61);
  const [odd, ...others] = oddOnes(xs, wrong, 0.01);
  expect(others).toEqual([]);
  expect(odd).toMatchObject({ index: 4, value: 61 });
  expect(odd?.expected).toBeCloseTo(16, 12);
});

test("finds one wrong figure anywhere between the second and the last but one, whatever the spacing", () => {
  const gaps = fc.array(fc.double({ min: 0.5, max: 2, noNaN: true }), { minLength: 8, maxLength: 14 });
  fc.assert(
    fc.property(gaps, fc.nat(), fc.constantFrom(-1, 1), (steps, place, sign) => {
      const knots = [0, ...steps.map((_, i) => steps.slice(0, i + 1).reduce((sum, step) => sum + step))];
      const index = 2 + (place % (knots.length - 4));
      const ys = knots.map((x, i) => 3 * x + 0.05 * x * x + (i === index ? sign : 0));
      expect(oddOnes(knots, ys, 0.05).map((odd) => odd.index)).toEqual([index]);
    }),
  );
});

test("says nothing of fewer than six points, of the ends, and of what is less than counts", () => {
  expect(oddOnes(xs.slice(0, 5), squares.slice(0, 5).with(2, 60), 0.01)).toEqual([]);
  expect(oddOnes(xs, squares.with(0, 3), 4)).toEqual([]);
  expect(oddOnes(xs, squares.with(4, 16.05), 0.1)).toEqual([]);
});
