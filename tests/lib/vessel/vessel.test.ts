import { expect, test } from "vitest";
import { skerryTern } from "@/db/seed/skerry-tern";
import { faultsOf } from "@/lib/inclining/faults";
import { refusalLine } from "@/lib/report/refusal-sentence";
import { vesselFrom } from "@/lib/vessel/vessel";

const { vessel, hydrostatics, draftMarks, tanks, previous } = skerryTern().record;
const ship = { vessel, hydrostatics, draftMarks, tanks, previous };
const lines = (change: object) => faultsOf(vesselFrom({ ...ship, ...change })).map(refusalLine);

test("takes a vessel as she stands, and one whose hydrostatics are still missing", () => {
  expect(vesselFrom(ship)).toEqual({ ok: true, value: ship });
  expect(vesselFrom({ ...ship, hydrostatics: null }).ok).toBe(true);
});

test("refuses shapes with their place", () => {
  expect(lines({ vessel: { ...vessel, lbp: 0 }, crew: 9 })).toEqual([
    "vessel.lbp: a number above 0 needed, 0 given",
    'crew: unknown key "crew"',
  ]);
});

test("refuses names given twice, of marks and freeboards together, and of tanks", () => {
  expect(lines({ freeboardMarks: [{ id: "AP", x: 1, y: 1, deckEdge: 5 }], tanks: [...tanks, tanks[0]] })).toEqual([
    "freeboardMarks[0].id: AP is given twice, first in draftMarks[0].id",
    "tanks[9].id: FW-P is given twice, first in tanks[0].id",
  ]);
});

test("refuses what hull, table and tanks refuse of themselves", () => {
  const section = { x: 0, points: [[1, 1]] };
  expect(lines({ hydrostatics: { kind: "offsets", sections: [section, section] } })).toEqual([
    "hydrostatics: two sections stand at x = 0 m",
  ]);
  const row = { trim: 0, draft: 2, volume: 1440, lcb: 30, vcb: 1, lcf: 30, waterplaneArea: 720, kmt: 7, kml: 151 };
  expect(lines({ hydrostatics: { kind: "table", rows: [row, row] } })).toEqual([
    "hydrostatics: the hydrostatic table has two rows for draft 2 m at trim 0 m",
  ]);
  const level = { level: 1, volume: 1, lcg: 1, tcg: 0, vcg: 1, inertia: 1 };
  expect(lines({ tanks: [{ ...tanks[0], table: [level, level] }] })).toEqual([
    "tanks[0]: the table of tank FW-P has two rows for level 1 m at trim 0 m",
  ]);
});
