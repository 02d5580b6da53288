import { describe, expect, it } from "vitest";
import { misreadOf } from "@/lib/inclining/misread";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { lineOff, sampleSlope } from "./sample-line";

const scatter = (move: number, station: number) => 1e-5 * Math.sin(1 + 5 * move + 13 * station);

describe("a misread batten", () => {
  it("is the reading that stands off from the other stations, with how far", () => {
    const found = misreadOf(lineOff((move, j) => (move === 7 && j === 2 ? -0.001 : 0), 3).stations, 1e-7);
    expect(found).toMatchObject({ move: 7, stations: ["C"] });
    expect(found?.size).toBeCloseTo(-0.001, 9);
    expect(found?.probability).toBeLessThan(1e-6);
  });

  it("is not a gust that every station felt, nor a station of another length", () => {
    const gust = misreadOf(lineOff((move, j) => (move === 4 ? 0.005 : 0) + scatter(move, j), 3).stations, 0);
    const short = misreadOf(lineOff((move, j, moment) => (j === 1 ? 0.05 * sampleSlope * moment : 0) + scatter(move, j), 3).stations, 0);
    expect(gust?.probability).toBeGreaterThan(0.05);
    expect(short?.probability).toBeGreaterThan(0.05);
  });

  it("is seen by chance no more often than its probability says", () => {
    const noise = seededNoise(3);
    const tests = 1000;
    let seen = 0;
    for (let i = 0; i < tests; i++) {
      if ((misreadOf(lineOff(() => noise.normal(1e-4), 3).stations, 0)?.probability ?? 1) < 0.05) seen++;
    }
    // Bonferroni keeps at most 5 %; 0.007 is the binomial deviation of 1000 tests
    expect(seen / tests).toBeLessThan(0.065);
    expect(seen / tests).toBeGreaterThan(0.015);
  });

  it("is not found below the readings' own uncertainty", () => {
    const { stations } = lineOff((move, j) => (move === 7 && j === 2 ? 3e-4 : 0), 3);
    expect(misreadOf(stations, 5e-4)?.probability).toBeGreaterThan(0.5);
  });

  it("can't be told with one station, or with few readings", () => {
    expect(misreadOf(lineOff(scatter, 1).stations, 0)).toBeNull();
    expect(misreadOf(lineOff(scatter, 2, [0, 100, -100]).stations, 0)).toBeNull();
  });
});
