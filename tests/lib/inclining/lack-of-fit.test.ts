import { describe, expect, it } from "vitest";
import { lackOfFit } from "@/lib/inclining/lack-of-fit";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { lineOff } from "./sample-line";

describe("lack of fit", () => {
  it("compares the groups' scatter about the line with the moves' scatter within groups", () => {
    // zeros read +e, 0, −e about their mean; a bulge of b at both 100 and −100 and nothing else
    const [e, b] = [1e-5, 5e-5];
    const off = [e, b, 0, b, 0, b, 0, b, -e];
    const found = lackOfFit(lineOff((move) => off[move] ?? 0).moves);
    // pure: 2e² of 4 repeats (three zeros less one, two of 100, two of −100); lack: Σ(off − mean)² less that, of 3
    const squares = 4 * b ** 2 + 2 * e ** 2 - (4 * b) ** 2 / 9;
    expect(found?.degreesOfFreedom).toEqual([3, 4]);
    expect(found?.ratio).toBeCloseTo((squares - 2 * e ** 2) / 3 / ((2 * e ** 2) / 4), 8);
  });

  it("comes below its probability as often as that says, on straight lines with noise", () => {
    const noise = seededNoise(5);
    const tests = 2000;
    let below = 0;
    for (let i = 0; i < tests; i++) {
      if ((lackOfFit(lineOff(() => noise.normal(1e-4), 1).moves)?.probability ?? 1) < 0.05) below++;
    }
    // 0.005 is the binomial deviation of 2000 tests at 5 %
    expect(Math.abs(below / tests - 0.05)).toBeLessThan(0.015);
  });

  it("takes moments within one part in a hundred for one", () => {
    const moments = [0, 100, 200, 100.5, 0.4, -100, -200, -99.6, 0];
    expect(lackOfFit(lineOff((move) => move * 1e-6, 2, moments).moves)?.degreesOfFreedom).toEqual([3, 4]);
  });

  it("can't be told where no moment was repeated", () => {
    expect(lackOfFit(lineOff(() => 0, 2, [0, 100, 200, -100, -200]).moves)).toBeNull();
  });

  it("finds a straight line straight, also where everything repeats exactly", () => {
    expect(lackOfFit(lineOff(() => 0).moves)?.probability ?? 1).toBeGreaterThan(0.9);
  });
});
