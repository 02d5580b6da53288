import { type BuoyancyArm, buoyancyArm } from "@/lib/hydrostatics/buoyancy-arm";
import { type Hull, hullFromOffsets } from "@/lib/hydrostatics/hull";
import { sum } from "@/lib/numerics/sum";
import { generalisedVcg, heelAtRest } from "./generalised-fit";
import type { AsInclined, MomentTangentLine } from "./inclined-ship";
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
 * the moments of the line; the trim of a weight moved along the ship is left out (below 0.1 mm of KG for moves of 0.01·L).
 * Null: hydrostatics by a table, which knows no other heel; a hull that finds no rest at some move.
 * Source: see `generalisedVcg`.
 */
export function generalisedShip(
  test: IncliningTestData,
  afloat: ShipAfloat,
  line: MomentTangentLine,
  classical: AsInclined,
): GeneralisedShip | null {
  const { tcb, vcb } = afloat.hydrostatics;
  if (test.hydrostatics.kind !== "offsets" || tcb === null) return null;
  const states = statesOf(test.aboard, classical.displacement);
  const fluid = classical.vcg + classical.freeSurfaceCorrection;
  const arms = armsOver(test.hydrostatics, afloat, heelsOf(afloat, line), roundedTo(fluid, 0.1), states.displacementAtMoves);
  if (arms === null) return null;
  const atDrafts = vcgAtDrafts(arms, afloat, line, { fluid, classical, states });
  if (atDrafts === null) return null;
  const { tanHeel } = afloat.waterline.plane;
  return { vcg: atDrafts - classical.freeSurfaceCorrection, tcg: tcb - tanHeel * (atDrafts - vcb) };
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

type Arms = { readonly atDrafts: BuoyancyArm; readonly atMoves: BuoyancyArm };
type Given = { readonly fluid: number; readonly classical: AsInclined; readonly states: States };

/** Fluid KG at the draft round; the heel at zero of the moves follows from it and is found together with it. */
function vcgAtDrafts(arms: Arms, afloat: ShipAfloat, line: MomentTangentLine, { fluid, classical, states }: Given): number | null {
  const { tanHeel } = afloat.waterline.plane;
  const series = line.stations.map(({ commonResiduals }) => commonResiduals);
  const displacement = states.displacementAtMoves;
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
function armsOver(
  offsets: Offsets,
  { waterline, hydrostatics, water }: ShipAfloat,
  [from, to]: readonly [number, number],
  vcg: number,
  displacementAtMoves: number,
): Arms | null {
  const hull = hullOf(offsets);
  if (hull === null) return null;
  const { plane } = waterline;
  const lcg = hydrostatics.lcb - plane.slopeAlong * (vcg - hydrostatics.vcb);
  const held = { lbp: plane.lbp, sag: plane.sag, guess: plane, lcg, vcg };
  const armAt = (volume: number) =>
    remembered(offsets, [volume, from, to, lcg, vcg, plane.sag], () => {
      const arm = buoyancyArm(hull, { ...held, volume }, from, to, nodes);
      return arm.ok ? arm.value : null;
    });
  const atDrafts = armAt(hydrostatics.volume);
  const atMoves = armAt(displacementAtMoves / water.density);
  return atDrafts && atMoves ? { atDrafts, atMoves } : null;
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
