import { CsvError, parse } from "csv-parse/sync";
import { answer, type Result, refuse } from "@/lib/result";
import { isUtf16 } from "./file-kind";
import type { Sheet } from "./sheet";

export type BrokenCsv = { readonly type: "BrokenCsv"; readonly line: number };
export type Delimiter = ";" | "\t" | ",";

/**
 * The sheet in a text of separated values; every cell is words as they stand there, since the text does not say which are numbers.
 *
 * Columns are parted by what stands in most of the rows: tabs, semicolons or, where there are neither, commas. A first
 * row `sep=;` says so itself. Refuses a quotation that is not closed, with its line.
 * Source: RFC 4180.
 */
export function csvSheet(bytes: Uint8Array, name: string): Result<Sheet, BrokenCsv> {
  const text = textOf(bytes);
  try {
    const delimiter = delimiterOf(text);
    const rows: string[][] = parse(text.replace(saidFirst, ""), { delimiter, bom: true, relax_column_count: true, trim: true });
    return answer({ name, rows });
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    return refuse({ type: "BrokenCsv", line: typeof error.lines === "number" ? error.lines : 1 });
  }
}

/** What parts the columns of a text. */
export function delimiterOf(text: string): Delimiter {
  const [, said] = saidFirst.exec(text) ?? [];
  if (said) return said as Delimiter;
  const lines = text
    .split(/\r?\n|\r/, 200)
    .map((line) => line.replaceAll(/"[^"]*"/g, ""))
    .filter((line) => line.trim() !== "");
  const share = (mark: string) => lines.filter((line) => line.includes(mark)).length / Math.max(lines.length, 1);
  return (["\t", ";"] as const).find((mark) => share(mark) >= 0.5) ?? ",";
}

// spreadsheets take this line for a message to them, and count rows from the next one
const saidFirst = /^\uFEFF?sep=([;,\t])\r?\n/i;

// older spreadsheets write the code page of western Europe; what is no UTF-8 is taken as that
function textOf(bytes: Uint8Array): string {
  if (isUtf16(bytes)) return new TextDecoder(bytes[0] === 0xff ? "utf-16le" : "utf-16be").decode(bytes);
  try {
    return new TextDecoder("utf-8", { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder("windows-1252").decode(bytes);
  }
}
