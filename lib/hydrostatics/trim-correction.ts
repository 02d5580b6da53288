import { slopeAlongFromTrim } from "@/lib/frame";
import { answer, promised, type Result } from "@/lib/result";
import { type HydrostaticRow, rowAtDraft, type TableLimit, type TrimTable } from "./hydrostatic-row";

/**
 * The row of a table of one trim (even keel as a rule) for a ship upright at another trim.
 *
 * The table is entered with the draft at the centre of flotation; b = −(trim − table's trim)/L:
 *
 *     T = T_mid − b·(L/2 − LCF),   ΔV = ½·b²·dI_L/dT  with its sign,   I_L = V·(KM_L − KB)
 *     LCB = LCB_table + b·BM_L,    z_B = KB + ½·b²·BM_L,   KM_T and KM_L rise with z_B
 *
 * so that LCG = LCB − b·(KG − z_B) is the table's LCB + b·(KM_L − KG). dI_L/dT is taken over half a metre above and below, as far as
 * the table goes. Second order in trim: enough below about 1 % of the length.
 * Refuses drafts outside the table, with its limits.
 *
 * Source: UN/ECE code of uniform standards for draught surveys, ECE/ENERGY/19 (1992): first correction trim·LCF·TPC/L and second
 * 50·t²·dMCTC/L (from memory), here as exact geometry; z_B from the wedges of immersion and emersion.
 */
export function atOtherTrim(
  table: TrimTable,
  at: { readonly lbp: number; readonly draft: number; readonly trim: number },
): Result<{ readonly row: HydrostaticRow; readonly trimVolume: number }, TableLimit> {
  const slope = slopeAlongFromTrim(at.trim - table.trim, at.lbp);
  const found = rowAtFlotation(table, at.draft, at.lbp / 2, slope);
  if (!found.ok) return found;
  const row = found.value;
  const bml = row.kml - row.vcb;
  const rise = (slope ** 2 * bml) / 2;
  const trimVolume = (slope ** 2 * inertiaGrowth(table, row.draft)) / 2;
  return answer({
    row: {
      ...row,
      trim: at.trim,
      volume: row.volume + trimVolume,
      lcb: row.lcb + slope * bml,
      vcb: row.vcb + rise,
      kmt: row.kmt + rise,
      kml: row.kml + rise,
    },
    trimVolume,
  });
}

// LCF depends a little on the draft it serves to find: repeated until it no longer moves
function rowAtFlotation(table: TrimTable, draft: number, midships: number, slope: number): Result<HydrostaticRow, TableLimit> {
  let row = rowAtDraft(table, draft);
  for (let round = 0; row.ok && round < 20; round++) {
    const next = draft + slope * (row.value.lcf - midships);
    if (Math.abs(next - row.value.draft) < 1e-12) break;
    row = rowAtDraft(table, next);
  }
  return row;
}

// dI_L/dT [m³]; 0 where the table has one row
function inertiaGrowth(table: TrimTable, draft: number): number {
  const drafts = table.rows.map((row) => row.draft);
  const low = Math.max(draft - 0.5, Math.min(...drafts));
  const high = Math.min(draft + 0.5, Math.max(...drafts));
  return high > low ? (inertiaAt(table, high) - inertiaAt(table, low)) / (high - low) : 0;
}

function inertiaAt(table: TrimTable, draft: number): number {
  const { volume, kml, vcb } = promised(rowAtDraft(table, draft));
  return volume * (kml - vcb);
}
