import { describe, expect, it } from "vitest";
import { seededNoise } from "@/lib/numerics/seeded-noise";

const drawn = (seed: number, count: number) => {
  const { normal } = seededNoise(seed);
  return Array.from({ length: count }, () => normal(2));
};

describe("seeded noise", () => {
  it("repeats with its seed, and differs with another", () => {
    expect(drawn(5, 4)).toEqual(drawn(5, 4));
    expect(drawn(5, 4)).not.toEqual(drawn(6, 4));
  });

  it("has the mean and deviation it is asked for", () => {
    const values = drawn(1, 20_000);
    const mean = values.reduce((total, value) => total + value, 0) / values.length;
    const variance = values.reduce((total, value) => total + (value - mean) ** 2, 0) / values.length;
    // four standard errors: 2/√20000 of the mean, 4·√(2/20000) of the variance
    expect(Math.abs(mean)).toBeLessThan((4 * 2) / Math.sqrt(20_000));
    expect(Math.abs(variance - 4)).toBeLessThan(4 * 4 * Math.sqrt(2 / 20_000));
  });

  it("is even between 0 and 1", () => {
    const { uniform } = seededNoise(9);
    const values = Array.from({ length: 5000 }, uniform);
    expect(Math.min(...values)).toBeGreaterThanOrEqual(0);
    expect(Math.max(...values)).toBeLessThan(1);
    expect(values.filter((value) => value < 0.25).length / 5000).toBeCloseTo(0.25, 1);
  });
});
