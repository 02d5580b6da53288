import { describe, expect, it } from "vitest";
import { momentTangentLine } from "@/lib/inclining/moment-tangent-line";
import { promised } from "@/lib/result";
import { battens, sampleMoments, sampleMoves, sampleTest } from "./sample-test";

describe("line of a test", () => {
  it("is that of its readings and positions", () => {
    const line = promised(momentTangentLine(sampleTest()));
    expect(line.slope).toBeCloseTo(1 / 5000, 15);
    expect(line.moves.map(({ moment }) => moment)).toEqual(sampleMoments);
  });

  it("is drawn while the test still runs", () => {
    const test = sampleTest();
    const early = { ...test, readings: { ...test.readings, battens: battens([0, 80 / 5000]), drafts: [], water: [] } };
    const line = promised(momentTangentLine(early));
    expect(line.moves).toHaveLength(2);
    expect(line.slope).toBeCloseTo(1 / 5000, 15);
  });

  it("counts a weight that rises at the heel the line itself gives", () => {
    const moves = sampleMoves.map((move) =>
      move.no === 2 ? { no: 2, positions: { W1: [25, 4, 7] as const, W2: [35, 12, 5] as const } } : move,
    );
    // at move 2 the first weight stands 2 m higher: M* = 160 + c·20 with c = c₀ + tan, and tan = M*/5000
    const [tanHeel, upward] = [0.01, 20];
    const acting = (160 + tanHeel * upward) / (1 - upward / 5000);
    const tangents = sampleMoments.map((moment, no) => (no === 2 ? acting : moment) / 5000);
    const test = sampleTest({ moves, readings: { ...sampleTest().readings, battens: battens(tangents) } });
    const line = promised(momentTangentLine(test, { trim: 0, tanHeel, lbp: 60 }));
    expect(line.moves[2]?.moment).toBeCloseTo(acting, 9);
    expect(line.slope).toBeCloseTo(1 / 5000, 14);
  });

  it("adds an inclinometer's angles to the list that the marks give", () => {
    const list = 0.03;
    const stations = [{ id: "I", instrument: "inclinometer" }] as const;
    const readings = sampleMoments.map((moment, move) => {
      const degrees = (Math.atan(list + moment / 5000) * 180) / Math.PI + 0.7;
      return { id: `${move}`, move, station: "I", mode: "settled" as const, valuesDegrees: [degrees] };
    });
    const test = sampleTest({ stations, readings: { ...sampleTest().readings, battens: readings } });
    expect(promised(momentTangentLine(test, { trim: 0, tanHeel: list, lbp: 60 })).slope).toBeCloseTo(1 / 5000, 14);
  });

  it("refuses a test without readings", () => {
    const test = sampleTest();
    const refused = momentTangentLine({ ...test, readings: { ...test.readings, battens: [] } });
    expect(refused).toMatchObject({ ok: false, refusal: { faults: [{ type: "NoBattenReadings", path: "readings.battens" }] } });
  });
});
