import { trimOf, waterplaneHeight } from "@/lib/frame";
import { answer, type Result, refuse } from "@/lib/result";
import { type HydrostaticRow, rowBetweenTrims, type TableLimit, type TrimTable, tablesByTrim } from "./hydrostatic-row";
import { atOtherTrim } from "./trim-correction";
import type { Waterline } from "./waterline";

export type HydrostaticTable = {
  readonly rows: readonly HydrostaticRow[];
  /** share of the sag that counts in the mean draft; ¾ where left out, ⅔ is exact for a parabola on a rectangular waterplane */
  readonly sagFraction?: number;
};

/** Hydrostatics at the measured waterline from a table; centres as the ship lies, metacentres local to its list and trim. */
export type TableHydrostatics = {
  readonly volume: number;
  readonly lcb: number;
  readonly vcb: number;
  readonly lcf: number;
  readonly waterplaneArea: number;
  readonly bmt: number;
  readonly bml: number;
  readonly kmt: number;
  readonly kml: number;
  /** draft the table was entered with */
  readonly draft: number;
  /** volume by the second trim correction [m³]; null where the table itself has several trims */
  readonly trimVolume: number | null;
};

export type TableRefusal =
  | TableLimit
  | { readonly type: "EmptyHydrostaticTable"; readonly rows: number }
  | { readonly type: "RepeatedDraft"; readonly draft: number; readonly trim: number };

/**
 * Volume, centres and metacentres at a waterline by the ship's own table, never beyond its limits.
 *
 * Several trims: linear in the draft at midships (with the sag's share) and in trim. One trim: `atOtherTrim` corrects for
 * what the ship's trim differs from it. Then the list, BM being that of the waterplane projected on the base plane:
 *
 *     z_B = KB + ½·BM·c²,   KM_T = z_B + BM·(1 + c²)
 *
 * exact for upright sides, and right to c² for others as far as BM itself does not change.
 * The athwartships centre of buoyancy is not known from a table.
 * Refuses drafts and trims outside the table with its limits, and two rows at one draft and trim.
 *
 * Source: dz_B/dc = c·BM, from the wedges of immersion and emersion; sag's share ¾: UN/ECE code of uniform standards for
 * draught surveys, ECE/ENERGY/19 (1992) (from memory).
 */
export function tableHydrostatics(table: HydrostaticTable, waterline: Pick<Waterline, "plane">): Result<TableHydrostatics, TableRefusal> {
  const tables = tablesByTrim(table.rows);
  const fault = faultOf(tables);
  if (fault) return refuse(fault);
  const { plane } = waterline;
  const draft = waterplaneHeight({ ...plane, sag: 0 }, plane.lbp / 2, 0) + (table.sagFraction ?? 0.75) * plane.sag;
  const upright = uprightAt(tables, { lbp: plane.lbp, draft, trim: trimOf(plane) });
  return upright.ok ? answer(listed(upright.value, plane.tanHeel)) : upright;
}

/** The row for a ship upright, and what its trim added to the volume. */
type Upright = { readonly row: HydrostaticRow; readonly trimVolume: number | null };

function faultOf(tables: readonly TrimTable[]): TableRefusal | null {
  if (tables.length === 0) return { type: "EmptyHydrostaticTable", rows: 0 };
  const twice = tables.flatMap(({ rows }) => rows.filter((row, i) => row.draft === rows[i + 1]?.draft))[0];
  return twice ? { type: "RepeatedDraft", draft: twice.draft, trim: twice.trim } : null;
}

function uprightAt(
  tables: readonly TrimTable[],
  at: { readonly lbp: number; readonly draft: number; readonly trim: number },
): Result<Upright, TableRefusal> {
  const [only, ...others] = tables;
  if (only && others.length === 0) return atOtherTrim(only, at);
  const row = rowBetweenTrims(tables, at.draft, at.trim);
  return row.ok ? answer({ row: row.value, trimVolume: null }) : row;
}

function listed({ row, trimVolume }: Upright, tanHeel: number): TableHydrostatics {
  const bmt = row.kmt - row.vcb;
  const bml = row.kml - row.vcb;
  const vcb = row.vcb + (bmt * tanHeel ** 2) / 2;
  return {
    volume: row.volume,
    lcb: row.lcb,
    vcb,
    lcf: row.lcf,
    waterplaneArea: row.waterplaneArea,
    bmt,
    bml,
    kmt: vcb + bmt * (1 + tanHeel ** 2),
    kml: vcb + bml,
    draft: row.draft,
    trimVolume,
  };
}
