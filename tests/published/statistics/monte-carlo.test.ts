import { describe, expect, test } from "vitest";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { mean } from "@/lib/numerics/sum";
import { type DrawnModel, drawnAtOnce, interval95 } from "@/lib/uncertainty/monte-carlo";
import type { Chance } from "@/lib/uncertainty/uncertain-input";

/** Source: JCGM 101:2008, Evaluation of measurement data, Supplement 1 to the GUM: Propagation of distributions using a Monte Carlo method (values from memory). */
const draws = 400_000;
const normal: Chance = { degreesOfFreedom: null };
const rectangular: Chance = { distribution: "rectangular", degreesOfFreedom: null };

function drawn(model: DrawnModel, chances: readonly Chance[]) {
  const [values = new Float64Array()] = drawnAtOnce(model, chances, draws, seededNoise(2008));
  const centre = mean([...values]);
  const deviation = Math.sqrt(mean(Array.from(values, (value) => (value - centre) ** 2)));
  return { centre, deviation, interval: interval95(values) };
}

const sumOfFour: DrawnModel = {
  numbers: 1,
  into: (off, answer) => {
    answer[0] = (off[0] as number) + (off[1] as number) + (off[2] as number) + (off[3] as number);
  },
};

describe("the additive model, 9.2", () => {
  test("four normal inputs: u = 2.00, ±3.92 (table 2)", () => {
    const { deviation, interval } = drawn(sumOfFour, Array(4).fill(normal));
    expect(deviation).toBeCloseTo(2.0, 1);
    expect(interval[0]).toBeCloseTo(-3.92, 1);
    expect(interval[1]).toBeCloseTo(3.92, 1);
  });

  test("four rectangular inputs of the same deviation: u = 2.00, ±3.88 (table 3)", () => {
    const { deviation, interval } = drawn(sumOfFour, Array(4).fill(rectangular));
    expect(deviation).toBeCloseTo(2.0, 1);
    expect(Math.abs(interval[0] + 3.88)).toBeLessThan(0.02);
    expect(Math.abs(interval[1] - 3.88)).toBeLessThan(0.02);
  });
});

/** m_R,c and δm_R,c in mg; densities in kg/m³; the answer is the deviation of the weight from its nominal 100 g [mg]. */
const massCalibration: DrawnModel = {
  numbers: 1,
  into: (off, answer) => {
    const reference = 100_000 + 0.05 * (off[0] as number);
    const difference = 1.234 + 0.02 * (off[1] as number);
    const air = 1.2 + (0.1 / Math.sqrt(3)) * (off[2] as number);
    const weight = 8000 + (1000 / Math.sqrt(3)) * (off[3] as number);
    const standard = 8000 + (50 / Math.sqrt(3)) * (off[4] as number);
    answer[0] = (reference + difference) * (1 + (air - 1.2) * (1 / weight - 1 / standard)) - 100_000;
  },
};

test("mass calibration, 9.3: 1.2341 mg, u = 0.0754 mg where the linear law gives 0.0539, interval 1.0834 to 1.3825 (table 6)", () => {
  const { centre, deviation, interval } = drawn(massCalibration, [normal, normal, rectangular, rectangular, rectangular]);
  expect(Math.abs(centre - 1.2341)).toBeLessThan(0.0005);
  expect(Math.abs(deviation - 0.0754)).toBeLessThan(0.0005);
  expect(Math.abs(interval[0] - 1.0834)).toBeLessThan(0.002);
  expect(Math.abs(interval[1] - 1.3825)).toBeLessThan(0.002);
});
