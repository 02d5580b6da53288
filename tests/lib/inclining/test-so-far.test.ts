import { describe, expect, it } from "vitest";
import { testSoFar } from "@/lib/inclining/test-so-far";
import { battens, sampleTest } from "./sample-test";

describe("an inclining test that still runs", () => {
  it("knows GM and vcg as soon as drafts, water and two moves are read", () => {
    const test = sampleTest();
    const sofar = testSoFar({ ...test, readings: { ...test.readings, battens: battens([0, 80 / 5000]) } });
    expect(sofar.movesUsed).toBe(2);
    expect(sofar.missing).toEqual([]);
    expect(sofar.asInclined?.gmFluid).toBeCloseTo(5000 / 1440, 12);
  });

  it("keeps the line while drafts are due, and names what is missing", () => {
    const test = sampleTest();
    const sofar = testSoFar({ ...test, readings: { ...test.readings, drafts: [], water: [] } });
    expect(sofar.line?.slope).toBeCloseTo(1 / 5000, 15);
    expect(sofar).toMatchObject({ afloat: null, asInclined: null });
    expect(sofar.missing.map(({ type }) => type)).toEqual(["TooFewMarks", "NoWaterSamples"]);
  });

  it("knows GM while a tank is due, and KG only once it is sounded", () => {
    const test = sampleTest();
    const tank = {
      id: "FO",
      density: 0.86,
      measure: "sounding" as const,
      table: [
        { level: 0, volume: 0, lcg: 20, tcg: 0, vcg: 0, inertia: 0 },
        { level: 2, volume: 20, lcg: 20, tcg: 0, vcg: 1, inertia: 0 },
      ],
    };
    const sofar = testSoFar({ ...test, tanks: [tank], readings: { ...test.readings, soundings: [] } });
    expect(sofar.asInclined).toBeNull();
    expect(sofar.gmFluid).toBeCloseTo(5000 / 1440, 9);
    expect(sofar.missing.map(({ type }) => type)).toEqual(["NoSounding"]);
  });

  it("keeps the ship afloat while battens are due", () => {
    const test = sampleTest();
    const sofar = testSoFar({ ...test, readings: { ...test.readings, battens: [] } });
    expect(sofar).toMatchObject({ movesUsed: 0, line: null });
    expect(sofar.afloat?.hydrostatics.displacement).toBeCloseTo(1440, 9);
    expect(sofar.missing.map(({ type }) => type)).toEqual(["NoBattenReadings"]);
  });
});
