import { expect, test } from "vitest";
import { skerryTernSections } from "@/db/seed/skerry-tern-hull";
import { faultsOf } from "@/lib/inclining/faults";
import { refusalSentence } from "@/lib/report/refusal-sentence";
import type { Sheet } from "@/lib/spreadsheet/sheet";
import { guessedMapping } from "@/lib/vessel/column-guess";
import { offsetFields, offsetsInSheet } from "@/lib/vessel/offsets-in-sheet";
import { usualReading } from "@/lib/vessel/sheet-field";

const read = (rows: Sheet["rows"]) => {
  const sheet = { name: "Lines", rows };
  return offsetsInSheet(sheet, guessedMapping(sheet, offsetFields), usualReading(54));
};
const sentences = (rows: Sheet["rows"]) => faultsOf(read(rows)).map(refusalSentence);
const listed = skerryTernSections().flatMap(({ x, points }) => points.map(([y, z]) => [x, y, z]));

test("reads a list of points back as the sections it was written from", () => {
  expect(read([["x", "y", "z"], ...listed])).toEqual({ ok: true, value: skerryTernSections() });
});

test("reads millimetres where a heading says so", () => {
  const rows = [
    ["Station (m)", "Half-breadth (mm)", "Height (mm)"],
    ...listed.map(([x = 0, y = 0, z = 0]) => [x, Math.round(y * 1000), Math.round(z * 1000)]),
  ];
  expect(read(rows)).toEqual({ ok: true, value: skerryTernSections() });
});

const box = [0, 20].flatMap((x) => [
  [x, 6, 0],
  [x, 6, 5],
]);

test("names the cell of a half-breadth below nought", () => {
  expect(sentences([["x", "y", "z"], [0, -6, 0], ...box.slice(1)])).toEqual(
    ["Sheet “Lines”, cell B2: -6 is not 0 or more (Half-breadth)."].map((s) => s.replace("-", "−")),
  );
});

test("names every section that runs from deck to keel", () => {
  const down = [...box].sort(([a = 0, , zA = 0], [b = 0, , zB = 0]) => a - b || zB - zA);
  expect(sentences([["x", "y", "z"], ...down])).toEqual([
    "Sheet “Lines”, cell B2: the section at x = 0 m runs from the deck to the keel; its points go from the keel upwards.",
    "Sheet “Lines”, cell B4: the section at x = 20 m runs from the deck to the keel; its points go from the keel upwards.",
  ]);
});

test("names the cell where a section goes on that began elsewhere", () => {
  expect(sentences([["x", "y", "z"], ...box, [0, 6, 6]])).toEqual([
    "Sheet “Lines”, cell A6: the section at x = 0 m goes on here, but began in B2; its points must stand together.",
  ]);
});

test("names one section alone as no hull", () => {
  expect(sentences([["x", "y", "z"], ...box.slice(0, 2)])).toEqual(["Sheet “Lines”, cell B2: a hull needs at least 2 sections, 1 given."]);
});
