import { expect, test } from "vitest";
import { csvSheet, delimiterOf } from "@/lib/spreadsheet/csv-sheet";

const bytes = (words: string) => new TextEncoder().encode(words);
const rowsOf = (words: string) => csvSheet(bytes(words), "t.csv");

test("parts columns at semicolons where numbers have decimal commas", () => {
  expect(rowsOf("draft;volume\r\n2,00;1440,5\r\n2,25;1625\r\n")).toMatchObject({
    value: {
      rows: [
        ["draft", "volume"],
        ["2,00", "1440,5"],
        ["2,25", "1625"],
      ],
    },
  });
});

test("parts columns at tabs, at commas, and as a first line says", () => {
  expect(delimiterOf("a\tb\n1,5\t2\n")).toBe("\t");
  expect(delimiterOf("a,b\n1.5,2\n")).toBe(",");
  expect(delimiterOf('"a;x",b\n"c;y",2\n')).toBe(",");
  expect(rowsOf("sep=;\na,b;c\n")).toMatchObject({ value: { rows: [["a,b", "c"]] } });
});

test("keeps the number of a row behind empty ones, and quoted words in one cell", () => {
  expect(rowsOf('a;b\n\n"Öl; day";2\n')).toMatchObject({ value: { rows: [["a", "b"], [""], ["Öl; day", "2"]] } });
});

test("reads the code page of older spreadsheets and UTF-16", () => {
  expect(csvSheet(Uint8Array.of(0xd6, 0x6c, 0x3b, 0x31), "t")).toMatchObject({ value: { rows: [["Öl", "1"]] } });
  const wide = Uint8Array.from([0xff, 0xfe, ...[..."a;b"].flatMap((letter) => [letter.charCodeAt(0), 0])]);
  expect(csvSheet(wide, "t")).toMatchObject({ value: { rows: [["a", "b"]] } });
});

test("refuses a quotation that is never closed, with its line", () => {
  expect(rowsOf('a;b\n1;"2\n3;4\n')).toMatchObject({ ok: false, refusal: { type: "BrokenCsv", line: 3 } });
});
