import { describe, expect, it } from "vitest";
import { incliningTest } from "@/lib/inclining/inclining-test";
import { promised } from "@/lib/result";
import { battens, sampleTest } from "./sample-test";

describe("an inclining test", () => {
  it("goes from its readings to the ship as inclined", () => {
    const found = promised(incliningTest(sampleTest()));
    expect(found.afloat.water.density).toBe(1);
    expect(found.liquids).toEqual([]);
    expect(found.line.spread.degreesOfFreedom).toBe(4);
    expect(found.asInclined.displacement).toBeCloseTo(1440, 9);
  });

  it("refuses with every fault at once and no partial answer", () => {
    const test = sampleTest({
      stations: [
        { id: "A", instrument: "pendulum", length: 0 },
        { id: "B", instrument: "pendulum", length: 5 },
      ],
      tanks: [{ id: "FW", density: 1, measure: "sounding", table: [] }],
    });
    const refused = incliningTest({ ...test, readings: { ...test.readings, drafts: [] } });
    expect(refused).toMatchObject({
      ok: false,
      refusal: {
        faults: [
          { type: "TooFewMarks", path: "readings.drafts" },
          { type: "NoSounding", path: "tanks[0]" },
          { type: "ZeroLength", path: "stations[0].length" },
        ],
      },
    });
  });

  it("refuses two moves, whose line has no scatter to judge by", () => {
    const test = sampleTest();
    const refused = incliningTest({ ...test, readings: { ...test.readings, battens: battens([0, 0.016]) } });
    expect(refused).toMatchObject({ ok: false, refusal: { faults: [{ type: "TooFewMoves", got: 2, needed: 3 }] } });
  });

  it("refuses a ship that heels against the moment", () => {
    const test = sampleTest();
    const against = battens([0, -0.016, -0.032]);
    expect(incliningTest({ ...test, readings: { ...test.readings, battens: against } })).toMatchObject({
      ok: false,
      refusal: { faults: [{ type: "HeelAgainstMoment", path: "readings.battens" }] },
    });
  });
});
