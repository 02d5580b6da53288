import { slopeAlongFromTrim } from "@/lib/frame";
import type { Hull } from "@/lib/hydrostatics/hull";
import type { HydrostaticRow } from "@/lib/hydrostatics/hydrostatic-row";
import type { HydrostaticTable } from "@/lib/hydrostatics/hydrostatic-table";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { promised } from "@/lib/result";

/** The table that a yard would print for a hull: upright, at drafts amidships and trims. */
export function tableOf(hull: Hull, lbp: number, drafts: readonly number[], trims: readonly number[] = [0]): HydrostaticTable {
  return { rows: trims.flatMap((trim) => drafts.map((draft) => rowOf(hull, lbp, draft, trim))) };
}

function rowOf(hull: Hull, lbp: number, draft: number, trim: number): HydrostaticRow {
  const slopeAlong = slopeAlongFromTrim(trim, lbp);
  const plane = { draftAtAp: draft - (slopeAlong * lbp) / 2, slopeAlong, tanHeel: 0, sag: 0, lbp };
  const { volume, lcb, vcb, lcf, waterplaneArea, kmt, kml } = promised(hydrostaticsAt(hull, plane));
  return { trim, draft, volume, lcb, vcb, lcf, waterplaneArea, kmt, kml };
}
