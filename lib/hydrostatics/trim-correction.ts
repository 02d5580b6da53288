import { slopeAlongFromTrim } from "@/lib/frame";
import { interpolated } from "@/lib/numerics/interpolation";
import { answer, promised, type Result } from "@/lib/result";
import { type HydrostaticRow, rowAtDraft, type TableLimit, type TrimTable } from "./hydrostatic-row";

/**
 * The row of a table of one trim (even keel as a rule) for a ship upright at another trim.
 *
 * The table is entered with the draft at the centre of flotation; b = −trim/L, b₀ the same of the table's own trim:
 *
 *     T = T_mid − (b − b₀)·(L/2 − LCF),   ΔV = ½·(b − b₀)²·dI_L/dT  with its sign,   I_L = V·(KM_L − KB)
 *     LCB = LCB_table + (b − b₀)·BM_L,    z_B = KB + ½·(b² − b₀²)·BM_L + ΔV·(T − KB)/V
 *
 * so that LCG = LCB − b·(KG − z_B) is, on even keel's table, LCB_table + b·(KM_L − KG). KM_T and KM_L rise with z_B, BM is as
 * tabled. dI_L/dT is taken over half a metre above and below, as far as the table goes. Second order in trim: enough below
 * about 1 % of the length.
 * Refuses drafts outside the table, with its limits.
 *
 * Source: UN/ECE code of uniform standards for draught surveys, ECE/ENERGY/19 (1992): first correction trim·LCF·TPC/L and second
 * 50·t²·dMCTC/L (from memory), here as exact geometry; z_B from the wedges of immersion and emersion.
 */
export function atOtherTrim(
  table: TrimTable,
  at: { readonly lbp: number; readonly draft: number; readonly trim: number },
): Result<{ readonly row: HydrostaticRow; readonly trimVolume: number }, TableLimit> {
  const [slope, ownSlope] = [slopeAlongFromTrim(at.trim, at.lbp), slopeAlongFromTrim(table.trim, at.lbp)];
  const found = rowAtFlotation(table, at.draft, at.lbp / 2, slope - ownSlope);
  if (!found.ok) return found;
  const row = found.value;
  const bml = row.kml - row.vcb;
  const trimVolume = ((slope - ownSlope) ** 2 * inertiaGrowth(table, row.draft)) / 2;
  const rise = ((slope ** 2 - ownSlope ** 2) * bml) / 2 + (trimVolume * (row.draft - row.vcb)) / row.volume;
  return answer({
    row: {
      ...row,
      trim: at.trim,
      volume: row.volume + trimVolume,
      lcb: row.lcb + (slope - ownSlope) * bml,
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

// dI_L/dT [m³], I_L itself linear between the rows; 0 where the table has one row
function inertiaGrowth({ rows }: TrimTable, draft: number): number {
  const drafts = rows.map((row) => row.draft);
  const inertias = rows.map(({ volume, kml, vcb }) => volume * (kml - vcb));
  const low = Math.max(draft - 0.5, Math.min(...drafts));
  const high = Math.min(draft + 0.5, Math.max(...drafts));
  const [below, above] = [promised(interpolated(drafts, inertias, low)), promised(interpolated(drafts, inertias, high))];
  return high > low ? (above - below) / (high - low) : 0;
}
