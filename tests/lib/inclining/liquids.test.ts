import { describe, expect, it } from "vitest";
import { ballastAtMove, liquidsAboard } from "@/lib/inclining/liquids";
import { readingsThatCount } from "@/lib/inclining/readings-that-count";
import type { SoundingReading } from "@/lib/inclining/test-readings";
import { promised } from "@/lib/result";
import { sampleTest } from "./sample-test";

const upright = { trim: 0, tanHeel: 0, lbp: 60 };
const tank = {
  id: "FW",
  density: 1.1,
  measure: "sounding" as const,
  table: [0, 1, 2].map((level) => ({ level, volume: 10 * level, lcg: 20, tcg: 1, vcg: 0.5 + level / 2, inertia: level === 1 ? 30 : 0 })),
};
const testWith = (soundings: SoundingReading[], changes = {}) =>
  sampleTest({ tanks: [{ ...tank, ...changes }], readings: { ...sampleTest().readings, soundings } });

describe("liquids aboard", () => {
  it("are the tanks as sounded", () => {
    const test = testWith([{ id: "1", tank: "FW", round: "before", value: 1 }]);
    const [liquid] = promised(liquidsAboard(test, readingsThatCount(test), upright));
    expect(liquid).toMatchObject({ id: "FW", density: 1.1, lcg: 20, tcg: 1, vcg: 1, freeSurfaceInertia: 30 });
    expect(liquid?.mass).toBeCloseTo(11, 12);
  });

  it("take several soundings as their mean", () => {
    const test = testWith([0.8, 1.2].map((value, i) => ({ id: `${i}`, tank: "FW", round: "before", value })));
    expect(promised(liquidsAboard(test, readingsThatCount(test), upright))[0]?.mass).toBeCloseTo(11, 12);
  });

  it("of shifting ballast are those of move 0, by its own sounding or the round's", () => {
    const atMove = testWith([{ id: "1", tank: "FW", move: 0, value: 1 }], { shifts: true });
    expect(promised(liquidsAboard(atMove, readingsThatCount(atMove), upright))[0]?.mass).toBeCloseTo(11, 12);
    const inRound = testWith([{ id: "1", tank: "FW", round: "before", value: 1 }], { shifts: true });
    expect(promised(ballastAtMove(inRound, readingsThatCount(inRound), 0, { no: 0 }, upright)).mass).toBeCloseTo(11, 12);
    expect(ballastAtMove(inRound, readingsThatCount(inRound), 0, { no: 1 }, upright).ok).toBe(false);
  });

  it("refuse a tank that was not sounded, and a sounding beyond the table, with their places", () => {
    const none = testWith([]);
    expect(liquidsAboard(none, readingsThatCount(none), upright)).toMatchObject({
      ok: false,
      refusal: { faults: [{ type: "NoSounding", tank: "FW", path: "tanks[0]" }] },
    });
    const deep = testWith([{ id: "1", tank: "FW", round: "before", value: 3 }]);
    expect(liquidsAboard(deep, readingsThatCount(deep), upright)).toMatchObject({
      ok: false,
      refusal: { faults: [{ type: "OutsideTankTable", value: 3, highest: 2, path: "readings.soundings[0].value" }] },
    });
  });
});
