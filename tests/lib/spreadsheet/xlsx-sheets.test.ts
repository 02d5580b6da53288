import { strToU8, type Zippable, zipSync } from "fflate";
import { expect, test } from "vitest";
import { xlsxSheets } from "@/lib/spreadsheet/xlsx-sheets";
import { workbookBytes } from "./workbook-bytes";

test("reads words, numbers and words kept once for the workbook, sheet by sheet in their order", () => {
  const bytes = workbookBytes({
    "Hydro & more": [
      ["Draft", 2.25],
      [null, { markup: '<c t="s"><v>0</v></c>' }, { markup: '<c t="s"><v>1</v></c>' }],
    ],
    Tanks: [[], [], ["FO-P"]],
  });
  expect(xlsxSheets(bytes)).toEqual({
    ok: true,
    value: [
      {
        name: "Hydro & more",
        rows: [
          ["Draft", 2.25],
          [null, "shared", "in parts"],
        ],
      },
      { name: "Tanks", rows: [[], [], ["FO-P"]] },
    ],
  });
});

test("gives a formula, an error and a date as what they are, never as a number", () => {
  const cells = [
    { markup: "<c><f>A1*2</f><v>4</v></c>" },
    { markup: '<c><f t="shared" si="0"/><v>4</v></c>' },
    { markup: '<c t="e"><v>#DIV/0!</v></c>' },
    { markup: '<c s="1"><v>46144</v></c>' },
    { markup: '<c s="2"><v>46144</v></c>' },
    { markup: '<c s="3"><v>1.5</v></c>' },
    { markup: '<c t="b"><v>1</v></c>' },
  ];
  expect(xlsxSheets(workbookBytes({ S: [cells] }))).toMatchObject({
    value: [{ rows: [[{ formula: "=A1*2" }, { formula: "=" }, { error: "#DIV/0!" }, { date: 46144 }, { date: 46144 }, 1.5, "TRUE"]] }],
  });
});

test("reads a sheet whose rows and cells do not name their place, and elements with a prefix", () => {
  const bytes = zipSync({
    "xl/workbook.xml": strToU8('<x:workbook xmlns:x="m" xmlns:q="r"><x:sheets><x:sheet name="S" q:id="a"/></x:sheets></x:workbook>'),
    "xl/_rels/workbook.xml.rels": strToU8(
      '<Relationships><Relationship Id="a" Type="t/worksheet" Target="/xl/worksheets/one.xml"/></Relationships>',
    ),
    "xl/worksheets/one.xml": strToU8(
      '<x:worksheet xmlns:x="m"><x:row/><x:row><x:c t="str"><x:v>a</x:v></x:c><x:c><x:v>-0.5</x:v></x:c></x:row></x:worksheet>',
    ),
  });
  expect(xlsxSheets(bytes)).toEqual({ ok: true, value: [{ name: "S", rows: [[], ["a", -0.5]] }] });
});

test("refuses a broken part by its name, and an archive cut short", () => {
  const whole = workbookBytes({ S: [["a", { markup: "<c><v>1</c>" }]] });
  expect(xlsxSheets(whole)).toEqual({ ok: false, refusal: { type: "BrokenWorkbook", part: "xl/worksheets/sheet1.xml" } });
  const cut = workbookBytes({ S: [["a"]] }).subarray(0, 900);
  expect(xlsxSheets(cut)).toMatchObject({ refusal: { type: "BrokenWorkbook" } });
});

test("refuses other archives by what they hold", () => {
  const holdings: readonly Zippable[] = [
    { "word/document.xml": strToU8("") },
    { mimetype: strToU8(""), "content.xml": strToU8("") },
    { "a.txt": strToU8("") },
  ];
  const refusals = holdings.map((parts) => xlsxSheets(zipSync(parts)));
  expect(refusals).toMatchObject(["document", "open-document", "other"].map((holds) => ({ refusal: { type: "NotAWorkbook", holds } })));
});

test("refuses a workbook of a few kilobytes that unpacks to more than any table has", () => {
  const bomb = zipSync({ "xl/workbook.xml": strToU8("<workbook/>"), "xl/worksheets/sheet1.xml": new Uint8Array(65 * 1024 * 1024) });
  expect(bomb.length).toBeLessThan(200_000);
  expect(xlsxSheets(bomb)).toMatchObject({ refusal: { type: "WorkbookUnpacksTooLarge", most: 67_108_864 } });
});

test("refuses a sheet that goes on too far, with the cell", () => {
  const far = { markup: "<c><v>1</v></c>" };
  const bytes = workbookBytes({ Far: [...Array.from({ length: 20_000 }, () => []), [far]] });
  expect(xlsxSheets(bytes)).toEqual({ ok: false, refusal: { type: "SheetTooLarge", sheet: "Far", cell: "A20001" } });
});
