import { expect, test } from "vitest";
import { decimalMarkIn, numberInCell } from "@/lib/spreadsheet/number-in-cell";
import type { Cell } from "@/lib/spreadsheet/sheet";

test.each<[Cell, "point" | "comma", number]>([
  [2.5, "comma", 2.5],
  ["2.5", "point", 2.5],
  ["2,5", "comma", 2.5],
  [" −0.25 ", "point", -0.25],
  ["1 440,5", "comma", 1440.5],
  ["1\u00a0234\u202f567", "point", 1_234_567],
  ["1.5E+03", "point", 1500],
  [".5", "point", 0.5],
])("reads %j with a decimal %s as %d", (cell, mark, value) => {
  expect(numberInCell(cell, mark)).toEqual({ ok: true, value });
});

test.each<[Cell, "point" | "comma", string]>([
  [null, "point", "EmptyCell"],
  ["  ", "point", "EmptyCell"],
  ["abc", "point", "NotANumber"],
  ["2.5 m", "point", "NotANumber"],
  ["1 2", "point", "NotANumber"],
  ["2,5", "point", "OtherDecimalMark"],
  ["1,234.5", "point", "OtherDecimalMark"],
  ["2.5", "comma", "OtherDecimalMark"],
  [{ formula: "=A1" }, "point", "FormulaCell"],
  [{ error: "#N/A" }, "point", "ErrorCell"],
  [{ date: 46144 }, "point", "DateCell"],
  [Number.NaN, "point", "NotANumber"],
])("refuses %j with a decimal %s: %s", (cell, mark, type) => {
  expect(numberInCell(cell, mark)).toMatchObject({ ok: false, refusal: { type } });
});

test("takes the decimal mark that most words of a file have", () => {
  expect(decimalMarkIn(["2,5", "3,25", "4.5", "draft"])).toBe("comma");
  expect(decimalMarkIn(["2", "LCB, m", 3.5])).toBe("point");
});
