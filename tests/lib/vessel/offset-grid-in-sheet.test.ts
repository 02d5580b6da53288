import { expect, test } from "vitest";
import { faultsOf } from "@/lib/inclining/faults";
import { refusalSentence } from "@/lib/report/refusal-sentence";
import type { Cell, Sheet } from "@/lib/spreadsheet/sheet";
import { guessedGrid } from "@/lib/vessel/grid-guess";
import { offsetGridInSheet } from "@/lib/vessel/offset-grid-in-sheet";
import { usualReading } from "@/lib/vessel/sheet-field";

const read = (rows: Sheet["rows"]) => {
  const sheet = { name: "Offsets", rows };
  const reading = usualReading(40);
  return offsetGridInSheet(sheet, guessedGrid(sheet, reading), reading);
};
const sentences = (rows: Sheet["rows"]) => faultsOf(read(rows)).map(refusalSentence);

const grid: Cell[][] = [
  ["Half-breadths", null, null, null, null],
  ["x \\ z", 0, 1, 2, 4],
  [0, null, 0, 1.5, 3],
  [20, 4, 4.5, 5, 5],
  [40, 0, 1, 2, null],
];
const sections = [
  {
    x: 0,
    points: [
      [0, 1],
      [1.5, 2],
      [3, 4],
    ],
  },
  {
    x: 20,
    points: [
      [4, 0],
      [4.5, 1],
      [5, 2],
      [5, 4],
    ],
  },
  {
    x: 40,
    points: [
      [0, 0],
      [1, 1],
      [2, 2],
    ],
  },
];
const turned = (cells: readonly (readonly Cell[])[]) =>
  (cells[1] ?? []).map((_, column) => cells.slice(1).map((row) => row[column] ?? null));

test("reads waterlines across and sections down, an empty cell as a waterline that does not meet the section", () => {
  expect(read(grid)).toEqual({ ok: true, value: sections });
});

test("reads the same table turned", () => {
  expect(read(turned(grid))).toEqual({ ok: true, value: sections });
});

test("ends each section at its own deck edge, and begins it at its own keel", () => {
  const withEdges = grid.map((row, i) => [
    ...row,
    ...([[], ["Keel", "Deck height", "Deck half-breadth"], [0.8, 5, 3.2], [0, 4.5, 5], [-0.1, 5.5, 2.5]][i] ?? []),
  ]);
  expect(read(withEdges)).toMatchObject({
    value: [
      {
        points: [
          [0, 0.8],
          [0, 1],
          [1.5, 2],
          [3, 4],
          [3.2, 5],
        ],
      },
      {
        points: [
          [0, 0],
          [4, 0],
          [4.5, 1],
          [5, 2],
          [5, 4],
          [5, 4.5],
        ],
      },
      {
        points: [
          [0, -0.1],
          [0, 0],
          [1, 1],
          [2, 2],
          [2.5, 5.5],
        ],
      },
    ],
  });
});

test("refuses the height of a deck edge without its breadth", () => {
  expect(sentences(grid.map((row, i) => [...row, ["", "Deck height", 5, 4.5, 5.5][i] ?? null]))).toEqual([
    "Sheet “Offsets”, cell A2: no column is named for “Half-breadth of the deck edge”; look whether this is the right sheet and its row of headings.",
  ]);
});

test("names the cells of words, of a negative half-breadth and of a label that is no number, whichever way the table stands", () => {
  const bad = grid.map((row, i) => row.map((cell, j) => (i === 3 && j === 2 ? "4.5m" : i === 4 && j === 3 ? -2 : cell)));
  expect(sentences(bad)).toEqual([
    "Sheet “Offsets”, cell C4: “4.5m” is not a number (Half-breadth).",
    "Sheet “Offsets”, cell D5: −2 is not 0 or more (Half-breadth).",
  ]);
  expect(sentences(turned(bad)).map((sentence) => /cell (\w+)/.exec(sentence)?.[1])).toEqual(["C3", "D4"]);
  expect(sentences([...grid, ["mid", 1, 1, 1, 1]])).toEqual(["Sheet “Offsets”, cell A6: “mid” is not a number (x of the section)."]);
});

test("takes lengths of thousands for millimetres", () => {
  const inMm = grid.map((row, i) => row.map((cell, j) => (typeof cell === "number" && i > 0 && (j > 0 || i === 1) ? cell * 1000 : cell)));
  expect(read(inMm)).toEqual({ ok: true, value: sections });
});
