import { between, type PlaceInTable, placeInTable } from "@/lib/numerics/interpolation";
import { answer, type Result, refuse } from "@/lib/result";

/** One line of the ship's hydrostatic particulars; draft at midships, volume complete with shell and appendages. */
export type HydrostaticRow = {
  readonly trim: number;
  readonly draft: number;
  readonly volume: number;
  readonly lcb: number;
  readonly vcb: number;
  readonly lcf: number;
  readonly waterplaneArea: number;
  readonly kmt: number;
  readonly kml: number;
};

/** Rows of one trim, draft ascending. */
export type TrimTable = { readonly trim: number; readonly rows: readonly HydrostaticRow[] };

export type TableLimit = {
  readonly type: "OutsideHydrostaticTable";
  readonly quantity: "draft" | "trim";
  readonly value: number;
  readonly lowest: number;
  readonly highest: number;
};

/** A table's rows sorted by trim, and by draft within each trim. */
export function tablesByTrim(rows: readonly HydrostaticRow[]): readonly TrimTable[] {
  const trims = [...new Set(rows.map(({ trim }) => trim))].sort((a, b) => a - b);
  return trims.map((trim) => ({ trim, rows: rows.filter((row) => row.trim === trim).sort((a, b) => a.draft - b.draft) }));
}

/** The row at a draft, linear between its neighbours. Refuses drafts outside the table, with its limits. */
export function rowAtDraft({ rows }: TrimTable, draft: number): Result<HydrostaticRow, TableLimit> {
  const place = placeInTable(
    rows.map((row) => row.draft),
    draft,
  );
  if (!place.ok) return refuse({ ...place.refusal, type: "OutsideHydrostaticTable", quantity: "draft" });
  const [low, high] = neighbours(rows, place.value);
  return answer({ ...rowBetween(low, high, place.value.fraction), draft });
}

/** The row at a draft and trim, linear in both. Refuses what lies outside the table, with its limits. */
export function rowBetweenTrims(tables: readonly TrimTable[], draft: number, trim: number): Result<HydrostaticRow, TableLimit> {
  const place = placeInTable(
    tables.map((table) => table.trim),
    trim,
  );
  if (!place.ok) return refuse({ ...place.refusal, type: "OutsideHydrostaticTable", quantity: "trim" });
  const [lowTable, highTable] = neighbours(tables, place.value);
  const low = rowAtDraft(lowTable, draft);
  if (!low.ok) return low;
  const high = place.value.fraction === 0 ? low : rowAtDraft(highTable, draft);
  return high.ok ? answer(rowBetween(low.value, high.value, place.value.fraction)) : high;
}

function neighbours<T>(rows: readonly T[], { index }: PlaceInTable): readonly [T, T] {
  const low = rows[index] as T;
  return [low, rows[index + 1] ?? low];
}

function rowBetween(low: HydrostaticRow, high: HydrostaticRow, fraction: number): HydrostaticRow {
  const at = (column: keyof HydrostaticRow) => between(low[column], high[column], fraction);
  return {
    trim: at("trim"),
    draft: at("draft"),
    volume: at("volume"),
    lcb: at("lcb"),
    vcb: at("vcb"),
    lcf: at("lcf"),
    waterplaneArea: at("waterplaneArea"),
    kmt: at("kmt"),
    kml: at("kml"),
  };
}
