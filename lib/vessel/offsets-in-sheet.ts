import { hullFromOffsets, type OffsetSection } from "@/lib/hydrostatics/hull";
import { type Faults, refuseFaults } from "@/lib/inclining/faults";
import { answer, type Result } from "@/lib/result";
import { cellName, type Sheet } from "@/lib/spreadsheet/sheet";
import type { SheetFault } from "./sheet-faults";
import type { Field, Reading } from "./sheet-field";
import { type SheetMapping, type SheetRow, sheetRows } from "./sheet-rows";

/** The columns of a list of offsets, a row for each point. */
export const offsetFields: readonly Field[] = [
  {
    key: "x",
    label: "x of the section",
    quantity: "length",
    headings: /^(x|station|section|sta|frame|ordinate)( (x|position|pos|at|from ap))?$/,
    axis: "along",
  },
  {
    key: "halfBreadth",
    label: "Half-breadth",
    quantity: "length",
    headings: /^(y|half ?breadth|halfbreadth|half width|offset|hb)$/,
    limit: "0 or more",
  },
  { key: "z", label: "Height z", quantity: "length", headings: /^(z|height|waterline|wl|height above (base ?line|base|keel))$/ },
];

/** A section with the cells of its points, so that what is wrong with it can be shown where it stands. */
export type PlacedSection = OffsetSection & { readonly cells: readonly string[] };

/**
 * The sections in a list of offsets, a row for each point from the keel to the deck edge, or every cell that can't be right:
 * what `sheetRows` refuses, a section whose rows stand in two places, and what the hull refuses of its sections.
 */
export function offsetsInSheet(sheet: Sheet, mapping: SheetMapping, reading: Reading): Result<readonly OffsetSection[], Faults> {
  const { rows, faults } = sheetRows(sheet, mapping, offsetFields, reading);
  const { sections, split } = sectionsOf(sheet.name, rows);
  const first = cellName(Math.max(mapping.firstRow, 0), 0);
  return soundSections(sheet.name, sections, [...faults, ...split], first);
}

/** The sections as a hull takes them, or the faults found before and those the hull finds, each at a cell. */
export function soundSections(
  sheet: string,
  sections: readonly PlacedSection[],
  found: readonly SheetFault[],
  firstCell: string,
): Result<readonly OffsetSection[], Faults> {
  const faults = found.length > 0 ? found : faultsOfHull(sheet, sections, firstCell);
  return faults.length > 0 ? refuseFaults(faults) : answer(sections.map(({ x, points }) => ({ x, points })));
}

function sectionsOf(sheet: string, rows: readonly SheetRow[]): { sections: PlacedSection[]; split: SheetFault[] } {
  const sections: { x: number; points: [number, number][]; cells: string[] }[] = [];
  const split: SheetFault[] = [];
  for (const { numbers, cellOf } of rows) {
    const { x = 0, halfBreadth = 0, z = 0 } = numbers;
    const current = sections.at(-1);
    const earlier = sections.find((section) => section.x === x);
    if (current?.x === x) {
      current.points.push([halfBreadth, z]);
      current.cells.push(cellOf("halfBreadth"));
    } else if (earlier) {
      split.push({ type: "SectionInTwoPlaces", sheet, cell: cellOf("x"), x, first: earlier.cells[0] as string });
    } else {
      sections.push({ x, points: [[halfBreadth, z]], cells: [cellOf("halfBreadth")] });
    }
  }
  return { sections, split };
}

// each section is asked for by itself, so that none hides behind another; then the hull as a whole
function faultsOfHull(sheet: string, sections: readonly PlacedSection[], firstCell: string): SheetFault[] {
  const own = sections.flatMap(({ x, points, cells }): SheetFault[] => {
    const alone = hullFromOffsets({
      sections: [
        { x, points },
        { x: x + 1, points },
      ],
    });
    if (alone.ok || alone.refusal.type === "HullWithoutVolume") return [];
    return [{ type: "HullInSheet", sheet, cell: cells[0] ?? firstCell, because: alone.refusal }];
  });
  const hull = own.length === 0 ? hullFromOffsets({ sections }) : null;
  if (!hull || hull.ok) return own;
  return [{ type: "HullInSheet", sheet, cell: sections[0]?.cells[0] ?? firstCell, because: hull.refusal }];
}
