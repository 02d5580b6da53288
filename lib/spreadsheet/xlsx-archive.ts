import { type UnzipFileInfo, type Unzipped, unzipSync } from "fflate";
import { answer, type Result, refuse } from "@/lib/result";

export type ArchiveRefusal =
  | { readonly type: "BrokenWorkbook"; readonly part: string }
  | { readonly type: "NotAWorkbook"; readonly holds: "document" | "open-document" | "binary-workbook" | "other" }
  | { readonly type: "WorkbookUnpacksTooLarge"; readonly got: number; readonly most: number };

const mostUnpacked = 64 * 1024 * 1024;

/**
 * The parts of a workbook that hold cells, unpacked; pictures, charts and macros stay packed.
 * Refuses an archive that is no workbook or is broken, and one that unpacks to more than 64 MiB: a few kilobytes can hold gigabytes.
 * Source: ECMA-376 part 2 (packages) and part 1, 12.3 (parts of a workbook).
 */
export function workbookParts(bytes: Uint8Array): Result<Unzipped, ArchiveRefusal> {
  const names: string[] = [];
  const sizes: number[] = [];
  try {
    unzipSync(bytes, { filter: (file) => noted(file, names, sizes) });
    const got = sizes.reduce((sum, size) => sum + size, 0);
    if (got > mostUnpacked) return refuse({ type: "WorkbookUnpacksTooLarge", got, most: mostUnpacked });
    if (!names.includes("xl/workbook.xml")) return refuse({ type: "NotAWorkbook", holds: kindOf(names) });
    return answer(unzipSync(bytes, { filter: ({ name }) => isOfCells(name) }));
  } catch {
    return refuse({ type: "BrokenWorkbook", part: "the archive itself" });
  }
}

function noted({ name, originalSize }: UnzipFileInfo, names: string[], sizes: number[]): boolean {
  names.push(name);
  if (isOfCells(name)) sizes.push(originalSize);
  return false;
}

function isOfCells(name: string): boolean {
  return /^xl\/(workbook|sharedStrings|styles|_rels\/workbook\.xml|worksheets\/[^/]+)\.(xml|rels)$/i.test(name);
}

function kindOf(names: readonly string[]): "document" | "open-document" | "binary-workbook" | "other" {
  if (names.includes("xl/workbook.bin")) return "binary-workbook";
  if (names.includes("content.xml") && names.includes("mimetype")) return "open-document";
  return names.some((name) => name.startsWith("word/") || name.startsWith("ppt/")) ? "document" : "other";
}
