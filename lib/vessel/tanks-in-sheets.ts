import { tankContents } from "@/lib/hydrostatics/tank";
import { type Faults, refuseFaults } from "@/lib/inclining/faults";
import type { TestRecord } from "@/lib/record/test-record";
import { answer, type Result } from "@/lib/result";
import { cellName, type Sheet } from "@/lib/spreadsheet/sheet";
import { outOfOrder, repeatedRows } from "./row-order";
import type { SheetFault } from "./sheet-faults";
import type { Field, Reading } from "./sheet-field";
import { type SheetMapping, type SheetRow, sheetRows } from "./sheet-rows";

export type VesselTank = TestRecord["tanks"][number];
export type TankSheet = { readonly sheet: Sheet; readonly mapping: SheetMapping };

/** The columns of a table of tanks; the sheet's name is the tank's where no column names it. */
export const tankFields: readonly Field[] = [
  { key: "tank", label: "Tank", quantity: "words", headings: /^(tank|tank (name|id|no)|compartment|name)$/, isOptional: true },
  { key: "contents", label: "Contents", quantity: "words", headings: /^(contents?|liquid|fluid)$/, isOptional: true },
  {
    key: "density",
    label: "Density",
    quantity: "density",
    headings: /^(density|sg|s g|rho|specific gravity)$/,
    isOptional: true,
    limit: "above 0",
  },
  { key: "trim", label: "Trim", quantity: "length", headings: /^trim/, axis: "trim", isOptional: true },
  {
    key: "level",
    label: "Sounding or ullage",
    quantity: "length",
    headings: /^(sounding|sound|snd|ullage|ull|level|depth|height)s?( .*)?$/,
    limit: "0 or more",
  },
  { key: "volume", label: "Volume", quantity: "volume", headings: /^(v|vol|volume|capacity|cap)( .*)?$/, limit: "0 or more" },
  { key: "lcg", label: "LCG", quantity: "length", headings: /^(lcg|xg|x g|x|longitudinal cent(re|er) of gravity)( .*)?$/, axis: "along" },
  { key: "tcg", label: "TCG", quantity: "length", headings: /^(tcg|yg|y g|y|transverse cent(re|er) of gravity)( .*)?$/, axis: "athwart" },
  { key: "vcg", label: "VCG", quantity: "length", headings: /^(vcg|zg|z g|z|vertical cent(re|er) of gravity)( .*)?$/ },
  {
    key: "inertia",
    label: "Second moment athwart",
    quantity: "inertia",
    headings:
      /^(i|it|i t|ixx|inertia|fsm|fs moment|free surface.*|second moment|moment of inertia|(transverse )?(second )?moment.*|inertia (t|trans.*))$/,
    limit: "0 or more",
  },
  {
    key: "inertiaLongitudinal",
    label: "Second moment along",
    quantity: "inertia",
    headings: /^(il|i l|iyy|inertia (l|long.*)|longitudinal (second )?(moment|inertia).*)$/,
    isOptional: true,
    limit: "0 or more",
  },
];

/**
 * The tanks of a workbook, each with its table, or every cell that can't be right: what `sheetRows` refuses, levels that go
 * back, a volume that goes against them, one level twice, a tank whose free surface can't be known.
 * A tank whose rows run over several sheets, or stand in two places of one, is one tank.
 */
export function tanksInSheets(
  sheets: readonly TankSheet[],
  measure: VesselTank["measure"],
  reading: Reading,
): Result<VesselTank[], Faults> {
  const read = sheets.map(({ sheet, mapping }) => ({ sheet, mapping, ...sheetRows(sheet, mapping, tankFields, reading) }));
  const faults = read.flatMap((each) => [...each.faults, ...rowsMissing(each.sheet, each.mapping, each.rows.length + each.faults.length)]);
  const tanks = read.flatMap(({ sheet, rows }) => [...byTank(sheet, rows)].map(([id, own]) => ({ id, sheet: sheet.name, rows: own })));
  const twice = tanks.flatMap((tank, i) => inTwoSheets(tank, tanks.slice(0, i)));
  const all = [...faults, ...twice, ...tanks.flatMap((tank) => faultsOfTank(tank, measure))];
  if (all.length > 0) return refuseFaults(all);
  const made = tanks.map(({ id, rows }) => tankOf(id, rows, measure));
  const unknown = tanks.flatMap((tank, i) => surfaceUnknown(tank, made[i] as VesselTank));
  return unknown.length > 0 ? refuseFaults(unknown) : answer(made);
}

type RowsOfTank = { readonly id: string; readonly sheet: string; readonly rows: readonly SheetRow[] };

function rowsMissing({ name }: Sheet, { firstRow }: SheetMapping, got: number): SheetFault[] {
  return got > 0 ? [] : [{ type: "RowsMissing", sheet: name, cell: cellName(Math.max(firstRow, 0), 0), got, needed: 1 }];
}

// a name that stands in the first row of a tank only holds for those below it
function byTank(sheet: Sheet, rows: readonly SheetRow[]): Map<string, SheetRow[]> {
  const tanks = new Map<string, SheetRow[]>();
  let current = sheet.name;
  for (const row of rows) {
    current = row.words.tank ?? current;
    tanks.set(current, [...(tanks.get(current) ?? []), row]);
  }
  return tanks;
}

function inTwoSheets({ id, sheet, rows }: RowsOfTank, before: readonly RowsOfTank[]): SheetFault[] {
  const first = before.find((tank) => tank.id === id);
  if (!first) return [];
  const where = `${first.sheet}, ${first.rows[0]?.cellOf("level")}`;
  return [{ type: "RepeatedInSheet", sheet, cell: rows[0]?.cellOf("level") ?? "A1", what: `tank ${id}`, first: where }];
}

function faultsOfTank({ sheet, rows }: RowsOfTank, measure: VesselTank["measure"]): SheetFault[] {
  const trims = [...new Set(rows.map(({ numbers }) => numbers.trim ?? 0))];
  return trims.flatMap((trim) => {
    const own = rows.filter(({ numbers }) => (numbers.trim ?? 0) === trim);
    const twice = repeatedRows(sheet, own, ["level"], "level");
    const order = isListedDownwards(own) ? "fall" : "rise";
    const levels = outOfOrder(sheet, own, { key: "level", column: "Sounding or ullage", order, mayStay: true });
    const fills = (order === "rise") === (measure === "sounding") ? "rise" : "fall";
    const volumes = levels.length > 0 ? [] : outOfOrder(sheet, own, { key: "volume", column: "Volume", order: fills, mayStay: true });
    return [...levels, ...twice, ...volumes];
  });
}

// most steps say which way a table is listed; the others are its faults
function isListedDownwards(rows: readonly SheetRow[]): boolean {
  const steps = rows.slice(1).map(({ numbers }, i) => Math.sign((numbers.level ?? 0) - (rows[i]?.numbers.level ?? 0)));
  return steps.reduce((sum, step) => sum + step, 0) < 0;
}

function tankOf(id: string, rows: readonly SheetRow[], measure: VesselTank["measure"]): VesselTank {
  const first = rows.find(({ numbers, words }) => words.contents !== undefined || numbers.density !== undefined);
  return {
    id,
    contents: rows.find(({ words }) => words.contents !== undefined)?.words.contents ?? "not said",
    density: first?.numbers.density ?? 1,
    measure,
    table: rows.map(({ numbers }) => levelOf(numbers)),
  };
}

function levelOf(numbers: SheetRow["numbers"]): VesselTank["table"][number] {
  const { trim, level = 0, volume = 0, lcg = 0, tcg = 0, vcg = 0, inertia = 0, inertiaLongitudinal } = numbers;
  return {
    ...(trim === undefined ? {} : { trim }),
    level,
    volume,
    lcg,
    tcg,
    vcg,
    inertia,
    ...(inertiaLongitudinal === undefined ? {} : { inertiaLongitudinal }),
  };
}

function surfaceUnknown({ sheet, rows }: RowsOfTank, tank: VesselTank): SheetFault[] {
  const [low, high] = [tank.table[0], tank.table[1]];
  if (!low || !high) return [];
  const attitude = { trim: low.trim ?? 0, tanHeel: 0, lbp: 1 };
  const contents = tankContents(tank, (low.level + high.level) / 2, attitude);
  if (contents.ok || contents.refusal.type !== "FreeSurfaceUnknown") return [];
  return [{ type: "TankInSheet", sheet, cell: rows[0]?.cellOf("inertia") ?? "A1", because: contents.refusal }];
}
