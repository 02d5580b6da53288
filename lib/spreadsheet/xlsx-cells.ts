import { type Cell, columnName, placeOfCell } from "./sheet";
import { walkXml } from "./xml-elements";

/** What the cells of a sheet refer to: words kept once for the workbook, and the formats that show a number as a date. */
export type WorkbookTables = { readonly words: readonly string[]; readonly dateFormats: ReadonlySet<number> };

/** The largest sheet that is read: more than any table of a ship has, and few enough to look at. */
export const sheetLimits = { rows: 20_000, columns: 512, cells: 200_000 } as const;

export type SheetTooLarge = { readonly type: "SheetTooLarge"; readonly sheet: string; readonly cell: string };

type CellMarkup = { readonly name: string; readonly kind: string; readonly style: number; value: string; formula: string | null };

/**
 * The cells of a worksheet as they stand, row by row.
 * A cell that holds a formula is given as that, not as the value that was last worked out for it.
 * Null and the cell's name where the sheet is larger than `sheetLimits`. Throws where the document is not well-formed.
 * Source: ECMA-376 part 1, 18.3.1.4 (c), 18.3.1.40 (f), 18.18.11 (ST_CellType).
 */
export function worksheetCells(bytes: Uint8Array, tables: WorkbookTables): { readonly rows: Cell[][]; readonly tooFar: string | null } {
  const rows: Cell[][] = [];
  let tooFar: string | null = null;
  let count = 0;
  walkCells(bytes, (markup) => {
    const cell = cellFrom(markup, tables);
    if (cell === null || tooFar !== null) return;
    const { row, column } = placeOfCell(markup.name) ?? { row: Number.POSITIVE_INFINITY, column: 0 };
    count += 1;
    if (row >= sheetLimits.rows || column >= sheetLimits.columns || count > sheetLimits.cells) tooFar = markup.name;
    else put(rows, row, column, cell);
  });
  return { rows: Array.from(rows, (row) => Array.from(row ?? [], (cell) => cell ?? null)), tooFar };
}

function walkCells(bytes: Uint8Array, take: (cell: CellMarkup) => void): void {
  let cell: CellMarkup | null = null;
  let within = "";
  let [row, column] = [0, 0];
  walkXml(bytes, {
    opened: (name, { r, t = "n", s = "0" }) => {
      within = name;
      if (name === "row") [row, column] = [r ? Number(r) : row + 1, 0];
      if (name === "c") {
        column = r ? (placeOfCell(r)?.column ?? column) + 1 : column + 1;
        cell = { name: r ?? nameAt(row, column), kind: t, style: Number(s), value: "", formula: null };
      }
      if (name === "f" && cell) cell.formula = "";
    },
    text: (text) => {
      if (cell && (within === "v" || within === "t")) cell.value += text;
      if (cell && within === "f") cell.formula += text;
    },
    closed: (name) => {
      within = "";
      if (name === "c" && cell) take(cell);
      if (name === "c") cell = null;
    },
  });
}

function nameAt(row: number, column: number): string {
  return `${columnName(column - 1)}${row}`;
}

function put(rows: Cell[][], row: number, column: number, cell: Cell): void {
  rows[row] ??= [];
  (rows[row] as Cell[])[column] = cell;
}

function cellFrom({ kind, style, value, formula }: CellMarkup, { words, dateFormats }: WorkbookTables): Cell {
  if (formula !== null) return { formula: `=${formula}` };
  if (value === "") return null;
  switch (kind) {
    case "s":
      return words[Number(value)] ?? null;
    case "e":
      return { error: value };
    case "b":
      return value === "1" ? "TRUE" : "FALSE";
    case "d":
      return { date: Number.NaN };
    case "n":
      return dateFormats.has(style) ? { date: Number(value) } : Number(value);
    default:
      return value;
  }
}
