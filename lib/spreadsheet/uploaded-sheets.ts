import { answer, type Result, refuse } from "@/lib/result";
import { type BrokenCsv, csvSheet } from "./csv-sheet";
import { fileKind, type OtherKind } from "./file-kind";
import { cellName, type Sheet } from "./sheet";
import { type SheetTooLarge, sheetLimits } from "./xlsx-cells";
import { type WorkbookRefusal, xlsxSheets } from "./xlsx-sheets";

export type UploadRefusal =
  | WorkbookRefusal
  | BrokenCsv
  | { readonly type: "FileTooLarge"; readonly got: number; readonly most: number }
  | { readonly type: "EmptyFile" }
  | { readonly type: "NotASpreadsheet"; readonly kind: OtherKind };

/** The largest file of tables that is taken: 5 MiB. */
export const largestUpload = 5 * 1024 * 1024;

/**
 * The sheets of an uploaded file, by what it is and not by its name: a workbook (.xlsx), or text with separated values.
 * Refuses a file above 5 MiB, an empty one, whatever is neither (a program, a picture, an older workbook), and sheets
 * larger than any table of a ship.
 */
export function uploadedSheets(bytes: Uint8Array, fileName: string): Result<readonly Sheet[], UploadRefusal> {
  if (bytes.length > largestUpload) return refuse({ type: "FileTooLarge", got: bytes.length, most: largestUpload });
  if (bytes.length === 0) return refuse({ type: "EmptyFile" });
  const kind = fileKind(bytes);
  if (kind === "workbook") return xlsxSheets(bytes);
  if (kind !== "text") return refuse({ type: "NotASpreadsheet", kind });
  const sheet = csvSheet(bytes, fileName);
  if (!sheet.ok) return sheet;
  const tooLarge = faultOfSize(sheet.value);
  return tooLarge ? refuse(tooLarge) : answer([sheet.value]);
}

function faultOfSize({ name, rows }: Sheet): SheetTooLarge | null {
  const wide = rows.findIndex((row) => row.length > sheetLimits.columns);
  if (wide >= 0) return { type: "SheetTooLarge", sheet: name, cell: cellName(wide, sheetLimits.columns) };
  const isLong = rows.length > sheetLimits.rows || rows.reduce((sum, row) => sum + row.length, 0) > sheetLimits.cells;
  return isLong ? { type: "SheetTooLarge", sheet: name, cell: cellName(Math.min(rows.length, sheetLimits.rows), 0) } : null;
}
