import { numberInCell } from "@/lib/spreadsheet/number-in-cell";
import { type Cell, cellAt, type Sheet } from "@/lib/spreadsheet/sheet";
import type { GridMapping } from "./offset-grid-in-sheet";
import type { Reading } from "./sheet-field";

/**
 * Where the edges of a table of offsets stand: the first row and the first column with three numbers or more. The edge whose numbers reach
 * further holds the sections, since a ship is longer than she is high. Lengths above 500 are taken for millimetres.
 */
export function guessedGrid(sheet: Sheet, reading: Reading): GridMapping {
  const isNumber = (cell: Cell) => numberInCell(cell, reading.mark).ok;
  const labelRow = Math.max(
    sheet.rows.findIndex((row) => row.filter(isNumber).length >= 3),
    0,
  );
  const lastColumn = Math.max(...sheet.rows.slice(labelRow).map((row) => row.length), 1) - 1;
  const lastRow = sheet.rows.length - 1;
  const down = (column: number) => sheet.rows.slice(labelRow + 1).map((_, i) => cellAt(sheet, labelRow + 1 + i, column));
  const columns = Array.from({ length: lastColumn + 1 }, (_, i) => i);
  const labelColumn = Math.max(
    columns.findIndex((column) => down(column).filter(isNumber).length >= 2),
    0,
  );
  const upper = greatest((sheet.rows[labelRow] ?? []).slice(labelColumn + 1), reading);
  const left = greatest(down(labelColumn), reading);
  const across = inMetres(upper) > inMetres(left) ? "sections" : "heights";
  const body = sheet.rows.slice(labelRow + 1).flatMap((row) => row.slice(labelColumn + 1));
  return {
    across,
    labelRow,
    labelColumn,
    lastRow,
    lastColumn,
    units: {
      along: unitOf(across === "sections" ? upper : left),
      height: unitOf(across === "sections" ? left : upper),
      halfBreadth: unitOf(greatest(body, reading)),
    },
  };
}

function greatest(cells: readonly Cell[], { mark }: Reading): number {
  const values = cells.map((cell) => numberInCell(cell, mark));
  return Math.max(...values.map((read) => (read.ok ? Math.abs(read.value) : 0)), 0);
}

function inMetres(most: number): number {
  return unitOf(most) === "mm" ? most / 1000 : most;
}

function unitOf(most: number): string {
  return most > 500 ? "mm" : "m";
}
