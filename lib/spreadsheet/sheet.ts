/** What stands in one cell: nothing, a number, words, or what a spreadsheet made there in place of a number. */
export type Cell = null | number | string | FormulaCell | ErrorCell | DateCell;
export type FormulaCell = { readonly formula: string };
export type ErrorCell = { readonly error: string };
/** the days that the spreadsheet counts */
export type DateCell = { readonly date: number };

/** One sheet; rows and columns are counted from 0, and rows may be of different lengths. */
export type Sheet = { readonly name: string; readonly rows: readonly (readonly Cell[])[] };

/** Where a cell stands: the sheet and the cell's own name, such as C14. */
export type CellPlace = { readonly sheet: string; readonly cell: string };

/** What stands in a cell of a sheet; null beyond its edges. Words of blanks only are nothing. */
export function cellAt({ rows }: Sheet, row: number, column: number): Cell {
  const cell = rows[row]?.[column] ?? null;
  return typeof cell === "string" && cell.trim() === "" ? null : cell;
}

/** A cell's name as spreadsheets write it: row 13, column 2 is C14. */
export function cellName(row: number, column: number): string {
  return `${columnName(column)}${row + 1}`;
}

/** A column's name as spreadsheets write it: 0 is A, 25 is Z, 26 is AA. Source: ECMA-376 part 1, 18.18.7 (ST_CellRef). */
export function columnName(column: number): string {
  const before = Math.floor(column / 26) - 1;
  return (before >= 0 ? columnName(before) : "") + String.fromCharCode(65 + (column % 26));
}

/** Row and column of a cell's name, counted from 0; null where it is none. */
export function placeOfCell(name: string): { readonly row: number; readonly column: number } | null {
  const [, letters = "", digits = ""] = /^([A-Z]{1,3})([1-9]\d{0,6})$/.exec(name) ?? [];
  if (letters === "") return null;
  const column = [...letters].reduce((sum, letter) => sum * 26 + letter.charCodeAt(0) - 64, 0) - 1;
  return { row: Number(digits) - 1, column };
}
