import fc from "fast-check";
import { describe, expect, expectTypeOf, it } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { type IncliningResult, incliningResult, type LightshipTestData } from "@/lib/lightship/inclining-result";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";
import { heavierBy, mirrored, withAgreeingStation, zeroShifted } from "./changed-records";

const record: TestRecord = { ...skerryTern().record, readings: skerryTernReadings(7) };
const result = promised(incliningResult(record));

describe("result of a test", () => {
  it("is taken from a record as it is", () => {
    expectTypeOf<TestRecord>().toExtend<LightshipTestData>();
    expect(Object.keys(result)).toEqual(["waterline", "hydrostatics", "fit", "asInclined", "generalised", "lightship"]);
  });

  it("has every station with its residuals by move, and every move", () => {
    expect(result.fit.stations.map(({ id }) => id)).toEqual(["A", "B", "C", "U"]);
    expect(Object.keys(result.fit.stations[0]?.residuals ?? {})).toEqual(["0", "1", "2", "3", "4", "5", "6", "7", "8"]);
    expect(result.fit.moves.map(({ no }) => no)).toEqual([0, 1, 2, 3, 4, 5, 6, 7, 8]);
    expect(result.fit.moves[0]?.gm).toBeNull();
    expect(result.fit.degreesOfFreedom).toBe(7);
  });

  it("holds no number that is not finite", () => {
    expect(numbersIn(result).every(Number.isFinite)).toBe(true);
  });

  it("changes the sign of all that lies athwart, and nothing else, for a ship mirrored port to starboard", () => {
    const other = promised(incliningResult(mirrored(record)));
    expect(other.lightship.tcg).toBeCloseTo(-result.lightship.tcg, 10);
    expect(other.waterline.heelDegrees).toBeCloseTo(-result.waterline.heelDegrees, 10);
    expect(other.hydrostatics.tcb).toBeCloseTo(-(result.hydrostatics.tcb ?? 0), 10);
    other.fit.moves.forEach(({ moment, tanHeel }, i) => {
      expect(moment).toBeCloseTo(-(result.fit.moves[i]?.moment ?? 0), 9);
      expect(tanHeel).toBeCloseTo(-(result.fit.moves[i]?.tanHeel ?? 0), 12);
    });
    expectSame(uprightPart(other), uprightPart(result), 1e-10);
  });

  it("scales mass and moments with the tonne, and leaves every centre", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 100, noNaN: true }), (factor) => {
        const other = promised(incliningResult(heavierBy(record, factor)));
        expect(other.lightship.displacement / factor / result.lightship.displacement).toBeCloseTo(1, 10);
        expect((other.fit.slope * factor) / result.fit.slope).toBeCloseTo(1, 10);
        expectSame(centresOf(other), centresOf(result), 1e-9);
      }),
      { numRuns: 20 },
    );
  });

  it("does not depend on the order of readings, stations, weights or moves", () => {
    const seeds = fc.record({
      battens: shuffle(record.readings.battens),
      drafts: shuffle(record.readings.drafts),
      moves: shuffle(record.moves),
      weights: shuffle(record.weights),
    });
    fc.assert(
      fc.property(seeds, ({ battens, drafts, moves, weights }) => {
        const other = promised(incliningResult({ ...record, moves, weights, readings: { ...record.readings, battens, drafts } }));
        expectSame(other.lightship, result.lightship, 1e-10);
        // least squares of the marks in another order: the last digits
        expect(other.fit.slope / result.fit.slope).toBeCloseTo(1, 12);
        expect(other.fit.slopeUncertainty / result.fit.slopeUncertainty).toBeCloseTo(1, 10);
      }),
      { numRuns: 20 },
    );
  });

  it("does not depend on where any batten's zero stands", () => {
    fc.assert(
      fc.property(fc.constantFrom("A", "B", "C", "U"), fc.integer({ min: -400, max: 400 }), (station, mm) => {
        const other = promised(incliningResult(zeroShifted(record, station, mm)));
        expectSame(other.lightship, result.lightship, 1e-10);
        expectSame(other.fit.moves, result.fit.moves, 1e-9);
        expect(other.fit.slopeUncertainty / result.fit.slopeUncertainty).toBeCloseTo(1, 9);
      }),
      { numRuns: 20 },
    );
  });

  it("does not change with a pendulum more that shows what the line of the others says", () => {
    fc.assert(
      fc.property(fc.double({ min: 2, max: 8, noNaN: true }), (length) => {
        const other = promised(incliningResult(withAgreeingStation(record, result.fit, length)));
        expect(other.fit.stations).toHaveLength(result.fit.stations.length + 1);
        expect(other.fit.slope / result.fit.slope).toBeCloseTo(1, 10);
        expectSame(classical(other), classical(result), 1e-9);
        // the hull's own curve is not straight: a bob on the straight line agrees with it to a few micrometres of VCG
        expect(Math.abs((other.lightship.vcgGeneralised ?? Number.NaN) - (result.lightship.vcgGeneralised ?? Number.NaN))).toBeLessThan(
          5e-6,
        );
        expectSame(other.waterline, result.waterline, 1e-12);
      }),
      { numRuns: 10 },
    );
  });

  it("refuses items that outweigh the ship, at their place", () => {
    const items = [{ action: "deduct" as const, label: "a mistyped mass", mass: 9000, x: 0, y: 0, z: 0 }];
    expect(incliningResult({ ...record, items })).toMatchObject({
      ok: false,
      refusal: { faults: [{ type: "NothingLeft", path: "items" }] },
    });
  });
});

function shuffle<T>(list: readonly T[]) {
  return fc.shuffledSubarray([...list], { minLength: list.length });
}

function classical({ lightship: { displacement, vcg, lcg, tcg } }: IncliningResult) {
  return { displacement, vcg, lcg, tcg };
}

function uprightPart({ lightship, hydrostatics, waterline, fit }: IncliningResult) {
  const { trim, draftAft, draftForward, sag } = waterline;
  const { volume, kmt, lcb, vcb } = hydrostatics;
  const { displacement, lcg, vcg } = lightship;
  return {
    trim,
    draftAft,
    draftForward,
    sag,
    volume,
    kmt,
    lcb,
    vcb,
    displacement,
    lcg,
    vcg,
    slope: fit.slope,
    spread: fit.slopeUncertainty,
  };
}

function centresOf({ lightship, asInclined }: IncliningResult) {
  const { displacement: _, ...centre } = lightship;
  // what is stated of the water's density does not grow with the tonne
  const { displacement: __, uncertainty: ___, ...inclined } = asInclined;
  return { centre, inclined };
}

/** Equal to a relative tolerance: rounding, not method. */
function expectSame(found: unknown, wanted: unknown, within: number): void {
  const [a, b] = [numbersIn(found), numbersIn(wanted)];
  expect(a).toHaveLength(b.length);
  a.forEach((value, i) => {
    expect(Math.abs(value - (b[i] ?? 0))).toBeLessThanOrEqual(within * Math.max(1, Math.abs(b[i] ?? 0)));
  });
}

function numbersIn(value: unknown): number[] {
  if (typeof value === "number") return [value];
  return typeof value === "object" && value !== null ? Object.values(value).flatMap(numbersIn) : [];
}
