import type { HydrostaticTable } from "@/lib/hydrostatics/hydrostatic-table";
import { type Faults, refuseFaults } from "@/lib/inclining/faults";
import { answer, type Result } from "@/lib/result";
import { cellName, type Sheet } from "@/lib/spreadsheet/sheet";
import { outOfOrder, repeatedRows } from "./row-order";
import type { SheetFault } from "./sheet-faults";
import type { Field, Reading } from "./sheet-field";
import { type SheetMapping, type SheetRow, sheetRows } from "./sheet-rows";

/** The columns of a hydrostatic table. */
export const hydrostaticFields: readonly Field[] = [
  { key: "trim", label: "Trim", quantity: "length", headings: /^trim/, axis: "trim", isOptional: true },
  {
    key: "draft",
    label: "Draft",
    quantity: "length",
    headings: /^((mean|moulded|molded|midship|midships) )?(draft|draught|t|d|tm)( (at )?(midships?|amidships|moulded|mld|mean|t))?$/,
    limit: "above 0",
  },
  {
    key: "volume",
    label: "Volume",
    quantity: "volume",
    headings: /^(∇|v|vol|volume.*|displaced volume|displacement.*|disp.*|Δ)$/i,
    limit: "above 0",
  },
  { key: "lcb", label: "LCB", quantity: "length", headings: /^(lcb|xb|x b|longitudinal cent(re|er) of buoyancy)( .*)?$/, axis: "along" },
  { key: "vcb", label: "VCB (KB)", quantity: "length", headings: /^(vcb|kb|zb|z b|vertical cent(re|er) of buoyancy)( .*)?$/ },
  { key: "lcf", label: "LCF", quantity: "length", headings: /^(lcf|xf|x f|longitudinal cent(re|er) of flotation)( .*)?$/, axis: "along" },
  {
    key: "waterplaneArea",
    label: "Waterplane area",
    quantity: "area",
    headings: /^(awp|aw|wpa|wp area|water ?plane( area)?|tpc|tpi|(long )?tons per inch.*|tonnes per cm.*)( .*)?$/,
    limit: "above 0",
  },
  { key: "kmt", label: "KM transverse", quantity: "length", headings: /^(kmt|km|km t|tkm|km trans.*|transverse (km|metacent(re|er)).*)$/ },
  { key: "kml", label: "KM longitudinal", quantity: "length", headings: /^(kml|km l|lkm|km long.*|longitudinal (km|metacent(re|er)).*)$/ },
];

/**
 * The hydrostatic table in a sheet, or every cell that can't be right: what `sheetRows` refuses, two rows for one draft and
 * trim, a volume that does not grow with the draft, a metacentre that is not above the centre of buoyancy.
 * A sheet without a column for trim is for the trim 0.
 */
export function hydrostaticTableInSheet(sheet: Sheet, mapping: SheetMapping, reading: Reading): Result<HydrostaticTable, Faults> {
  const { rows, faults } = sheetRows(sheet, mapping, hydrostaticFields, reading);
  const all = [...faults, ...faultsOfTable(sheet, rows), ...tooFew(sheet, mapping, rows, faults)];
  if (all.length > 0) return refuseFaults(all);
  return answer({ rows: rows.map(({ numbers }) => hydrostaticRow(numbers)) });
}

function faultsOfTable({ name }: Sheet, rows: readonly SheetRow[]): SheetFault[] {
  const trims = [...new Set(rows.map(({ numbers }) => numbers.trim ?? 0))];
  return [
    ...repeatedRows(name, rows, ["trim", "draft"], "draft and trim"),
    ...trims.flatMap((trim) => {
      const byDraft = rows
        .filter(({ numbers }) => (numbers.trim ?? 0) === trim)
        .sort((a, b) => (a.numbers.draft as number) - (b.numbers.draft as number));
      return outOfOrder(name, byDraft, { key: "volume", column: "Volume", order: "rise" });
    }),
    ...rows.flatMap((row) => [
      ...notAboveBuoyancy(name, row, "kmt", "KM transverse"),
      ...notAboveBuoyancy(name, row, "kml", "KM longitudinal"),
    ]),
  ];
}

function notAboveBuoyancy(sheet: string, { numbers, cellOf }: SheetRow, key: string, column: string): SheetFault[] {
  const [value, than] = [numbers[key] as number, numbers.vcb as number];
  return value > than ? [] : [{ type: "NotAbove", sheet, cell: cellOf(key), column, value, other: "KB", than }];
}

function tooFew({ name }: Sheet, { firstRow }: SheetMapping, rows: readonly SheetRow[], faults: readonly SheetFault[]): SheetFault[] {
  if (rows.length >= 2 || faults.length > 0) return [];
  return [{ type: "RowsMissing", sheet: name, cell: cellName(Math.max(firstRow, 0), 0), got: rows.length, needed: 2 }];
}

function hydrostaticRow(numbers: SheetRow["numbers"]): HydrostaticTable["rows"][number] {
  const { trim = 0, draft = 0, volume = 0, lcb = 0, vcb = 0, lcf = 0, waterplaneArea = 0, kmt = 0, kml = 0 } = numbers;
  return { trim, draft, volume, lcb, vcb, lcf, waterplaneArea, kmt, kml };
}
