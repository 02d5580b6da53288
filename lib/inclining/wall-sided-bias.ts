import { sum } from "@/lib/numerics/sum";
import type { MomentTangentLine } from "./inclined-ship";
import type { ShipAfloat } from "./ship-afloat";

/**
 * By how much the classical KG is low on a ship whose sides are upright at the waterline [m]: a straight line through a curve
 * that grows steeper with heel shows too much GM.
 *
 *     bias = ½·BM·Σ(c − c₀)⁴ / Σ(c − c₀)²,   BM = (KM_T − z_B)/(1 + c₀²)
 *
 * c − c₀: change of heel at each move. KM_T is taken at the measured list c₀, so that the list itself adds nothing. For the
 * pattern of eight moves to φ and half of it the sum is ½·BM·0.75·tan²φ.
 * Source: the wall-sided formula, y_B + c·z_B = (BM + z_B)·c + ½·BM·c³, *common practice*; derived here.
 */
export function wallSidedBias({ hydrostatics, waterline }: ShipAfloat, { moves }: MomentTangentLine): number {
  const bm = (hydrostatics.kmt - hydrostatics.vcb) / (1 + waterline.plane.tanHeel ** 2);
  const squares = sum(moves.map(({ tanHeel }) => tanHeel ** 2));
  return squares === 0 ? 0 : ((bm / 2) * sum(moves.map(({ tanHeel }) => tanHeel ** 4))) / squares;
}
