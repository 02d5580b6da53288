import { describe, expect, it } from "vitest";
import { type HydrostaticRow, rowAtDraft, rowBetweenTrims, tablesByTrim } from "@/lib/hydrostatics/hydrostatic-row";
import { promised } from "@/lib/result";

const row = (trim: number, draft: number): HydrostaticRow => ({
  trim,
  draft,
  volume: 100 * draft + trim,
  lcb: 30 - trim,
  vcb: draft / 2,
  lcf: 29,
  waterplaneArea: 100,
  kmt: 7,
  kml: 150,
});
const rows = [row(1, 3), row(0, 2), row(1, 2), row(0, 3)];

describe("rows of a hydrostatic table", () => {
  it("are sorted by trim and draft", () => {
    expect(tablesByTrim(rows)).toEqual([
      { trim: 0, rows: [row(0, 2), row(0, 3)] },
      { trim: 1, rows: [row(1, 2), row(1, 3)] },
    ]);
  });

  it("are linear in draft", () => {
    const [level] = tablesByTrim(rows);
    expect(promised(rowAtDraft(level as NonNullable<typeof level>, 2.25))).toEqual(row(0, 2.25));
  });

  it("are linear in trim too", () => {
    expect(promised(rowBetweenTrims(tablesByTrim(rows), 2.5, 0.5))).toEqual(row(0.5, 2.5));
  });
});
