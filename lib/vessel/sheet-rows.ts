import { numberInCell } from "@/lib/spreadsheet/number-in-cell";
import { type Cell, cellAt, cellName, type Sheet } from "@/lib/spreadsheet/sheet";
import type { SheetFault } from "./sheet-faults";
import { type Field, type Reading, valueInFrame } from "./sheet-field";

/** Where in a sheet the rows stand, and which column holds what; rows and columns are counted from 0. */
export type SheetMapping = {
  readonly headingRow: number;
  readonly firstRow: number;
  readonly lastRow: number;
  readonly columns: Readonly<Record<string, MappedColumn | undefined>>;
};
export type MappedColumn = { readonly column: number; readonly unit: string };

/** A row as it was read: numbers in the ship's frame, words as they stand, and the cell of each. */
export type SheetRow = {
  readonly row: number;
  readonly numbers: Readonly<Record<string, number | undefined>>;
  readonly words: Readonly<Record<string, string | undefined>>;
  readonly cellOf: (key: string) => string;
};

export type SheetRows = { readonly rows: readonly SheetRow[]; readonly faults: readonly SheetFault[] };

const mostWords = 60;

/**
 * The rows of a sheet by a mapping, and everything in its cells that can't be taken: a column that no heading names, a cell
 * without its number, words, formulas, dates and errors in place of one, a number out of its limits.
 * Rows in which all mapped cells are empty are passed over. A row with a fault is not among the rows.
 */
export function sheetRows(sheet: Sheet, mapping: SheetMapping, fields: readonly Field[], reading: Reading): SheetRows {
  const missing = fields.filter(({ key, isOptional }) => !isOptional && !mapping.columns[key]);
  if (missing.length > 0) return { rows: [], faults: missing.map((field) => columnMissing(sheet, mapping, field)) };
  const mapped = fields.filter(({ key }) => mapping.columns[key] !== undefined);
  const numbers = Array.from({ length: Math.max(mapping.lastRow - mapping.firstRow + 1, 0) }, (_, i) => mapping.firstRow + i);
  const filled = numbers.filter((row) => mapped.some(({ key }) => cellOfField(sheet, mapping, row, key) !== null));
  const read = filled.map((row) => rowAt(sheet, mapping, mapped, reading, row));
  return {
    rows: read.flatMap(({ row, faults }) => (faults.length === 0 ? [row] : [])),
    faults: read.flatMap(({ faults }) => faults),
  };
}

function columnMissing({ name }: Sheet, { headingRow }: SheetMapping, { label }: Field): SheetFault {
  return { type: "ColumnMissing", sheet: name, cell: cellName(Math.max(headingRow, 0), 0), column: label };
}

function cellOfField(sheet: Sheet, { columns }: SheetMapping, row: number, key: string): Cell {
  const column = columns[key]?.column;
  return column === undefined ? null : cellAt(sheet, row, column);
}

function rowAt(sheet: Sheet, mapping: SheetMapping, fields: readonly Field[], reading: Reading, row: number) {
  const numbers: Record<string, number> = {};
  const words: Record<string, string> = {};
  const faults: SheetFault[] = [];
  const cellOf = (key: string) => cellName(row, mapping.columns[key]?.column ?? 0);
  for (const field of fields) {
    const { key, label, quantity, isOptional } = field;
    const cell = cellOfField(sheet, mapping, row, key);
    const place = { sheet: sheet.name, cell: cellOf(key), column: label };
    if (cell === null && isOptional) continue;
    const taken = quantity === "words" ? wordsIn(cell, place) : numberOf(cell, field, mapping.columns[key]?.unit ?? "", reading, place);
    if (typeof taken === "number") numbers[key] = taken;
    else if (typeof taken === "string") words[key] = taken;
    else faults.push(taken);
  }
  return { row: { row, numbers, words, cellOf }, faults };
}

type Place = { readonly sheet: string; readonly cell: string; readonly column: string };

function wordsIn(cell: Cell, place: Place): string | SheetFault {
  if (cell === null) return { type: "EmptyCell", ...place };
  if (typeof cell === "object") {
    const refused = numberInCell(cell, "point");
    return refused.ok ? String(refused.value) : { ...refused.refusal, ...place };
  }
  const words = String(cell).trim();
  return words.length > mostWords ? { type: "TooManyWords", ...place, got: words.length, most: mostWords } : words;
}

function numberOf(cell: Cell, field: Field, unit: string, reading: Reading, place: Place): number | SheetFault {
  const read = numberInCell(cell, reading.mark);
  if (!read.ok) return { ...read.refusal, ...place };
  const value = valueInFrame(read.value, field, unit, reading);
  const isWithin = field.limit === undefined || value > 0 || (field.limit === "0 or more" && value === 0);
  return isWithin ? value : { type: "OutOfLimits", ...place, value, limit: field.limit as "above 0" };
}
