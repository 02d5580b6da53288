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

  it("keeps the ship afloat while battens are due", () => {
    const test = sampleTest();
    const sofar = testSoFar({ ...test, readings: { ...test.readings, battens: [] } });
    expect(sofar).toMatchObject({ movesUsed: 0, line: null });
    expect(sofar.afloat?.hydrostatics.displacement).toBeCloseTo(1440, 9);
    expect(sofar.missing.map(({ type }) => type)).toEqual(["NoBattenReadings"]);
  });
});
