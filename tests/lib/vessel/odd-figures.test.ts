import { expect, test } from "vitest";
import { skerryTernSections } from "@/db/seed/skerry-tern-hull";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { promised } from "@/lib/result";
import { halfBreadthAt, oddInTable, oddOffsets } from "@/lib/vessel/odd-figures";

const hull = promised(hullFromOffsets({ sections: skerryTernSections() }));
const table = Array.from({ length: 13 }, (_, i) => {
  const draft = 1.2 + 0.2 * i;
  const found = promised(hydrostaticsAt(hull, { draftAtAp: draft, slopeAlong: 0, tanHeel: 0, sag: 0, lbp: 54 }));
  const { volume, lcb, vcb, lcf, waterplaneArea, kmt, kml } = found;
  return { trim: 0, draft, volume, lcb, vcb, lcf, waterplaneArea, kmt, kml };
});

test("finds nothing odd in the offsets and the table of a fair hull", () => {
  expect(oddOffsets(skerryTernSections())).toEqual([]);
  expect(oddInTable(table)).toEqual([]);
});

test("finds a wrong figure in any column of a table, whichever row it stands in", () => {
  for (const column of ["volume", "lcb", "lcf", "waterplaneArea", "kmt", "kml"] as const) {
    for (const row of [3, 6, 9]) {
      const wrong = table.map((each, i) => (i === row ? { ...each, [column]: each[column] * 1.1 } : each));
      expect(oddInTable(wrong), `${column} ${row}`).toMatchObject([{ column, draft: table[row]?.draft, value: wrong[row]?.[column] }]);
    }
  }
});

test("finds a half-breadth a metre out, at the section and the height", () => {
  for (const [section, point] of [
    [6, 8],
    [10, 10],
    [14, 9],
  ] as const) {
    const wrong = skerryTernSections().map(({ x, points }, i) => ({
      x,
      points: points.map(([y, z], j) => [i === section && j === point ? y - 1 : y, z] as [number, number]),
    }));
    const odd = oddOffsets(wrong);
    const place = skerryTernSections()[section];
    expect(odd[0], `${section}`).toMatchObject({ x: place?.x, z: place?.points[point]?.[1] });
    expect(odd.filter((each) => each.type === "OddOffset" && each.x !== place?.x)).toEqual([]);
  }
});

test("half-breadth of a section stands on the line between its points", () => {
  const section = {
    x: 0,
    points: [
      [0, 0],
      [4, 1],
      [5, 3],
    ] as [number, number][],
  };
  expect([halfBreadthAt(section, 0.5), halfBreadthAt(section, 1), halfBreadthAt(section, 2), halfBreadthAt(section, 3.1)]).toEqual([
    2,
    4,
    4.5,
    null,
  ]);
});
