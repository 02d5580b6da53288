import { describe, expect, it } from "vitest";
import { tablesByTrim } from "@/lib/hydrostatics/hydrostatic-row";
import { atOtherTrim } from "@/lib/hydrostatics/trim-correction";
import { promised } from "@/lib/result";
import { boxOffsets, hullOf } from "./sample-hulls";
import { tableOf } from "./sample-tables";

const lbp = 60;
const box = hullOf(boxOffsets(lbp, 12, 5));

describe("a table of one trim, for a ship at another", () => {
  it("is the table itself at its own trim", () => {
    const [table] = tablesByTrim(tableOf(box, lbp, [1, 2, 3], [0.4]).rows) as [ReturnType<typeof tablesByTrim>[number]];
    const { row, trimVolume } = promised(atOtherTrim(table, { lbp, draft: 2, trim: 0.4 }));
    expect(row).toEqual(table.rows[1]);
    expect(trimVolume).toBeCloseTo(0, 15);
  });

  it("counts trim from the table's own", () => {
    const [table] = tablesByTrim(tableOf(box, lbp, [1.9, 2, 2.1], [0.4]).rows) as [ReturnType<typeof tablesByTrim>[number]];
    const { row } = promised(atOtherTrim(table, { lbp, draft: 2, trim: 0.1 }));
    // exact for a box: x_B = L/2 + bL²/12T, z_B = T/2 + b²L²/24T; the table's KM_L − KB is BM_L·(1 + b₀²), 4e-5 more than BM_L
    const b = -0.1 / lbp;
    expect(row.lcb).toBeCloseTo(30 + b * 150, 4);
    expect(row.vcb).toBeCloseTo(1 + 75 * b * b, 6);
  });

  it("has no second correction on upright sides: the waterplane does not grow", () => {
    const [table] = tablesByTrim(tableOf(box, lbp, [1, 2, 3]).rows) as [ReturnType<typeof tablesByTrim>[number]];
    expect(promised(atOtherTrim(table, { lbp, draft: 2, trim: 0.6 })).trimVolume).toBeCloseTo(0, 9);
  });
});
