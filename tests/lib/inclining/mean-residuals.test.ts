import { describe, expect, it } from "vitest";
import { meanResiduals } from "@/lib/inclining/mean-residuals";
import { linearFit } from "@/lib/numerics/linear-fit";
import { sum } from "@/lib/numerics/sum";
import { promised } from "@/lib/result";
import { eightMovements, lineOff } from "./sample-line";

const off = [3, -1, 4, -1, 5, -9, 2, -6, 5].map((each) => each * 1e-5);

describe("move means off their line", () => {
  const { moves } = lineOff((move, j) => (off[move] ?? 0) + (j === 0 ? 1e-5 : -1e-5) * move);
  const { points, degreesOfFreedom } = meanResiduals(moves);

  it("are the residuals of a straight line through the means", () => {
    const fit = promised(linearFit(eightMovements, off));
    points.forEach(({ residual }, i) => {
      expect(residual).toBeCloseTo(fit.residuals[i] as number, 14);
    });
    expect(degreesOfFreedom).toBe(7);
  });

  it("have leverages that add up to what the line takes: its slope and its zero", () => {
    expect(sum(points.map(({ leverage }) => leverage))).toBeCloseTo(2, 13);
    // 1/9 + 200²/(2·(4·100² + 2·200²)/2)
    expect(points[2]?.leverage).toBeCloseTo(1 / 9 + 40_000 / 120_000, 13);
  });

  it("count a second session's zero", () => {
    const twice = [...moves, ...moves.map((move) => ({ ...move, session: 2 }))];
    const both = meanResiduals(twice);
    expect(both.degreesOfFreedom).toBe(15);
    expect(sum(both.points.map(({ leverage }) => leverage))).toBeCloseTo(3, 13);
  });
});
