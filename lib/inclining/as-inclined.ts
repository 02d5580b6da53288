import { sum } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";
import type { AsInclined, MomentTangentLine, MoveOnLine } from "./inclined-ship";
import type { Liquid } from "./liquids";
import { type ShipAfloat, waterAtFlotation } from "./ship-afloat";
import type { Aboard } from "./test-plan";

/** The tangent does not grow with the moment: no ship at rest does that. */
export type HeelAgainstMoment = { readonly type: "HeelAgainstMoment"; readonly slope: number };

/**
 * The ship as inclined, at the state of the draft round.
 *
 *     GM_fluid = (1/β + Σ_drafts m·(z_W − z) − Σ_moves m·(z_W − z)) / Δ
 *     FSC = Σ ρ·i/Δ,   GM_solid = GM_fluid + FSC,   KG = KM_T − GM_solid
 *     LCG = LCB − b·(KG_L − z_B),   KG_L = KG + Σ ρ·i_L/Δ
 *     TCG = y_B − c·(KG_fluid − z_B),   by a table TCG = c·GM_fluid
 *
 * β: slope of the line [1/(t·m)]; b = −trim/L, c = tan(heel) by the marks; ρ, i, i_L: density and second moments of each free
 * surface. Liquids are at the centres of their tables, level in the ship: the free surface acts along and athwart as well.
 * Persons aboard only for the drafts or only for the moves: 1/β belongs to the moves and Δ to the drafts. A weight m at z that
 * comes aboard changes the moment per tangent Δ·GM by m·(z_W − z), z_W the water's height at the centre of flotation, exactly
 * so where the sides are upright about the waterline; with it 1/β is brought to the draft round.
 * Refused: a line that does not rise.
 * Source: IMO 2008 IS Code, part B ch. 8 and annex 1 *from memory*; LCG and TCG from G on the line of buoyancy, *common practice*.
 */
export function asInclined(
  afloat: ShipAfloat,
  line: MomentTangentLine,
  liquids: readonly Liquid[],
  aboard: readonly Aboard[],
): Result<AsInclined, HeelAgainstMoment> {
  if (!(line.slope > 0)) return refuse({ type: "HeelAgainstMoment", slope: line.slope });
  const { displacement, kmt } = afloat.hydrostatics;
  const gmFluid = (1 / line.slope + broughtToDrafts(aboard, waterAtFlotation(afloat))) / displacement;
  const surfaces = freeSurfaceCorrection(liquids, displacement);
  const gmSolid = gmFluid + surfaces;
  const vcg = kmt - gmSolid;
  return answer({
    displacement,
    gmFluid,
    freeSurfaceCorrection: surfaces,
    gmSolid,
    vcg,
    lcg: lcgOf(afloat, vcg + longitudinalFreeSurface(liquids) / displacement),
    tcg: tcgOf(afloat, gmFluid),
  });
}

/**
 * What the free surfaces of slack tanks take from GM [m].
 *
 *     FSC = Σ ρ·i/Δ
 *
 * ρ: density of each liquid [t/m³]; i: second moment of its surface about its own fore-and-aft axis [m⁴].
 * Source: IMO 2008 IS Code, part B ch. 3 *from memory*.
 */
export function freeSurfaceCorrection(
  liquids: readonly { readonly density: number; readonly freeSurfaceInertia: number }[],
  displacement: number,
): number {
  return sum(liquids.map(({ density, freeSurfaceInertia }) => density * freeSurfaceInertia)) / displacement;
}

/**
 * GM of each single move against its zero, as the trade shows it beside the line; null under a tenth of the largest moment.
 *
 *     GM = M / (Δ·tan θ)
 *
 * Persons count as in `asInclined`.
 * Source: IMO 2008 IS Code, part B annex 1 *from memory*.
 */
export function gmOfMove(afloat: ShipAfloat, moves: readonly MoveOnLine[], aboard: readonly Aboard[], move: MoveOnLine): number | null {
  const largest = Math.max(...moves.map(({ moment }) => Math.abs(moment)));
  if (Math.abs(move.moment) < largest / 10 || move.moment === 0 || move.tanHeel === 0) return null;
  const perTangent = move.moment / move.tanHeel + broughtToDrafts(aboard, waterAtFlotation(afloat));
  return perTangent / afloat.hydrostatics.displacement;
}

/** GM_fluid of a line at a displacement that is known otherwise, such as the planned one while drafts are still due. */
export function gmFluidAt(displacement: number, line: MomentTangentLine): Result<number, HeelAgainstMoment> {
  return line.slope > 0 ? answer(1 / (line.slope * displacement)) : refuse({ type: "HeelAgainstMoment", slope: line.slope });
}

function broughtToDrafts(aboard: readonly Aboard[], waterHeight: number): number {
  return sum(aboard.map(({ during, mass, z }) => sense(during) * mass * (waterHeight - z)));
}

function sense(during: Aboard["during"]): number {
  if (during === "drafts") return 1;
  return during === "moves" ? -1 : 0;
}

function longitudinalFreeSurface(liquids: readonly Liquid[]): number {
  return sum(liquids.map(({ density, inertiaLongitudinal = 0 }) => density * inertiaLongitudinal));
}

function lcgOf({ waterline, hydrostatics }: ShipAfloat, vcgAlong: number): number {
  return hydrostatics.lcb - waterline.plane.slopeAlong * (vcgAlong - hydrostatics.vcb);
}

function tcgOf({ waterline, hydrostatics }: ShipAfloat, gmFluid: number): number {
  const { tanHeel } = waterline.plane;
  if (hydrostatics.tcb === null) return tanHeel * gmFluid;
  return hydrostatics.tcb - tanHeel * (hydrostatics.kmt - gmFluid - hydrostatics.vcb);
}
