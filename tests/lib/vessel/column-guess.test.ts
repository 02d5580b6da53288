import { expect, test } from "vitest";
import { guessedMapping, plainHeading } from "@/lib/vessel/column-guess";
import { hydrostaticFields } from "@/lib/vessel/hydrostatic-table-in-sheet";
import { tankFields } from "@/lib/vessel/tanks-in-sheets";

test("takes a heading apart into words and unit", () => {
  expect(["Waterplane area, m²", "LCB [m fwd AP]", "KM (T)", "Draft in ft", "Draft T"].map(plainHeading)).toEqual([
    "waterplane area",
    "lcb",
    "km",
    "draft",
    "draft t",
  ]);
});

test("finds the row of headings below a title, and units in the row under it", () => {
  const sheet = {
    name: "S",
    rows: [
      ["Hydrostatic particulars"],
      [],
      [null, "Draught", "Displacement", "TPC"],
      [null, "(m)", "(t)", "(t/cm)"],
      [null, 2, 1476, 7.38],
    ],
  };
  expect(guessedMapping(sheet, hydrostaticFields)).toEqual({
    headingRow: 2,
    firstRow: 4,
    lastRow: 4,
    columns: {
      draft: { column: 1, unit: "m" },
      volume: { column: 2, unit: "t" },
      waterplaneArea: { column: 3, unit: "t/cm" },
    },
  });
});

test("takes a displacement for tonnes and a free surface moment for t·m where no unit is written", () => {
  const columnsOf = (row: string[], fields: typeof tankFields) => guessedMapping({ name: "S", rows: [row] }, fields).columns;
  expect(columnsOf(["T", "Displ."], hydrostaticFields).volume).toEqual({ column: 1, unit: "t" });
  expect(columnsOf(["Ullage", "FSM"], tankFields).inertia).toEqual({ column: 1, unit: "t·m" });
});

test("names no column where no heading means anything", () => {
  expect(guessedMapping({ name: "S", rows: [["To whom it may concern"], ["a", "b"], [1, 2]] }, hydrostaticFields)).toEqual({
    headingRow: 1,
    firstRow: 2,
    lastRow: 2,
    columns: {},
  });
});
