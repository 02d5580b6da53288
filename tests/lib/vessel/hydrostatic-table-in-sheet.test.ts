import { describe, expect, test } from "vitest";
import { faultsOf } from "@/lib/inclining/faults";
import { refusalSentence } from "@/lib/report/refusal-sentence";
import { promised } from "@/lib/result";
import { decimalMarkIn } from "@/lib/spreadsheet/number-in-cell";
import type { Sheet } from "@/lib/spreadsheet/sheet";
import { uploadedSheets } from "@/lib/spreadsheet/uploaded-sheets";
import { guessedMapping } from "@/lib/vessel/column-guess";
import { hydrostaticFields, hydrostaticTableInSheet } from "@/lib/vessel/hydrostatic-table-in-sheet";
import { usualReading } from "@/lib/vessel/sheet-field";
import { type Written, workbookBytes } from "../spreadsheet/workbook-bytes";

const heading = ["Draft [m]", "Volume (m³)", "LCB, m", "KB", "LCF", "Waterplane area m2", "KMT", "KML"];
const rows = [
  [2, 1440, 30, 1, 30, 720, 7, 151],
  [2.5, 1800, 30, 1.25, 30, 720, 6.05, 121.25],
  [3, 2160, 30, 1.5, 30, 720, 5.5, 101.5],
];
const table = rows.map(([draft, volume, lcb, vcb, lcf, waterplaneArea, kmt, kml]) => ({
  ...{ trim: 0, draft, volume, lcb, vcb },
  ...{ lcf, waterplaneArea, kmt, kml },
}));

/** The box 60 × 12 m of the check values, KM = T/2 + B²/12T, 0.02 m wrong at the last row's KMT to keep the figures short. */
const read = (sheet: Sheet, change = {}) =>
  hydrostaticTableInSheet(sheet, guessedMapping(sheet, hydrostaticFields), { ...usualReading(60), ...change });
const workbook = (cells: readonly (readonly Written[])[]) =>
  promised(uploadedSheets(workbookBytes({ Hydro: cells }), "h.xlsx"))[0] as Sheet;
const csv = (words: string) => promised(uploadedSheets(new TextEncoder().encode(words), "hydro.csv"))[0] as Sheet;
const sentences = (result: ReturnType<typeof read>) => faultsOf(result).map(refusalSentence);

describe("a table that is right", () => {
  test("is read with the units that its headings name", () => {
    expect(read(workbook([["MV Example, hydrostatic table"], [], heading, ...rows]))).toEqual({ ok: true, value: { rows: table } });
  });

  test("is read from semicolons and decimal commas, with the units in a row of their own", () => {
    const lines = rows.map((row) => row.map((value) => String(value).replace(".", ",")).join(";"));
    const text = ["draft;vol;lcb;vcb;lcf;awp;kmt;kml", "m;m3;m;m;m;m2;m;m", ...lines].join("\r\n");
    const sheet = csv(text);
    const mark = decimalMarkIn(sheet.rows.flat());
    expect(mark).toBe("comma");
    expect(read(sheet, { mark })).toEqual({ ok: true, value: { rows: table } });
  });

  test("is the same from feet, long tons and tons per inch, to a millionth", () => {
    const imperial = rows.map(([draft = 0, volume = 0, lcb = 0, vcb = 0, lcf = 0, area = 0, kmt = 0, kml = 0]) => [
      ...[draft / 0.3048, (volume * 1.025) / 1.0160469088, (30 - lcb) / 0.3048, vcb / 0.3048, (30 - lcf) / 0.3048],
      ...[(area * 1.025 * 0.0254) / 1.0160469088, kmt / 0.3048, kml / 0.3048],
    ]);
    const names = ["Draft (ft)", "Displacement (long tons)", "LCB (ft)", "KB (ft)", "LCF (ft)", "TPI (tons/in)", "KMT (ft)", "KML (ft)"];
    const found = promised(read(workbook([names, ...imperial]), { alongFrom: "midships-aft" }));
    found.rows.forEach((row, i) => {
      for (const [key, value] of Object.entries(table[i] ?? {})) expect(row[key as "draft"], key).toBeCloseTo(value as number, 6);
    });
  });

  test("may have several trims, by the bow where the sheet counts them so", () => {
    const cells = [["Trim", ...heading], ...[0.5, -0.5].flatMap((trim) => rows.map((row) => [trim, ...row]))];
    const found = promised(read(workbook(cells), { trimBy: "bow" }));
    expect(found.rows.map(({ trim }) => trim)).toEqual([-0.5, -0.5, -0.5, 0.5, 0.5, 0.5]);
  });
});

describe("a table that can't be right", () => {
  const changed = (row: number, column: number, cell: Written) =>
    workbook([heading, ...rows.map((each, i) => (i === row ? each.map((value, j) => (j === column ? cell : value)) : each))]);

  test.each<[string, Sheet, string]>([
    ["words", changed(1, 2, "abc"), "Sheet “Hydro”, cell C3: “abc” is not a number (LCB)."],
    ["nothing", changed(2, 6, null), "Sheet “Hydro”, cell G4: nothing stands here, a value is needed (KM transverse)."],
    [
      "a formula",
      changed(0, 1, { markup: "<c><f>A2*720</f><v>1440</v></c>" }),
      "Sheet “Hydro”, cell B2: a formula stands here (=A2*720); paste it as a value (Volume).",
    ],
    [
      "a date",
      changed(1, 0, { markup: '<c s="2"><v>46144</v></c>' }),
      "Sheet “Hydro”, cell A3: a date stands here; the spreadsheet has made one of a number such as 2.5 (Draft).",
    ],
    [
      "an error",
      changed(1, 3, { markup: '<c t="e"><v>#N/A</v></c>' }),
      "Sheet “Hydro”, cell D3: the spreadsheet shows the error #N/A here (VCB (KB)).",
    ],
    [
      "a decimal comma among points",
      changed(1, 0, "2,5"),
      "Sheet “Hydro”, cell A3: “2,5” has a comma, but the numbers of this file are read with a decimal point (Draft).",
    ],
    ["a draft of nought", changed(0, 0, 0), "Sheet “Hydro”, cell A2: 0 is not above 0 (Draft)."],
    ["a volume that falls", changed(2, 1, 1216), "Sheet “Hydro”, cell B4: 1216 comes after 1800, but must rise from row to row (Volume)."],
    ["one draft twice", changed(1, 0, 2), "Sheet “Hydro”, cell A3: draft and trim stands here again, first in A2."],
    ["a metacentre below KB", changed(1, 6, 0.605), "Sheet “Hydro”, cell G3: 0.605 is not above KB, 1.25 (KM transverse)."],
  ])("names the cell of %s", (_, sheet, sentence) => {
    expect(sentences(read(sheet))).toEqual([sentence]);
  });

  test("names every bad cell at once", () => {
    const bad = workbook([heading, ["x", 1440, 30, 1, 30, 720, 7, 151], [2.5, "y", 30, 1.25, 30, -720, 6.05, 121.25]]);
    expect(sentences(read(bad)).map((sentence) => /cell (\w+)/.exec(sentence)?.[1])).toEqual(["A2", "B3", "F3"]);
  });

  test("is known for the wrong sheet when its headings mean nothing", () => {
    const notes = workbook([
      ["Notes", "by"],
      ["checked", "E. M."],
    ]);
    expect(sentences(read(notes))[0]).toBe(
      "Sheet “Hydro”, cell A1: no column is named for “Draft”; look whether this is the right sheet and its row of headings.",
    );
    expect(sentences(read(notes))).toHaveLength(8);
  });

  test("needs two rows", () => {
    expect(sentences(read(workbook([heading, rows[0] ?? []])))).toEqual([
      "Sheet “Hydro”, cell A2: only 1 row of numbers from here on, at least 2 needed.",
    ]);
  });
});
