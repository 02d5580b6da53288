import { expect, test } from "vitest";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { studentTTwoSided95 } from "@/lib/numerics/student-t";
import { type DrawnModel, drawnAtOnce, drawnInStretches, interval95 } from "@/lib/uncertainty/monte-carlo";

const itself: DrawnModel = {
  numbers: 1,
  into: (off, answer) => {
    answer[0] = off[0] as number;
  },
};

test.each([2, 5, 7, 20])("draws Student's t of %i degrees of freedom where an uncertainty comes from scatter", (degreesOfFreedom) => {
  const [drawn] = drawnAtOnce(itself, [{ degreesOfFreedom }], 200_000, seededNoise(3));
  const [low, high] = interval95(drawn ?? new Float64Array());
  const factor = studentTTwoSided95(degreesOfFreedom);
  expect((high - low) / 2 / factor).toBeGreaterThan(0.98);
  expect((high - low) / 2 / factor).toBeLessThan(1.02);
  expect(Math.abs(high + low) / factor).toBeLessThan(0.04);
});

test("gives the same draws for the same seed, and others for another", () => {
  const draws = (seed: number) => drawnAtOnce(itself, [{ degreesOfFreedom: null }], 100, seededNoise(seed))[0];
  expect(draws(5)).toEqual(draws(5));
  expect(draws(5)).not.toEqual(draws(6));
});

test("tells how far it has come, and draws the same in stretches as at once", () => {
  const stretches = drawnInStretches(itself, [{ degreesOfFreedom: null }], 250, seededNoise(9), 100);
  const told: number[] = [];
  let step = stretches.next();
  for (; !step.done; step = stretches.next()) told.push(step.value);
  expect(told).toEqual([100, 200]);
  expect(step.value[0]).toEqual(drawnAtOnce(itself, [{ degreesOfFreedom: null }], 250, seededNoise(9))[0]);
});

test("takes the interval between the quantiles, not about the mean", () => {
  const values = Float64Array.from({ length: 1001 }, (_, i) => (i / 1000) ** 2);
  const [low, high] = interval95(values);
  expect(low).toBeCloseTo(0.025 ** 2, 12);
  expect(high).toBeCloseTo(0.975 ** 2, 12);
});
