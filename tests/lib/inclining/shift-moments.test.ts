import { describe, expect, it } from "vitest";
import { readingsThatCount } from "@/lib/inclining/readings-that-count";
import { actingMoments, shiftMoments } from "@/lib/inclining/shift-moments";
import type { IncliningTestData } from "@/lib/inclining/test-data";
import { promised } from "@/lib/result";
import { sampleMoments, sampleMoves, sampleTest } from "./sample-test";

const upright = () => ({ trim: 0, tanHeel: 0, lbp: 60 });
const shiftsOf = (test: IncliningTestData, attitudeAt = upright) => shiftMoments(test, readingsThatCount(test), attitudeAt);

describe("moments of the moves", () => {
  it("are Σ m·(y − y₀) from the measured positions", () => {
    expect(promised(shiftsOf(sampleTest())).map(({ athwart }) => athwart)).toEqual(sampleMoments);
  });

  it("are those of the moves that were read", () => {
    const test = sampleTest();
    const battens = test.readings.battens.filter(({ move }) => move !== 2);
    const moments = promised(shiftsOf({ ...test, readings: { ...test.readings, battens } }));
    expect(moments.map(({ no }) => no)).toEqual([0, 1, 3, 4, 5]);
  });

  it("count a weight's rise, which acts by the tangent of heel", () => {
    const moves = sampleMoves.map((move) =>
      move.no === 1 ? { no: 1, positions: { W1: [25, 4, 5.5] as const, W2: [35, 4, 5] as const } } : move,
    );
    const moments = promised(shiftsOf(sampleTest({ moves })));
    expect(moments[1]).toMatchObject({ athwart: 80, upward: 5 });
    expect(actingMoments(moments, () => ({ trim: 0, tanHeel: 0.02, lbp: 60 }))[1]?.moment).toBeCloseTo(80.1, 12);
  });

  it("tell how far the weights went along the ship", () => {
    const moves = sampleMoves.map((move) =>
      move.no === 1 ? { no: 1, positions: { W1: [27, 4, 5] as const, W2: [35, 4, 5] as const } } : move,
    );
    // 10 t by 2 m forward
    expect(promised(shiftsOf(sampleTest({ moves }))).map(({ along }) => along)).toEqual([0, 20, 0, 0, 0, 0]);
  });

  it("of a session with its own zero count from that", () => {
    const again = { no: 0, session: 2, positions: { W1: [25, 4, 5] as const, W2: [35, 4, 5] as const } };
    const then = { no: 1, session: 2, positions: { W1: [25, 4, 5] as const, W2: [35, 12, 5] as const } };
    const test = sampleTest({ moves: [...sampleMoves.slice(0, 1), again, then] });
    const battens = [0, 1].map((move) => ({ id: `${move}`, move, session: 2, station: "A", mode: "settled" as const, valuesMm: [1] }));
    const moments = promised(shiftsOf({ ...test, readings: { ...test.readings, battens } }));
    expect(moments).toEqual([
      { no: 0, session: 2, athwart: 0, upward: 0, along: 0 },
      { no: 1, session: 2, athwart: 80, upward: 0, along: 0 },
    ]);
  });

  const ballast = { density: 1, measure: "sounding" as const, shifts: true };
  const sides = [-4, 4].map((tcg) => ({
    ...ballast,
    id: tcg < 0 ? "BP" : "BS",
    table: [0, 2].map((level) => ({ level, volume: 10 * level, lcg: 30, tcg, vcg: level / 2, inertia: 1 })),
  }));
  const sounded = (tank: string, move: number, value: number) => ({ id: `${tank}${move}`, tank, move, value });

  it("come from the soundings of both tanks where ballast is the shifting weight", () => {
    const test = sampleTest({ weights: [], tanks: sides, moves: [0, 1].map((no) => ({ no, positions: {} })) });
    const soundings = [sounded("BP", 0, 1), sounded("BS", 0, 1), sounded("BP", 1, 0.5), sounded("BS", 1, 1.5)];
    const moments = promised(shiftsOf({ ...test, readings: { ...test.readings, soundings } }));
    // 5 t go from −4 m to +4 m
    expect(moments[1]?.athwart).toBeCloseTo(40, 12);
  });

  it("refuse ballast that was not sounded, with the tank's place", () => {
    const test = sampleTest({ weights: [], tanks: sides, moves: [0, 1].map((no) => ({ no, positions: {} })) });
    const soundings = [sounded("BP", 0, 1), sounded("BS", 0, 1), sounded("BP", 1, 0.5)];
    const refused = shiftsOf({ ...test, readings: { ...test.readings, soundings } });
    expect(refused).toMatchObject({
      ok: false,
      refusal: { faults: [{ type: "NoBallastSounding", tank: "BS", move: 1, path: "tanks[1]" }] },
    });
  });

  it("refuse a test without move 0 and a move that lacks a weight", () => {
    expect(shiftsOf(sampleTest({ moves: sampleMoves.slice(1) }))).toMatchObject({
      ok: false,
      refusal: { faults: [{ type: "NoReferenceMove" }, {}, {}, {}, {}] },
    });
    const lacking = sampleMoves.map((move) => (move.no === 2 ? { no: 2, positions: { W1: [25, 4, 5] as const } } : move));
    expect(shiftsOf(sampleTest({ moves: lacking }))).toMatchObject({
      ok: false,
      refusal: { faults: [{ type: "NoPosition", weight: "W2", move: 2, path: "moves[2].positions" }] },
    });
  });
});
