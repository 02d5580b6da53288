import { describe, expect, it } from "vitest";
import { standardisedResiduals } from "@/lib/inclining/standardised-residuals";
import { linearFit } from "@/lib/numerics/linear-fit";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { promised } from "@/lib/result";
import { eightMovements, lineOff, mirroredLine } from "./sample-line";

const off = [3, -1, 4, -1, 5, -9, 2, -6, 5].map((each) => each * 1e-5);

describe("standardised residuals of the moves", () => {
  it("are the distance from the line through the other moves over its standard error there", () => {
    const { points } = standardisedResiduals(lineOff((move) => off[move] ?? 0).moves);
    const k = 5;
    const others = eightMovements.map((_, i) => i).filter((i) => i !== k);
    const x = others.map((i) => eightMovements[i] as number);
    const fit = promised(
      linearFit(
        x,
        others.map((i) => off[i] as number),
      ),
    );
    const centre = x.reduce((a, b) => a + b, 0) / x.length;
    const spread = x.reduce((total, each) => total + (each - centre) ** 2, 0);
    const at = eightMovements[k] as number;
    const error = fit.residualDeviation * Math.sqrt(1 + 1 / x.length + (at - centre) ** 2 / spread);
    expect(points[k]?.standardised).toBeCloseTo(((off[k] as number) - fit.intercept - fit.slope * at) / error, 9);
  });

  it("pass their limit on a straight line with noise in five tests of a hundred", () => {
    const noise = seededNoise(11);
    const tests = 2000;
    let beyond = 0;
    for (let i = 0; i < tests; i++) {
      const { points, limit } = standardisedResiduals(lineOff(() => noise.normal(1e-4), 1).moves);
      if (points.some(({ standardised }) => Math.abs(standardised ?? 0) > (limit ?? 0))) beyond++;
    }
    // Bonferroni keeps at most 5 %; 0.005 is the binomial deviation of 2000 tests
    expect(beyond / tests).toBeGreaterThan(0.03);
    expect(beyond / tests).toBeLessThan(0.065);
  });

  it("turn with the ship in a mirror", () => {
    const seen = standardisedResiduals(lineOff((move) => off[move] ?? 0).moves);
    const mirrored = standardisedResiduals(mirroredLine((move) => off[move] ?? 0).moves);
    mirrored.points.forEach(({ standardised }, i) => {
      expect(standardised).toBeCloseTo(-(seen.points[i]?.standardised as number), 8);
    });
    expect(mirrored.limit).toBe(seen.limit);
  });

  it("take no scatter for smaller than the readings' own uncertainty", () => {
    const { moves } = lineOff((move) => (move === 3 ? 1e-5 : 0));
    expect(Math.abs(standardisedResiduals(moves).points[3]?.standardised ?? 0)).toBeGreaterThan(50);
    expect(Math.abs(standardisedResiduals(moves, 1e-4).points[3]?.standardised ?? 0)).toBeLessThan(0.2);
  });

  it("find nothing on a line that is straight to rounding", () => {
    const { points } = standardisedResiduals(lineOff(() => 0).moves);
    expect(Math.max(...points.map(({ standardised }) => Math.abs(standardised ?? 0)))).toBeLessThan(1e-3);
  });

  it("can't be told of three moves", () => {
    const { points, limit } = standardisedResiduals(lineOff(() => 0, 2, [0, 100, -100]).moves);
    expect(limit).toBeNull();
    expect(points.map(({ standardised }) => standardised)).toEqual([null, null, null]);
  });
});
