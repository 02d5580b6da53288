import { describe, expect, it } from "vitest";
import { meanResiduals } from "@/lib/inclining/mean-residuals";
import { fittedPattern, patternsOf } from "@/lib/inclining/move-patterns";
import { standardisedResiduals } from "@/lib/inclining/standardised-residuals";
import { linearFit } from "@/lib/numerics/linear-fit";
import { studentTTail } from "@/lib/numerics/student-t";
import { promised } from "@/lib/result";
import { eightMovements, lineOff, sampleSlope } from "./sample-line";

const off = [3, -1, 4, -1, 5, -9, 2, -6, 5].map((each) => each * 1e-5);
const { moves } = lineOff((move) => off[move] ?? 0);
const { points, degreesOfFreedom } = meanResiduals(moves);
const patterns = patternsOf(points);

describe("ways in which a plot may bend", () => {
  it("are a gust at each move, one of free liquid, winds with two moves on each side, and restraints on both sides", () => {
    const count = (cause: string) => patterns.filter((pattern) => pattern.cause === cause).length;
    expect(["gust", "free-liquid", "steady-wind", "restraint"].map(count)).toEqual([9, 1, 6, 8]);
  });

  it("explain all of a plot that is bent just so, and tell its size", () => {
    const bent = meanResiduals(lineOff((_, __, moment) => -0.3 * sampleSlope * Math.max(0, -moment - 50) * -1).moves);
    const fitted = patternsOf(bent.points).flatMap((pattern) => fittedPattern(pattern, bent.points, bent.degreesOfFreedom, 1e-9) ?? []);
    const best = fitted.toSorted((a, b) => b.explained - a.explained)[0];
    // port side: 30 % of 150 t·m are missing, so the heel is that much less to port
    expect(best).toMatchObject({ cause: "restraint", moves: [5, 6, 7], explained: expect.closeTo(1, 9) });
    expect(best?.size).toBeCloseTo(0.3 * sampleSlope * 150, 12);
  });

  it("a gust is as probable as its standardised residual says", () => {
    const gust = patterns.find((pattern) => pattern.cause === "gust" && pattern.moves[0] === 5);
    if (gust === undefined) throw new Error("no gust at move 5");
    const fitted = fittedPattern(gust, points, degreesOfFreedom, 0);
    const t = standardisedResiduals(moves).points[5]?.standardised as number;
    expect(fitted?.probability).toBeCloseTo(2 * studentTTail(Math.abs(t), degreesOfFreedom - 1), 10);
    // its size is the distance from the line through the other moves
    const others = eightMovements.map((_, i) => i).filter((i) => i !== 5);
    const fit = promised(
      linearFit(
        others.map((i) => eightMovements[i] as number),
        others.map((i) => off[i] as number),
      ),
    );
    expect(fitted?.size).toBeCloseTo((off[5] as number) - fit.intercept + 100 * fit.slope, 12);
  });

  it("can't be more heel where less was found, nor what the line takes up", () => {
    const bent = meanResiduals(lineOff((_, __, moment) => -1e-8 * moment * Math.abs(moment)).moves);
    const liquid = patternsOf(bent.points).find(({ cause }) => cause === "free-liquid");
    if (liquid === undefined) throw new Error("no free liquid");
    expect(fittedPattern(liquid, bent.points, bent.degreesOfFreedom, 0)).toBeNull();
    expect(fittedPattern({ ...liquid, shape: eightMovements }, points, degreesOfFreedom, 0)).toBeNull();
  });
});
