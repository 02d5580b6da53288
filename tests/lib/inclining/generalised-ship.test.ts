import { describe, expect, test } from "vitest";
import { perfectReadings, simulatedReadings } from "@/db/seed/simulated-readings";
import { type SimulatedTruth, simulatedShip } from "@/db/seed/simulated-ship";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { incliningTest } from "@/lib/inclining/inclining-test";
import { wallSidedBias } from "@/lib/inclining/wall-sided-bias";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";

const tern = skerryTern();
type Sections = Extract<TestRecord["hydrostatics"], { kind: "offsets" }>["sections"];
type Points = readonly (readonly [number, number])[];

const prism = (points: Points): Sections => [0, 54].map((x) => ({ x, points: points.map(([y, z]) => [y, z]) }));
const hulls: Record<string, Sections> = {
  "a box": prism([
    [6.2, 0],
    [6.2, 5.4],
  ]),
  "a prism with flare": prism([
    [4.4, 0],
    [7, 5.4],
  ]),
  "a hard chine heeling through its knuckle": prism([
    [4, 0],
    [5.9, 2.32],
    [6.4, 5.4],
  ]),
  "a hull with flare and a transom": [0, 6, 14, 27, 40, 48, 54].map((x) => {
    const full = x < 30 ? 1 : 1 - ((x - 30) / 24) ** 2;
    const rise = x < 10 ? (10 - x) * 0.12 : 0;
    return {
      x,
      points: [
        [0.3, rise],
        [0.3 + 4.9 * full, rise + 0.5],
        [0.3 + 5.9 * full, rise + 2.2],
        [0.8 + 5.9 * Math.sqrt(full), 5.4],
      ],
    };
  }),
};

/** How a simulated ship lies: her lightship's LCG aft and TCG to starboard of what would keep her level, and her sag [m]. */
type Lie = { readonly aft: number; readonly starboard: number; readonly sag: number };
/** What the moves bring besides heel [m]: how far weights go forward and up as they cross, and how deep a wide double bottom is filled. */
type Ways = { readonly forward: number; readonly up: number; readonly shallow: number };
const awkward: Ways = { forward: 1, up: 0.15, shallow: 0.1 };
const plain: Ways = { forward: 0, up: 0, shallow: 0.5 };

/**
 * The demo's test on another hull, with an inclinometer and a pendulum mounted the other way. In awkward ways weights rise and
 * go forward as they cross to starboard, and one double bottom is so shallow that its bottom runs dry as she heels.
 */
function simulated(sections: Sections, { aft, starboard, sag }: Lie, { forward, up, shallow }: Ways) {
  const { record } = tern;
  const marks = record.draftMarks.map((mark) => ({ ...mark, zero: 0 }));
  const plan: TestRecord = {
    ...record,
    hydrostatics: { kind: "offsets", sections, shellFactor: 1.004 },
    draftMarks: marks,
    stations: [
      ...record.stations.map((station) => (station.id === "B" ? { ...station, reversed: true } : station)),
      { id: "I", instrument: "inclinometer" },
    ],
    moves: record.moves.map((move) => ({
      ...move,
      positions: Object.fromEntries(
        Object.entries(move.positions).map(([id, [x, y, z]]) => [id, y > 0 ? [x + forward, y, z + up] : [x, y, z]] as const),
      ) as typeof move.positions,
    })),
  };
  const truth: SimulatedTruth = {
    ...tern.truth,
    lightship: { displacement: 1150, lcg: 25 - aft, tcg: starboard, vcg: 4.6 },
    levels: { ...tern.truth.levels, "BW-C": shallow },
    sag,
  };
  const ship = promised(simulatedShip(plan, truth));
  const readings = promised(simulatedReadings(ship, perfectReadings, seededNoise(3)));
  const read = { ...plan, readings };
  return { result: promised(incliningResult(read)), read, truth };
}

// trims from 0.4 % of her length by the head to 3.8 % by the stern, lists from 2.5° to port to 1.8° to starboard
describe.each(Object.entries(hulls))("%s, read without noise", (_, sections) => {
  test.each([
    { aft: 0, starboard: 0, sag: 0 },
    { aft: 1.4, starboard: 0.03, sag: 0.04 },
    { aft: -1.2, starboard: -0.1, sag: -0.03 },
  ])("gives the lightship's KG within a millimetre and her displacement within 0.02 %, lying %o", (lie) => {
    const { result, truth } = simulated(sections, lie, awkward);
    expect(Math.abs((result.lightship.vcgGeneralised ?? Number.NaN) - truth.lightship.vcg)).toBeLessThan(0.001);
    expect(Math.abs(result.lightship.displacement / truth.lightship.displacement - 1)).toBeLessThan(0.0002);
  });
});

test.each([
  { aft: 0, starboard: 0, sag: 0 },
  { aft: 1.4, starboard: 0.03, sag: 0.04 },
])("upright sides leave the classical KG low by the bias that the program states, lying %o", (lie) => {
  const { result, truth, read } = simulated(hulls["a box"] ?? [], lie, plain);
  const ship = promised(incliningTest(read));
  const bias = wallSidedBias(ship.afloat, ship.line) * (result.asInclined.displacement / result.lightship.displacement);
  expect(Math.abs(result.lightship.vcg - truth.lightship.vcg + bias)).toBeLessThan(0.0005);
});

test("the demo's ship comes out within a tenth of a millimetre where the classical line is a millimetre low", () => {
  const { lightship } = promised(incliningResult({ ...tern.record, readings: skerryTernReadings(7, perfectReadings) }));
  expect(Math.abs((lightship.vcgGeneralised ?? Number.NaN) - tern.truth.lightship.vcg)).toBeLessThan(0.0001);
  expect(lightship.vcg - tern.truth.lightship.vcg).toBeLessThan(-0.0008);
});

test("there is none by a table", () => {
  const rows = [2, 3, 4].map((draft) => ({
    trim: 0,
    draft,
    volume: 500 * draft,
    lcb: 25,
    vcb: draft / 2,
    lcf: 25,
    waterplaneArea: 500,
    kmt: 6.5,
    kml: 90,
  }));
  const { record } = tern;
  const result = promised(incliningResult({ ...record, hydrostatics: { kind: "table", rows }, readings: skerryTernReadings(7) }));
  expect(result.generalised).toBeNull();
  expect(result.lightship).toMatchObject({ vcgGeneralised: null, headline: "classical" });
});
