import { describe, expect, it } from "vitest";
import { usualLimits } from "@/lib/inclining/checks/check-limits";
import { deflection, heelRange, initialList, trimOfHydrostatics } from "@/lib/inclining/checks/heel-checks";
import { incliningTest } from "@/lib/inclining/inclining-test";
import { promised } from "@/lib/result";
import { lineOff, mirroredLine } from "../sample-line";
import { battens, sampleMoments, sampleTest } from "../sample-test";

const ship = promised(incliningTest(sampleTest()));
const rad = Math.PI / 180;

/** A line that heels to both sides by so many degrees. */
function heeled(port: number, starboard: number) {
  const tangents = [0, Math.tan(starboard * rad), 0, -Math.tan(port * rad)];
  return lineOff((move, _, moment) => (tangents[move] as number) - 1e-4 * moment, 2, [0, 100, 0, -100]);
}

describe("heel to each side", () => {
  it.each([
    [1.2, 1.3, "met"],
    [1, 4, "met"],
    [0.98, 1.3, "not-met"],
    [1.2, 4.1, "not-met"],
    [0, 2, "not-met"],
  ])("of %f° to port and %f° to starboard is %s", (port, starboard, verdict) => {
    const finding = heelRange(heeled(port, starboard), usualLimits);
    expect(finding.verdict).toBe(verdict);
    expect(finding.found).toEqual({ port: expect.closeTo(port, 9), starboard: expect.closeTo(starboard, 9) });
    expect(finding.limit).toEqual({ least: 1, most: 4 });
  });

  it("changes sides in a mirror", () => {
    const off = (move: number) => 1e-4 * move;
    const seen = heelRange(lineOff(off), usualLimits).found as { port: number; starboard: number };
    expect(heelRange(mirroredLine(off), usualLimits).found).toEqual({
      port: expect.closeTo(seen.starboard, 12),
      starboard: expect.closeTo(seen.port, 12),
    });
  });
});

describe("deflection of pendulums", () => {
  it("is that of the bob that moved least, from its own zero", () => {
    // 160 t·m heel by 0.032: 128 mm on 4 m, 160 mm on 5 m
    const [finding] = deflection(sampleTest(), ship.line, usualLimits);
    expect(finding).toEqual({
      id: "deflection",
      verdict: "not-met",
      found: { station: "A", port: expect.closeTo(128, 9), starboard: expect.closeTo(128, 9) },
      limit: { leastMm: 150 },
    });
  });

  it("of exactly 150 mm meets its limit", () => {
    const readings = { ...sampleTest().readings, battens: battens(sampleMoments.map((moment) => (moment / 160) * 0.0375)) };
    const test = sampleTest({ readings });
    expect(deflection(test, promised(incliningTest(test)).line, usualLimits)[0]?.verdict).toBe("met");
  });

  it("is measured with the length of the series", () => {
    const test = sampleTest();
    const stations = test.stations.map((station) =>
      station.instrument === "pendulum" ? { ...station, series: [{ no: 1, length: 6 }] } : station,
    );
    const found = deflection({ ...test, stations }, ship.line, usualLimits)[0]?.found;
    expect(found).toMatchObject({ port: expect.closeTo(192, 9) });
  });

  it("is not judged of a test without pendulums", () => {
    expect(deflection(sampleTest({ stations: [{ id: "A", instrument: "u-tube", span: 8 }] }), ship.line, usualLimits)).toEqual([]);
  });
});

describe("list and trim at zero", () => {
  const lying = (change: object) => ({ ...ship.afloat, waterline: { ...ship.afloat.waterline, ...change } });

  it.each([
    [0.5, "met"],
    [-0.5, "met"],
    [0.51, "not-met"],
    [-0.7, "not-met"],
  ])("a list of %f° is %s", (heelDegrees, verdict) => {
    expect(initialList(lying({ heelDegrees }), usualLimits)).toMatchObject({
      verdict,
      found: { degrees: heelDegrees },
      limit: { most: 0.5 },
    });
  });

  it("trim does not matter where offsets give the hydrostatics", () => {
    expect(trimOfHydrostatics(sampleTest(), lying({ trim: 3 }), usualLimits)).toMatchObject({
      verdict: "met",
      found: { beyond: 0, share: 0 },
    });
  });

  it.each([
    [[0], 0.6, 0.6, "met"],
    [[0], -0.61, -0.61, "attention"],
    [[-0.5, 0, 1], 1.2, 0.2, "met"],
    [[-0.5, 0, 1], 0.4, 0, "met"],
    [[0, 1], -0.7, -0.7, "attention"],
  ])("a table at trims %j used at %f m is %f m beyond, %s", (trims, trim, beyond, verdict) => {
    const row = { draft: 2, volume: 1440, lcb: 30, vcb: 1, lcf: 30, waterplaneArea: 720, kmt: 7, kml: 151 };
    const test = sampleTest({ hydrostatics: { kind: "table", rows: trims.map((each) => ({ ...row, trim: each })) } });
    const finding = trimOfHydrostatics(test, lying({ trim }), usualLimits);
    expect(finding).toMatchObject({
      verdict,
      found: { beyond: expect.closeTo(beyond, 12), share: expect.closeTo(Math.abs(beyond) / 60, 12) },
    });
  });
});
