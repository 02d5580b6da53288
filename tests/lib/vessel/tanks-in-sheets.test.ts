import { expect, test } from "vitest";
import { boxTankTable } from "@/lib/hydrostatics/box-tank";
import { faultsOf } from "@/lib/inclining/faults";
import { refusalSentence } from "@/lib/report/refusal-sentence";
import { promised } from "@/lib/result";
import type { Cell, Sheet } from "@/lib/spreadsheet/sheet";
import { guessedMapping } from "@/lib/vessel/column-guess";
import { usualReading } from "@/lib/vessel/sheet-field";
import { tankFields, tanksInSheets } from "@/lib/vessel/tanks-in-sheets";

const heading = ["Sounding (m)", "Volume (m3)", "LCG", "TCG", "VCG", "I (m4)", "Il (m4)"];
const box = boxTankTable({ x: [10, 15], y: [-4, -1], z: [0, 2] }, 4);
const rows = box.map(({ level, volume, lcg, tcg, vcg, inertia, inertiaLongitudinal = 0 }) => [
  level,
  volume,
  lcg,
  tcg,
  vcg,
  inertia,
  inertiaLongitudinal,
]);

const read = (sheets: readonly Sheet[], measure: "sounding" | "ullage" = "sounding", change = {}) =>
  tanksInSheets(
    sheets.map((sheet) => ({ sheet, mapping: guessedMapping(sheet, tankFields) })),
    measure,
    { ...usualReading(54), density: 1, ...change },
  );
const sentences = (...given: Parameters<typeof read>) => faultsOf(read(...given)).map(refusalSentence);
const changed = (row: number, column: number, cell: Cell): Sheet => ({
  name: "FO-P",
  rows: [heading, ...rows.map((each, i) => each.map((value, j) => (i === row && j === column ? cell : value)))],
});

test("reads a tank from each sheet of a workbook, named after the sheet", () => {
  const tanks = promised(read(["FO-P", "FO-S"].map((name) => ({ name, rows: [heading, ...rows] }))));
  expect(tanks.map(({ id }) => id)).toEqual(["FO-P", "FO-S"]);
  expect(tanks[0]).toEqual({ id: "FO-P", contents: "not said", density: 1, measure: "sounding", table: box });
});

test("reads many tanks from one sheet by their column of names, with contents and density where they stand", () => {
  const list = [
    ["Tank", "Contents", "Density", ...heading],
    ...rows.map((row, i) => [i === 0 ? "FO-P" : null, i === 0 ? "gas oil" : null, i === 0 ? 0.845 : null, ...row]),
    ...rows.map((row) => ["FW", null, null, ...row]),
  ];
  expect(
    promised(read([{ name: "All", rows: list }])).map(({ id, contents, density, table }) => [id, contents, density, table.length]),
  ).toEqual([
    ["FO-P", "gas oil", 0.845, 5],
    ["FW", "not said", 1, 5],
  ]);
});

test("reads ullages, free surface moments in t·m and breadths to port", () => {
  const cells = box.map(({ level, volume, lcg, tcg, vcg, inertia }) => [2 - level, volume, lcg, -tcg, vcg, inertia * 0.845]);
  const sheet = { name: "FO-P", rows: [["Ullage", "Volume", "LCG", "TCG", "VCG", "FSM (t·m)"], ...cells] };
  const [tank] = promised(read([sheet], "ullage", { density: 0.845, athwart: "port" }));
  expect(tank?.measure).toBe("ullage");
  expect(tank?.table[1]).toMatchObject({ level: 1.5, volume: 7.5, tcg: -2.5, inertia: 11.25 });
});

test("a table may be listed from full to empty", () => {
  expect(read([{ name: "FO-P", rows: [heading, ...[...rows].reverse()] }]).ok).toBe(true);
});

test.each<[string, Sheet, string]>([
  [
    "soundings that go back",
    changed(3, 0, 0.15),
    "Sheet “FO-P”, cell A5: 0.15 comes after 1, but must rise from row to row (Sounding or ullage).",
  ],
  ["one sounding twice", changed(3, 0, 1), "Sheet “FO-P”, cell A5: level stands here again, first in A4."],
  [
    "a volume that falls while the sounding rises",
    changed(3, 1, 2.25),
    "Sheet “FO-P”, cell B5: 2.25 comes after 15, but must rise from row to row (Volume).",
  ],
  ["words", changed(2, 5, "11.25 m4"), "Sheet “FO-P”, cell F4: “11.25 m4” is not a number (Second moment athwart)."],
  ["a sounding below nought", changed(0, 0, -0.1), "Sheet “FO-P”, cell A2: −0.1 is not 0 or more (Sounding or ullage)."],
])("names the cell of %s", (_, sheet, sentence) => {
  expect(sentences([sheet])).toEqual([sentence]);
});

test("names the cell where a tank stands in a second sheet", () => {
  const list = { name: "All", rows: [["Tank", ...heading], ...rows.map((row) => ["FO-P", ...row])] };
  expect(sentences([{ name: "FO-P", rows: [heading, ...rows] }, list])).toEqual([
    "Sheet “All”, cell B2: tank FO-P stands here again, first in FO-P, A2.",
  ]);
});

test("refuses a tank that has an empty and a full row only and no free surface between them", () => {
  expect(sentences([{ name: "FO-P", rows: [heading, rows[0] ?? [], rows[4] ?? []] }])).toEqual([
    "Sheet “FO-P”, cell F2: tank FO-P is slack at 1 m, and its table gives no free surface between empty and full.",
  ]);
});

test("refuses a sheet of headings alone", () => {
  expect(sentences([{ name: "FO-P", rows: [heading] }])).toEqual([
    "Sheet “FO-P”, cell A2: no row of numbers from here on, at least 1 needed.",
  ]);
});
