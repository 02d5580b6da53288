import { type Cell, cellAt, type Sheet } from "@/lib/spreadsheet/sheet";
import type { Field } from "./sheet-field";
import type { MappedColumn, SheetMapping } from "./sheet-rows";
import { ownUnit, type Quantity, units, unitWritten } from "./units";

const rowsLookedAt = 40;

/**
 * Which column of a sheet holds what, by the words of its headings, and in which unit, by what stands in brackets behind
 * them, behind a comma, or in the row below. The row with the most headings that mean something is the row of headings.
 * Where none means anything, the first row with two cells stands for it and no column is named.
 */
export function guessedMapping(sheet: Sheet, fields: readonly Field[]): SheetMapping {
  const candidates = sheet.rows.slice(0, rowsLookedAt).map((row, i) => ({ row: i, columns: namedColumns(row, fields) }));
  const best = candidates.reduce((a, b) => (Object.keys(b.columns).length > Object.keys(a.columns).length ? b : a), {
    row: Math.max(
      sheet.rows.findIndex((row) => row.filter((cell) => cell !== null && cell !== "").length > 1),
      0,
    ),
    columns: {},
  });
  const below = unitsBelow(sheet, best.row, best.columns, fields);
  return {
    headingRow: best.row,
    firstRow: best.row + (below ? 2 : 1),
    lastRow: lastFilledRow(sheet),
    columns: below ?? best.columns,
  };
}

/** A heading without its unit, signs and capitals: `Waterplane area, m²` is `waterplane area`. */
export function plainHeading(heading: string): string {
  const { words } = wordsAndUnit(heading);
  return words
    .toLowerCase()
    .replaceAll(/[^\p{L}\p{N}∇Δ]+/gu, " ")
    .trim();
}

type Columns = Readonly<Record<string, MappedColumn>>;

function namedColumns(row: readonly Cell[], fields: readonly Field[]): Columns {
  const columns: Record<string, MappedColumn> = {};
  row.forEach((cell, column) => {
    if (typeof cell !== "string") return;
    const plain = plainHeading(cell);
    const field = fields.find(({ key, headings }) => !(key in columns) && headings.test(plain));
    if (field) columns[field.key] = { column, unit: unitOfHeading(cell, field.quantity) };
  });
  return columns;
}

function unitOfHeading(heading: string, quantity: Quantity): string {
  const written = unitWritten(quantity, wordsAndUnit(heading).unit);
  if (written !== null) return written;
  const plain = plainHeading(heading);
  if (quantity === "volume" && /disp|mass|weight|^Δ/i.test(plain)) return "t";
  if (quantity === "area" && /tpc|per cm/.test(plain)) return "t/cm";
  if (quantity === "area" && /tpi|per inch/.test(plain)) return "long tons/in";
  if (quantity === "inertia" && /moment|fsm/.test(plain) && !/second|inertia/.test(plain)) return "t·m";
  return ownUnit(quantity);
}

function wordsAndUnit(heading: string): { readonly words: string; readonly unit: string } {
  const trimmed = heading.trim();
  const bracketed = /^(.*?)[[(]([^\])]*)[\])]\s*$/.exec(trimmed);
  if (bracketed) return { words: bracketed[1] ?? "", unit: bracketed[2] ?? "" };
  const parted = /^(.*?)(?:,\s*|\s+in\s+|\s+)(\S+(?:\s(?:ft|m|tons?)\.?)?)$/i.exec(trimmed);
  const unit = parted?.[2] ?? "";
  return parted && isUnit(unit) ? { words: parted[1] ?? "", unit } : { words: trimmed, unit: "" };
}

// a letter alone may be part of a name: "Draft T" is no draft in tonnes
function isUnit(words: string): boolean {
  if (/^[A-Z]$/.test(words.trim())) return false;
  return (Object.keys(units) as Quantity[]).some((quantity) => unitWritten(quantity, words) !== null);
}

/** The columns with the units that a row of nothing but units gives them; null where the row below is none. */
function unitsBelow(sheet: Sheet, row: number, columns: Columns, fields: readonly Field[]): Columns | null {
  const found = Object.entries(columns).map(([key, { column, unit }]) => {
    const cell = cellAt(sheet, row + 1, column);
    const quantity = fields.find((field) => field.key === key)?.quantity ?? "words";
    const words = typeof cell === "string" ? cell.replaceAll(/^[[(]|[\])]$/g, "") : "";
    return { key, column, unit, isEmpty: cell === null, written: unitWritten(quantity, words) };
  });
  const isRowOfUnits = found.some(({ written }) => written !== null) && found.every(({ written, isEmpty }) => written !== null || isEmpty);
  if (!isRowOfUnits) return null;
  return Object.fromEntries(found.map(({ key, column, unit, written }) => [key, { column, unit: written ?? unit }]));
}

function lastFilledRow({ rows }: Sheet): number {
  return rows.findLastIndex((row) => row.some((cell) => cell !== null && cell !== ""));
}
