import type { Unzipped } from "fflate";
import { answer, type Result, refuse } from "@/lib/result";
import type { Sheet } from "./sheet";
import { type ArchiveRefusal, workbookParts } from "./xlsx-archive";
import { type SheetTooLarge, type WorkbookTables, worksheetCells } from "./xlsx-cells";
import { dateStyles, sharedWords } from "./xlsx-tables";
import { walkXml } from "./xml-elements";

export type WorkbookRefusal = ArchiveRefusal | SheetTooLarge;

/**
 * The sheets of a workbook (.xlsx) with their cells, in the order of the workbook.
 * Refuses what is no workbook, a broken one, and sheets larger than any table of a ship.
 * Source: ECMA-376 part 1, 18.2.19 (sheets) and part 2, 6.5 (relationships).
 */
export function xlsxSheets(bytes: Uint8Array): Result<Sheet[], WorkbookRefusal> {
  const parts = workbookParts(bytes);
  if (!parts.ok) return parts;
  const tables = inPart("xl/styles.xml", () => ({
    words: sharedWords(parts.value["xl/sharedStrings.xml"]),
    dateFormats: dateStyles(parts.value["xl/styles.xml"]),
  }));
  if (!tables.ok) return tables;
  const named = inPart("xl/workbook.xml", () => namedParts(parts.value));
  if (!named.ok) return named;
  const sheets: Sheet[] = [];
  for (const { name, part } of named.value) {
    const sheet = sheetIn(parts.value[part], { name, part }, tables.value);
    if (!sheet.ok) return sheet;
    sheets.push(sheet.value);
  }
  return answer(sheets);
}

type NamedPart = { readonly name: string; readonly part: string };

function sheetIn(bytes: Uint8Array | undefined, { name, part }: NamedPart, tables: WorkbookTables): Result<Sheet, WorkbookRefusal> {
  if (!bytes) return refuse({ type: "BrokenWorkbook", part });
  const read = inPart(part, () => worksheetCells(bytes, tables));
  if (!read.ok) return read;
  const { rows, tooFar } = read.value;
  return tooFar === null ? answer({ name, rows }) : refuse({ type: "SheetTooLarge", sheet: name, cell: tooFar });
}

/** Sheets of cells with the part that holds each; sheets that are charts hold none. */
function namedParts(parts: Unzipped): NamedPart[] {
  const targets = new Map<string, string>();
  walkXml(parts["xl/_rels/workbook.xml.rels"] ?? new Uint8Array(), {
    opened: (_, { Id = "", Target = "", Type = "" }) => {
      if (Type.endsWith("/worksheet")) targets.set(Id, partOf(Target));
    },
  });
  const named: NamedPart[] = [];
  walkXml(parts["xl/workbook.xml"] ?? new Uint8Array(), {
    opened: (element, attributes) => {
      const part = targets.get(attributes["r:id"] ?? attributes[relationOf(attributes)] ?? "");
      if (element === "sheet" && part) named.push({ name: attributes.name ?? "", part });
    },
  });
  return named;
}

function relationOf(attributes: Readonly<Record<string, string>>): string {
  return Object.keys(attributes).find((key) => key.endsWith(":id")) ?? "";
}

function partOf(target: string): string {
  return target.startsWith("/") ? target.slice(1) : `xl/${target.replace(/^\.\//, "")}`;
}

// the parser of the format throws; from here on it is a refusal with the part's name
function inPart<T>(part: string, read: () => T): Result<T, ArchiveRefusal> {
  try {
    return answer(read());
  } catch {
    return refuse({ type: "BrokenWorkbook", part });
  }
}
