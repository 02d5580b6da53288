import { expect, test } from "vitest";
import { largestUpload, uploadedSheets } from "@/lib/spreadsheet/uploaded-sheets";
import { workbookBytes } from "./workbook-bytes";

const text = (words: string) => new TextEncoder().encode(words);

test("knows a workbook and a text by their bytes, not by their name", () => {
  expect(uploadedSheets(workbookBytes({ S: [[1]] }), "table.csv")).toMatchObject({ value: [{ name: "S", rows: [[1]] }] });
  expect(uploadedSheets(text("1;2\n"), "table.xlsx")).toMatchObject({ value: [{ name: "table.xlsx", rows: [["1", "2"]] }] });
});

test("refuses a renamed program, a picture, a document in print, a web page and an older workbook by name", () => {
  const files: readonly (readonly [string, Uint8Array])[] = [
    ["program", Uint8Array.of(0x4d, 0x5a, 0x90, 0, 3)],
    ["program", Uint8Array.of(0x7f, 0x45, 0x4c, 0x46, 2)],
    ["picture", Uint8Array.of(0x89, 0x50, 0x4e, 0x47)],
    ["pdf", text("%PDF-1.7")],
    ["web-page", text("\n<!DOCTYPE html><table>")],
    ["old-workbook", Uint8Array.of(0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1)],
    ["unreadable", Uint8Array.of(1, 2, 0, 4)],
  ];
  for (const [kind, bytes] of files) {
    expect(uploadedSheets(bytes, "tanks.xlsx")).toEqual({ ok: false, refusal: { type: "NotASpreadsheet", kind } });
  }
});

test("refuses 20 MB and an empty file", () => {
  const large = 20 * 1024 * 1024;
  expect(uploadedSheets(new Uint8Array(large), "a.csv")).toEqual({
    ok: false,
    refusal: { type: "FileTooLarge", got: large, most: largestUpload },
  });
  expect(uploadedSheets(new Uint8Array(), "a.csv")).toEqual({ ok: false, refusal: { type: "EmptyFile" } });
});

test("refuses a text with too many rows or columns, with the cell", () => {
  expect(uploadedSheets(text("1\n".repeat(20_001)), "long.csv")).toMatchObject({ refusal: { type: "SheetTooLarge", cell: "A20001" } });
  expect(uploadedSheets(text(`1\n${"1;".repeat(600)}\n`), "wide.csv")).toMatchObject({ refusal: { type: "SheetTooLarge", cell: "SS2" } });
});
