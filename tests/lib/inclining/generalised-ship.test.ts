import { describe, expect, test } from "vitest";
import { perfectReadings, simulatedReadings } from "@/db/seed/simulated-readings";
import { type SimulatedTruth, simulatedShip } from "@/db/seed/simulated-ship";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
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

/** The demo's test on another hull, with an inclinometer, weights that rise as they cross, a trim and a list. */
function simulated(sections: Sections, { trim, list }: { trim: number; list: number }) {
  const { record } = tern;
  const marks = record.draftMarks.map((mark) => ({ ...mark, zero: 0 }));
  const plan: TestRecord = {
    ...record,
    hydrostatics: { kind: "offsets", sections, shellFactor: 1.004 },
    draftMarks: marks,
    stations: [...record.stations, { id: "I", instrument: "inclinometer" }],
    moves: record.moves.map((move) => ({
      ...move,
      positions: Object.fromEntries(Object.entries(move.positions).map(([id, [x, y, z]]) => [id, [x, y, z + (y > 0 ? 0.15 : 0)]])),
    })),
  };
  const truth: SimulatedTruth = {
    ...tern.truth,
    lightship: { displacement: 1150, lcg: 25 - trim, tcg: list, vcg: 4.6 },
    levels: { ...tern.truth.levels },
  };
  const ship = promised(simulatedShip(plan, truth));
  const readings = promised(simulatedReadings(ship, perfectReadings, seededNoise(3)));
  return { result: promised(incliningResult({ ...plan, readings })), truth };
}

describe.each(Object.entries(hulls))("%s, read without noise", (_, sections) => {
  test.each([
    { trim: 0, list: 0 },
    { trim: 0.6, list: 0.02 },
    { trim: -0.5, list: -0.03 },
  ])("gives the lightship's KG within a millimetre and her displacement within 0.02 %", (lie) => {
    const { result, truth } = simulated(sections, lie);
    expect(Math.abs((result.lightship.vcgGeneralised ?? Number.NaN) - truth.lightship.vcg)).toBeLessThan(0.001);
    expect(Math.abs(result.lightship.displacement / truth.lightship.displacement - 1)).toBeLessThan(0.0002);
  });
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
