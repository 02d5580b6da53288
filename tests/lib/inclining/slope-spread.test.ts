import { describe, expect, it } from "vitest";
import { type SpreadPoint, slopeSpread } from "@/lib/inclining/slope-spread";

const point = (move: number, moment: number, residual: number, series = 0, uncertainty = 0): SpreadPoint => ({
  move: `1/${move}`,
  session: 1,
  series,
  moment,
  residual,
  uncertainty,
});

describe("spread of the slope", () => {
  it("follows the scatter of the moves: s² = 6/2 over Σ(M − M̄)² = 20", () => {
    const points = [point(0, -3, 1), point(1, -1, -1), point(2, 1, -1), point(3, 3, 1)].map((each) => ({
      ...each,
      residual: each.residual * Math.sqrt(1.5),
    }));
    const spread = slopeSpread(1, points);
    expect(spread?.degreesOfFreedom).toBe(2);
    expect(spread?.betweenMoves).toBeCloseTo(Math.sqrt(3), 12);
    expect(spread?.slopeUncertainty).toBeCloseTo(Math.sqrt(3 / 20), 12);
    // t of 2 degrees of freedom at 95 %: 4.3027, NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.6.7.2 (from memory)
    expect(spread?.halfWidth95).toBeCloseTo(4.3027 * Math.sqrt(3 / 20), 4);
  });

  it("does not grow surer by stations that all read the same gusts", () => {
    const one = [point(0, -3, 1), point(1, -1, -1), point(2, 1, -1), point(3, 3, 1)];
    const three = [0, 1, 2].flatMap((series) => one.map((each) => ({ ...each, series })));
    expect(slopeSpread(1, three)?.slopeUncertainty).toBeCloseTo(slopeSpread(1, one)?.slopeUncertainty ?? 0, 14);
    expect(slopeSpread(1, three)?.withinMoves).toBeCloseTo(0, 14);
    expect(slopeSpread(1, one)?.withinMoves).toBeNull();
  });

  it("sees scatter of stations about their move's mean apart", () => {
    const points = [-1, 0, 1].flatMap((moment, move) =>
      [0, 1].map((series) => point(move, moment, series === 0 ? 0.1 * moment : -0.1 * moment, series)),
    );
    const spread = slopeSpread(1, points);
    expect(spread?.betweenMoves).toBeCloseTo(0, 14);
    // Σ 4·0.1² over 6 − 3 − 2 + 1 degrees of freedom
    expect(spread?.withinMoves).toBeCloseTo(Math.sqrt(0.04 / 2), 12);
  });

  it("is not less than the readings' own uncertainty gives: u/√Σ(M − M̄)²", () => {
    const points = [point(0, -1, 0, 0, 0.5), point(1, 0, 0, 0, 0.5), point(2, 1, 0, 0, 0.5)];
    expect(slopeSpread(1, points)?.slopeUncertainty).toBeCloseTo(0.5 / Math.SQRT2, 12);
  });

  it("counts the zero of every session", () => {
    const points = [0, 1, 2].flatMap((move) =>
      [1, 2].map((session) => ({ ...point(move, move, 0, session), move: `${session}/${move}`, session })),
    );
    expect(slopeSpread(1, points)?.degreesOfFreedom).toBe(6 - 1 - 2);
  });

  it("is unknown below three moves", () => {
    expect(slopeSpread(1, [point(0, 0, 0), point(1, 1, 0)])).toBeNull();
  });
});
