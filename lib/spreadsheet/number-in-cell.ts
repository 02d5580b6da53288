import { answer, type Result, refuse } from "@/lib/result";
import type { Cell } from "./sheet";

/** What stands between the whole and the parts of a number that is written as words. */
export type DecimalMark = "point" | "comma";

export type NumberRefusal =
  | { readonly type: "EmptyCell" }
  | { readonly type: "NotANumber"; readonly given: string }
  | { readonly type: "OtherDecimalMark"; readonly given: string; readonly mark: DecimalMark }
  | { readonly type: "FormulaCell"; readonly formula: string }
  | { readonly type: "ErrorCell"; readonly error: string }
  | { readonly type: "DateCell" };

/**
 * The number in a cell. Numbers of a workbook are taken as they are; words are read with the decimal mark that the whole
 * file uses, so that 1,234 is never one thing in one row and another in the next. Blanks between groups of three figures
 * are allowed.
 *
 * Refuses nothing, words, the other decimal mark, formulas (their value may be of another day), errors and dates (a
 * spreadsheet makes 2.5 the second of May).
 */
export function numberInCell(cell: Cell, mark: DecimalMark): Result<number, NumberRefusal> {
  if (cell === null) return refuse({ type: "EmptyCell" });
  if (typeof cell === "number") return Number.isFinite(cell) ? answer(cell) : refuse({ type: "NotANumber", given: String(cell) });
  if (typeof cell === "string") return numberInWords(cell, mark);
  if ("formula" in cell) return refuse({ type: "FormulaCell", formula: cell.formula });
  return "error" in cell ? refuse({ type: "ErrorCell", error: cell.error }) : refuse({ type: "DateCell" });
}

/** The decimal mark of a file, by what most of its words with one mark have. */
export function decimalMarkIn(cells: readonly Cell[]): DecimalMark {
  const words = cells.filter((cell) => typeof cell === "string");
  const commas = words.filter((word) => /^\s*[-+−]?[\d\s]*,\d+\s*$/.test(word)).length;
  const points = words.filter((word) => /^\s*[-+−]?[\d\s]*\.\d+\s*$/.test(word)).length;
  return commas > points ? "comma" : "point";
}

function numberInWords(words: string, mark: DecimalMark): Result<number, NumberRefusal> {
  const given = words.trim();
  const plain = given.replace("−", "-").replaceAll(/(?<=\d)[\s\u00a0\u2009\u202f](?=\d{3}(?!\d))/g, "");
  const [own, other] = mark === "point" ? [".", ","] : [",", "."];
  if (plain.includes(other) && /^[-+]?[\d.,]+$/.test(plain)) return refuse({ type: "OtherDecimalMark", given, mark });
  const isNumber = /^[-+]?(\d+\.?\d*|\.\d+)(e[-+]?\d{1,2})?$/i.test(plain.replace(own, "."));
  if (!isNumber || plain.includes(other)) return given === "" ? refuse({ type: "EmptyCell" }) : refuse({ type: "NotANumber", given });
  return answer(Number(plain.replace(own, ".")));
}
