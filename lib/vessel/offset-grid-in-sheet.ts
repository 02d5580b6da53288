import type { OffsetSection } from "@/lib/hydrostatics/hull";
import type { Faults } from "@/lib/inclining/faults";
import type { Result } from "@/lib/result";
import { numberInCell } from "@/lib/spreadsheet/number-in-cell";
import { type Cell, cellAt, cellName, type Sheet } from "@/lib/spreadsheet/sheet";
import { type PlacedSection, soundSections } from "./offsets-in-sheet";
import type { SheetFault } from "./sheet-faults";
import { type Field, type Reading, valueInFrame } from "./sheet-field";

/**
 * A table of offsets as it is drawn up: half-breadths, with the heights of the waterlines along one edge and the places of the
 * sections along the other. Rows and columns are counted from 0.
 */
export type GridMapping = {
  /** what stands along the upper edge; the other stands down the left one */
  readonly across: "heights" | "sections";
  readonly labelRow: number;
  readonly labelColumn: number;
  readonly lastRow: number;
  readonly lastColumn: number;
  readonly units: { readonly along: string; readonly height: string; readonly halfBreadth: string };
};

/**
 * The sections in a table of offsets, or every cell that can't be right. An empty cell is a waterline that does not meet the
 * section. Beside waterlines there may be a line of words for the height of the keel, and two for the deck edge: its
 * half-breadth and its height, which end each section.
 */
export function offsetGridInSheet(sheet: Sheet, mapping: GridMapping, reading: Reading): Result<readonly OffsetSection[], Faults> {
  const faults: SheetFault[] = [];
  const view = viewOf(sheet, mapping, reading, faults);
  const lines = view.lines();
  faults.push(...halfADeck(sheet, mapping, lines));
  const sections = view.sections().map(({ x, index }) => sectionAt(view, lines, x, index));
  const kept = sections.filter(({ points }) => points.length > 0);
  return soundSections(sheet.name, kept, faults, cellName(mapping.labelRow, mapping.labelColumn));
}

type Line = { readonly index: number } & ({ readonly kind: "waterline"; readonly z: number } | { readonly kind: DeckOrKeel });
type DeckOrKeel = "keel" | "deck-height" | "deck-half-breadth";

/** The table as if heights stood across and sections down, whichever way it is written. */
type View = {
  readonly lines: () => readonly Line[];
  readonly sections: () => readonly { readonly x: number; readonly index: number }[];
  /** a length of the table, its fault noted; null where nothing or no number stands */
  readonly length: (section: number, line: number, what: "height" | "halfBreadth") => number | null;
  readonly nameOf: (section: number, line: number) => string;
};

function viewOf(sheet: Sheet, mapping: GridMapping, reading: Reading, faults: SheetFault[]): View {
  const { across, labelRow, labelColumn, lastRow, lastColumn, units } = mapping;
  const isAcross = across === "heights";
  const rows = Array.from({ length: Math.max(lastRow - labelRow, 0) }, (_, i) => labelRow + 1 + i);
  const columns = Array.from({ length: Math.max(lastColumn - labelColumn, 0) }, (_, i) => labelColumn + 1 + i);
  const placed = (section: number, line: number) => (isAcross ? ([section, line] as const) : ([line, section] as const));
  const labelOfSection = (index: number) => (isAcross ? ([index, labelColumn] as const) : ([labelRow, index] as const));
  const labelOfLine = (index: number) => (isAcross ? ([labelRow, index] as const) : ([index, labelColumn] as const));
  const numberAt = ([row, column]: readonly [number, number], field: Field, unit: string): number | null => {
    const read = numberInCell(cellAt(sheet, row, column), reading.mark);
    const place = { sheet: sheet.name, cell: cellName(row, column), column: field.label };
    if (!read.ok) faults.push({ ...read.refusal, ...place });
    if (!read.ok) return null;
    const value = valueInFrame(read.value, field, unit, reading);
    if (field.limit !== "0 or more" || value >= 0) return value;
    faults.push({ type: "OutOfLimits", ...place, value, limit: field.limit });
    return null;
  };
  const isEmpty = (label: readonly [number, number]) => cellAt(sheet, ...label) === null;
  return {
    lines: () =>
      (isAcross ? columns : rows).flatMap((index): Line[] => {
        const label = labelOfLine(index);
        const kind = lineInWords(cellAt(sheet, ...label));
        if (kind !== null) return [{ index, kind }];
        const z = isEmpty(label) ? null : numberAt(label, heightField, units.height);
        return z === null ? [] : [{ index, kind: "waterline", z }];
      }),
    sections: () =>
      (isAcross ? rows : columns).flatMap((index) => {
        const x = isEmpty(labelOfSection(index)) ? null : numberAt(labelOfSection(index), alongField, units.along);
        return x === null ? [] : [{ x, index }];
      }),
    length: (section, line, what) => {
      const place = placed(section, line);
      if (isEmpty(place)) return null;
      return what === "height" ? numberAt(place, heightField, units.height) : numberAt(place, breadthField, units.halfBreadth);
    },
    nameOf: (section, line) => cellName(...placed(section, line)),
  };
}

const alongField: Field = { key: "x", label: "x of the section", quantity: "length", headings: /./, axis: "along" };
const heightField: Field = { key: "z", label: "Height", quantity: "length", headings: /./ };
const breadthField: Field = { key: "halfBreadth", label: "Half-breadth", quantity: "length", headings: /./, limit: "0 or more" };

function lineInWords(label: Cell): DeckOrKeel | null {
  if (typeof label !== "string") return null;
  if (/keel|profile/i.test(label)) return "keel";
  if (!/deck|sheer/i.test(label)) return null;
  return /height|sheer|\bz\b/i.test(label) ? "deck-height" : "deck-half-breadth";
}

// an edge needs its breadth and its height: with one of them the deck would end at the centreline
function halfADeck(sheet: Sheet, { labelRow, labelColumn }: GridMapping, lines: readonly Line[]): SheetFault[] {
  const has = (kind: DeckOrKeel) => lines.some((line) => line.kind === kind);
  if (has("deck-height") === has("deck-half-breadth")) return [];
  const column = has("deck-height") ? "Half-breadth of the deck edge" : "Height of the deck edge";
  return [{ type: "ColumnMissing", sheet: sheet.name, cell: cellName(labelRow, labelColumn), column }];
}

// of points at one height the keel comes first and the deck edge last
const order: readonly Line["kind"][] = ["keel", "waterline", "deck-height"];

function sectionAt(view: View, lines: readonly Line[], x: number, section: number): PlacedSection {
  const found = lines.flatMap((line) => {
    if (line.kind === "deck-half-breadth") return [];
    const isBreadth = line.kind === "waterline";
    const value = view.length(section, line.index, isBreadth ? "halfBreadth" : "height");
    const point =
      line.kind === "waterline" ? ([value ?? 0, line.z] as const) : ([edgeBreadth(view, lines, line, section), value ?? 0] as const);
    return value === null ? [] : [{ point, cell: view.nameOf(section, line.index), kind: line.kind }];
  });
  const upwards = found.sort((a, b) => a.point[1] - b.point[1] || order.indexOf(a.kind) - order.indexOf(b.kind));
  return { x, points: upwards.map(({ point }) => point), cells: upwards.map(({ cell }) => cell) };
}

function edgeBreadth(view: View, lines: readonly Line[], line: Line, section: number): number {
  const breadths = lines.find(({ kind }) => kind === "deck-half-breadth");
  return line.kind === "deck-height" && breadths ? (view.length(section, breadths.index, "halfBreadth") ?? 0) : 0;
}
