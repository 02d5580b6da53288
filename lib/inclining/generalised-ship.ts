import { type ArmAt, armThrough, type BuoyancyArm, buoyancyArm } from "@/lib/hydrostatics/buoyancy-arm";
import { type Hull, hullFromOffsets } from "@/lib/hydrostatics/hull";
import { sum } from "@/lib/numerics/sum";
import { generalisedVcg, heelAtRest } from "./generalised-fit";
import type { AsInclined, MomentTangentLine } from "./inclined-ship";
import { armWithLiquids, beyondFreeSurface } from "./liquid-arm";
import type { Liquid } from "./liquids";
import type { ShipAfloat } from "./ship-afloat";
import type { HydrostaticSource, IncliningTestData } from "./test-data";
import type { Aboard } from "./test-plan";

/** The centre of gravity as inclined by the hull's own equilibrium, at the state of the draft round; solid. */
export type GeneralisedShip = { readonly vcg: number; readonly tcg: number };

/**
 * The generalised reduction beside the classical one: KG and TCG with which the hull's equilibrium under each move gives the
 * tangents that were observed. Any form of hull; nothing is assumed about wall sides or small heels.
 *
 *     KG = KG_fluid − FSC,   TCG = y_B − c₀·(KG_fluid − z_B)
 *
 * KG_fluid: see `generalisedVcg`; it belongs to the moves, and persons who were aboard only for the drafts or only for the
 * moves are brought to the draft round by their masses and heights. A weight that also moved in height acts by its share in
 * the moments of the line; one that moved along the ship trims her, and the hull's arm at that move is that of her new trim.
 * Liquids in boxes are followed by their own shape (`armWithLiquids`), others count by their free surface.
 * Null: hydrostatics by a table, which knows no other heel; a hull that finds no rest at some move.
 * Source: see `generalisedVcg`.
 */
export function generalisedShip(
  test: IncliningTestData,
  afloat: ShipAfloat,
  line: MomentTangentLine,
  { classical, liquids }: { readonly classical: AsInclined; readonly liquids: readonly Liquid[] },
): GeneralisedShip | null {
  const { tcb } = afloat.hydrostatics;
  if (test.hydrostatics.kind !== "offsets" || tcb === null) return null;
  const states = statesOf(test.aboard, classical.displacement);
  const fluid = classical.vcg + classical.freeSurfaceCorrection;
  const hulls = armsOver(test.hydrostatics, afloat, line, roundedTo(fluid, 0.1), states.displacementAtMoves);
  if (hulls === null) return null;
  const arms = withLiquids(hulls, liquids, { drafts: classical.displacement, moves: states.displacementAtMoves });
  const atDrafts = vcgAtDrafts(arms, afloat, line, { fluid, classical, states });
  if (atDrafts === null) return null;
  const { tanHeel } = afloat.waterline.plane;
  return { vcg: atDrafts - classical.freeSurfaceCorrection, tcg: arms.atDrafts.at(tanHeel).arm - tanHeel * atDrafts };
}

type States = {
  readonly displacementAtMoves: number;
  /** of those aboard only for the drafts, less those only for the moves: moments up and athwart [t·m] */
  readonly upward: number;
  readonly athwart: number;
};

function statesOf(aboard: readonly Aboard[], displacement: number): States {
  const sense = ({ during }: Aboard) => (during === "drafts" ? 1 : during === "moves" ? -1 : 0);
  return {
    displacementAtMoves: displacement - sum(aboard.map((entry) => sense(entry) * entry.mass)),
    upward: sum(aboard.map((entry) => sense(entry) * entry.mass * entry.z)),
    athwart: sum(aboard.map((entry) => sense(entry) * entry.mass * entry.y)),
  };
}

/** `alongMoves`: at the moves with her centre of gravity `alongBy` further forward; null where no weight went along the ship. */
type Arms = {
  readonly atDrafts: BuoyancyArm;
  readonly atMoves: BuoyancyArm;
  readonly alongMoves: BuoyancyArm | null;
  readonly alongBy: number;
};

function withLiquids(arms: Arms, liquids: readonly Liquid[], displacement: { drafts: number; moves: number }): Arms {
  const { atDrafts, atMoves, alongMoves, alongBy } = arms;
  const moments = beyondFreeSurface(
    liquids,
    atMoves.nodes.map(({ tanHeel }) => tanHeel),
  );
  return {
    atDrafts: armWithLiquids(atDrafts, moments, displacement.drafts),
    atMoves: armWithLiquids(atMoves, moments, displacement.moves),
    alongMoves: alongMoves && armWithLiquids(alongMoves, moments, displacement.moves),
    alongBy,
  };
}

/** The arm with the centre of gravity shifted along the ship: a small trim changes it in proportion. */
function armShifted({ atMoves, alongMoves, alongBy }: Arms, shift: number): BuoyancyArm {
  if (alongMoves === null || shift === 0) return atMoves;
  const share = shift / alongBy;
  return armThrough(
    atMoves.nodes.map(({ tanHeel, arm, slope }, i) => {
      const there = alongMoves.nodes[i] as ArmAt;
      return { tanHeel, arm: arm + share * (there.arm - arm), slope: slope + share * (there.slope - slope) };
    }),
  );
}

type Given = { readonly fluid: number; readonly classical: AsInclined; readonly states: States };

/** Fluid KG at the draft round; the heel at zero of the moves follows from it and is found together with it. */
function vcgAtDrafts(arms: Arms, afloat: ShipAfloat, line: MomentTangentLine, { fluid, classical, states }: Given): number | null {
  const { tanHeel } = afloat.waterline.plane;
  const displacement = states.displacementAtMoves;
  const alongOf = (session: number, no: number) => line.moves.find((move) => move.no === no && move.session === session)?.along ?? 0;
  const series = line.stations.map(({ session, commonResiduals }) =>
    commonResiduals.map((point) => ({ ...point, arm: armShifted(arms, alongOf(session, point.move) / displacement) })),
  );
  const isSame = displacement === classical.displacement && states.upward === 0 && states.athwart === 0;
  let tanHeelAtZero = tanHeel;
  let found = fluid;
  for (let pass = 0; pass < (isSame ? 1 : 4); pass++) {
    const atMoves = generalisedVcg({ arm: arms.atMoves, displacement, tanHeelAtZero }, series, found);
    if (!atMoves.ok) return null;
    found = (displacement * atMoves.value + states.upward) / classical.displacement;
    const tcgAtDrafts = arms.atDrafts.at(tanHeel).arm - found * tanHeel;
    const tcgAtMoves = (classical.displacement * tcgAtDrafts - states.athwart) / displacement;
    const zero = isSame ? tanHeel : heelAtRest(arms.atMoves, atMoves.value, tcgAtMoves, tanHeel);
    if (zero === null) return null;
    tanHeelAtZero = zero;
  }
  return found;
}

const nodes = 9;
const step = Math.tan((0.25 * Math.PI) / 180);

/** All heels of the test, outwards to the next quarter of a degree. */
function heelsOf({ waterline }: ShipAfloat, { moves }: MomentTangentLine): readonly [number, number] {
  const heels = [0, ...moves.map(({ tanHeel }) => tanHeel)].map((change) => waterline.plane.tanHeel + change);
  return [Math.floor(Math.min(...heels) / step - 0.5) * step, Math.ceil(Math.max(...heels) / step + 0.5) * step];
}

type Offsets = Extract<HydrostaticSource, { kind: "offsets" }>;

/**
 * The arms at the displacement of the drafts and of the moves. LCG is such that the measured waterplane is in balance; the KG
 * that shares in the trim's balance may be a decimetre off, which no heel of a test can show.
 */
function armsOver(offsets: Offsets, afloat: ShipAfloat, line: MomentTangentLine, vcg: number, displacementAtMoves: number): Arms | null {
  const { waterline, hydrostatics, water } = afloat;
  const [from, to] = heelsOf(afloat, line);
  const hull = hullOf(offsets);
  if (hull === null) return null;
  const { plane } = waterline;
  const lcg = hydrostatics.lcb - plane.slopeAlong * (vcg - hydrostatics.vcb);
  const held = { lbp: plane.lbp, sag: plane.sag, guess: plane, vcg };
  const armAt = (volume: number, shift = 0) =>
    remembered(offsets, [volume, from, to, lcg + shift, vcg, plane.sag], () => {
      const arm = buoyancyArm(hull, { ...held, volume, lcg: lcg + shift }, from, to, nodes);
      return arm.ok ? arm.value : null;
    });
  const alongBy = 0.01 * plane.lbp;
  const goAlong = line.moves.some(({ along }) => Math.abs(along) > 1e-6 * displacementAtMoves * plane.lbp);
  const atDrafts = armAt(hydrostatics.volume);
  const atMoves = armAt(displacementAtMoves / water.density);
  const alongMoves = goAlong ? armAt(displacementAtMoves / water.density, alongBy) : null;
  if (!atDrafts || !atMoves || (goAlong && !alongMoves)) return null;
  return { atDrafts, atMoves, alongMoves, alongBy };
}

/** What was worked out for the same hull and numbers before: an analysis asks hundreds of times, mostly for the same. */
const worked = new WeakMap<Offsets, { hull: Hull | null; arms: Map<string, BuoyancyArm | null> }>();
const mostRemembered = 64;

function of(offsets: Offsets) {
  const known = worked.get(offsets);
  if (known) return known;
  const hull = hullFromOffsets(offsets);
  const made = { hull: hull.ok ? hull.value : null, arms: new Map<string, BuoyancyArm | null>() };
  worked.set(offsets, made);
  return made;
}

function hullOf(offsets: Offsets): Hull | null {
  return of(offsets).hull;
}

function remembered(offsets: Offsets, numbers: readonly number[], work: () => BuoyancyArm | null): BuoyancyArm | null {
  const { arms } = of(offsets);
  const key = numbers.join(" ");
  const known = arms.get(key);
  if (known !== undefined) return known;
  if (arms.size >= mostRemembered) arms.clear();
  const made = work();
  arms.set(key, made);
  return made;
}

function roundedTo(value: number, unit: number): number {
  return Math.round(value / unit) * unit;
}
