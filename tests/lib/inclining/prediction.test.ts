import { describe, expect, test } from "vitest";
import { perfectReadings } from "@/db/seed/simulated-readings";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { incliningTest } from "@/lib/inclining/inclining-test";
import { predictedByGm, predictedMoves } from "@/lib/inclining/prediction";
import { promised } from "@/lib/result";

const { record } = skerryTern();
const inclined = promised(incliningTest({ ...record, readings: skerryTernReadings(7, perfectReadings) }));
const { asInclined, afloat, line, generalised } = inclined;
const ship = {
  displacement: asInclined.displacement,
  lcg: asInclined.lcg,
  tcg: asInclined.tcg,
  vcg: (generalised?.vcg ?? 0) + asInclined.freeSurfaceCorrection,
  density: afloat.water.density,
};

describe("what each move should show", () => {
  test("is what a simulated crew then reads, to a hundredth of a millimetre per metre", () => {
    for (const { no, moment, tanHeel } of promised(predictedMoves(record, ship))) {
      const measured = line.moves.find((move) => move.no === no);
      expect(moment).toBeCloseTo(measured?.moment ?? Number.NaN, 1);
      expect(Math.abs(tanHeel - (measured?.tanHeel ?? Number.NaN))).toBeLessThan(2e-5);
    }
  });

  test("is on each batten its length times the tangent, and on a reversed one the other way", () => {
    const stations = record.stations.map((station) => (station.id === "B" ? { ...station, reversed: true } : station));
    const [, first] = promised(predictedMoves({ ...record, stations }, ship));
    expect(first?.deflectionsMm.A).toBeCloseTo(4100 * (first?.tanHeel ?? 0), 9);
    expect(first?.deflectionsMm.B).toBeCloseTo(-4650 * (first?.tanHeel ?? 0), 9);
    expect(first?.deflectionsMm.U).toBeCloseTo(9600 * (first?.tanHeel ?? 0), 9);
  });

  test("by GM alone is the classical relation", () => {
    const moves = promised(predictedByGm(record, { displacement: 1500, gmFluid: 1.1 }));
    expect(moves[0]).toMatchObject({ no: 0, moment: 0, tanHeel: 0 });
    for (const { moment, tanHeel } of moves) expect(tanHeel).toBeCloseTo(moment / 1650, 14);
  });
});

test("refuses a plan without move 0, a ship without offsets, and one that would not stand", () => {
  const without = { ...record, moves: record.moves.slice(1) };
  expect(predictedMoves(without, ship)).toMatchObject({ ok: false, refusal: { type: "NoReferenceMove" } });
  expect(predictedByGm(without, { displacement: 1, gmFluid: 1 }).ok).toBe(false);
  expect(predictedMoves({ ...record, hydrostatics: { kind: "table", rows: [] } }, ship)).toMatchObject({ refusal: { type: "NoOffsets" } });
  expect(predictedMoves(record, { ...ship, vcg: 9 }).ok).toBe(false);
});
