import { describe, expect, it } from "vitest";
import { commonLine } from "@/lib/inclining/common-line";
import { promised } from "@/lib/result";

const moments = [0, 50, 100, -50, -100].map((moment, no) => ({ no, session: 1, moment }));
const series = (id: string, zero: number, changes: readonly number[], no = 1) => ({
  id,
  series: no,
  session: 1,
  tangents: changes.map((change, move) => ({ move, tan: zero + change, uncertainty: 0 })),
});
const straight = [0, 0.01, 0.02, -0.01, -0.02];

describe("line of all stations", () => {
  const line = promised(commonLine([series("A", 0.03, straight), series("B", -0.2, straight)], moments));

  it("has the slope of a straight test, whatever the zeros", () => {
    expect(line.slope).toBeCloseTo(2e-4, 15);
    expect(line.stations.map(({ commonIntercept }) => commonIntercept)).toEqual([expect.closeTo(0.03, 14), expect.closeTo(-0.2, 14)]);
    expect(line.spread?.degreesOfFreedom).toBe(3);
    expect(line.spread?.betweenMoves).toBeCloseTo(0, 14);
  });

  it("gives each move the mean change against the zeros", () => {
    expect(line.moves.map(({ no, stations }) => [no, stations])).toEqual([0, 1, 2, 3, 4].map((no) => [no, 2]));
    line.moves.forEach(({ tanHeel }, i) => {
      expect(tanHeel).toBeCloseTo(straight[i] ?? 0, 14);
    });
  });

  it("shows a station that reads 10 % less by itself, and in the residuals of both", () => {
    const bent = promised(
      commonLine(
        [
          series("A", 0, straight),
          series(
            "B",
            0,
            straight.map((tan) => 0.9 * tan),
          ),
        ],
        moments,
      ),
    );
    expect(bent.slope).toBeCloseTo(1.9e-4, 15);
    expect(bent.stations.map(({ slope }) => slope)).toEqual([expect.closeTo(2e-4, 15), expect.closeTo(1.8e-4, 15)]);
    expect(bent.stations[0]?.residuals[2]?.residual).toBeCloseTo(0, 14);
    // measured − fitted at 100 t·m: 0.02 − 0.019
    expect(bent.stations[0]?.commonResiduals[2]?.residual).toBeCloseTo(0.001, 14);
    expect(bent.stations[1]?.commonResiduals[2]?.residual).toBeCloseTo(-0.001, 14);
    expect(bent.moves[2]?.residual).toBeCloseTo(0, 14);
  });

  it("takes the zero of a series that began later from the line", () => {
    const late = { ...series("B", 0.5, straight, 2), tangents: series("B", 0.5, straight).tangents.slice(3) };
    const both = promised(commonLine([series("A", 0, straight), late], moments));
    expect(both.slope).toBeCloseTo(2e-4, 15);
    expect(both.moves[4]?.tanHeel).toBeCloseTo(-0.02, 14);
  });

  it("stands with two moves, its spread unknown and no station judged by itself", () => {
    const early = promised(commonLine([series("A", 0, straight.slice(0, 2))], moments.slice(0, 2)));
    expect(early.slope).toBeCloseTo(2e-4, 15);
    expect(early.spread).toBeNull();
    expect(early.stations[0]).toMatchObject({ slope: null, intercept: null, residuals: [] });
  });

  it("refuses a test without readings, and one without two moments", () => {
    expect(commonLine([], moments)).toEqual({ ok: false, refusal: { type: "NoBattenReadings" } });
    expect(commonLine([series("A", 0, straight)], moments.slice(0, 1))).toMatchObject({ ok: false, refusal: { type: "NoSpreadInMoment" } });
  });
});
