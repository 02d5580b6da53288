import { expect, test } from "vitest";
import { cellAt, cellName, placeOfCell } from "@/lib/spreadsheet/sheet";

test("names cells as spreadsheets do, and finds them again", () => {
  expect([cellName(13, 2), cellName(0, 25), cellName(0, 26), cellName(9, 701), cellName(0, 702)]).toEqual([
    "C14",
    "Z1",
    "AA1",
    "ZZ10",
    "AAA1",
  ]);
  for (const column of [0, 25, 26, 51, 52, 701, 702]) expect(placeOfCell(cellName(4, column))).toEqual({ row: 4, column });
  expect(placeOfCell("c14")).toBeNull();
});

test("a cell of blanks, or beyond the edge, holds nothing", () => {
  const sheet = { name: "S", rows: [["  ", 0]] };
  expect([cellAt(sheet, 0, 0), cellAt(sheet, 0, 1), cellAt(sheet, 3, 0)]).toEqual([null, 0, null]);
});
