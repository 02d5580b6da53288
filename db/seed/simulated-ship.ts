import type { Waterplane } from "@/lib/frame";
import { liquidInBox, type TankBox } from "@/lib/hydrostatics/box-liquid";
import { equilibrium } from "@/lib/hydrostatics/equilibrium";
import { type Hull, hullFromOffsets } from "@/lib/hydrostatics/hull";
import { type TankContents, tankContents } from "@/lib/hydrostatics/tank";
import { type Faults, gathered, refuseFaults } from "@/lib/inclining/faults";
import type { Lightship } from "@/lib/lightship/lightship";
import { centreOf, type Moments, minus, momentsOf, plus, total, type WeightItem } from "@/lib/lightship/weight-item";
import type { TestRecord } from "@/lib/record/test-record";
import { answer, type Result, refuse } from "@/lib/result";

/** What is true of a simulated ship, and what her readings are to find out. */
export type SimulatedTruth = {
  readonly lightship: Lightship;
  /** of the water around her, in vacuum [t/m³] */
  readonly waterDensity: number;
  /** sounding of each tank by its own table, at its centre [m] */
  readonly levels: Readonly<Record<string, number>>;
  /** of the hull girder at midships, positive when midships is deepest [m]; 0 where left out */
  readonly sag?: number;
};

/** A ship floating at rest with everything that a plan puts aboard. */
export type SimulatedShip = {
  readonly hull: Hull;
  readonly plan: TestRecord;
  readonly truth: SimulatedTruth;
  readonly liquids: readonly (TankContents & { readonly density: number; readonly box?: TankBox })[];
};

/**
 * A ship of known lightship, ready to be inclined by a plan. Needs offsets.
 * Refused: hydrostatics by a table; a hull, a tank or a level that can't be.
 */
export function simulatedShip(plan: TestRecord, truth: SimulatedTruth): Result<SimulatedShip, Faults> {
  if (plan.hydrostatics.kind !== "offsets") return refuseFaults([{ type: "NoOffsets", path: "hydrostatics" }]);
  const hull = hullFromOffsets(plan.hydrostatics);
  const upright = { trim: 0, tanHeel: 0, lbp: plan.vessel.lbp };
  const liquids = gathered(plan.tanks.map((tank) => contentsOf(tank, truth.levels[tank.id] ?? 0, upright)));
  if (!hull.ok) return refuseFaults([hull.refusal]);
  return liquids.ok ? answer({ hull: hull.value, plan, truth, liquids: liquids.value }) : liquids;
}

/**
 * The waterplane at which the ship rests at one move, persons aboard as for the drafts or for the moves.
 *
 * Full equilibrium of the hull: no metacentre is used. Liquids move with the surface by their second moments,
 *
 *     Δx = b·i_L/V,   Δy = c·i/V,   Δz = ½·(b²·i_L + c²·i)/V
 *
 * exact while the surface meets upright walls only; in a tank known as a box the athwart part is that of the clipped box.
 * Found together with the waterplane.
 * Refused: a move that is not in the plan; a ship that finds no rest.
 * Source: centroid of a liquid under a tilted surface, *common practice*.
 */
export function restAt(ship: SimulatedShip, move: number, during: "drafts" | "moves"): Result<Waterplane> {
  const positions = ship.plan.moves.findLast(({ no }) => no === move)?.positions;
  if (positions === undefined) return refuse({ type: "UnknownMove", move });
  const solid = solidWeights(ship, positions, during);
  const { lbp } = ship.plan.vessel;
  const sag = ship.truth.sag ?? 0;
  let plane: Waterplane = { draftAtAp: 0, slopeAlong: 0, tanHeel: 0, sag, lbp };
  for (let round = 0; round < 40; round++) {
    const { mass, ...centre } = centreOf(plus(solid, liquidsUnder(ship, plane)));
    const water = { lbp, sag, density: ship.truth.waterDensity, ...(round === 0 ? {} : { guess: plane }) };
    const rest = equilibrium(ship.hull, { displacement: mass, ...centre }, water);
    if (!rest.ok) return rest;
    const step = Math.abs(rest.value.plane.tanHeel - plane.tanHeel) + Math.abs(rest.value.plane.slopeAlong - plane.slopeAlong);
    plane = rest.value.plane;
    if (step < 1e-13) break;
  }
  return answer(plane);
}

type Positions = TestRecord["moves"][number]["positions"];

// the ship as she stands at the test: what is to go ashore is aboard, what is to come aboard is not
function solidWeights({ plan, truth }: SimulatedShip, positions: Positions, during: "drafts" | "moves"): Moments {
  const { displacement, lcg, tcg, vcg } = truth.lightship;
  const lightship = momentsOf({ mass: displacement, x: lcg, y: tcg, z: vcg });
  const weights = total(plan.weights.flatMap(({ id, mass }) => weightAt(mass, positions[id])));
  const persons = total(plan.aboard.filter((entry) => (entry.during ?? "both") === "both" || entry.during === during));
  return [lightship, weights, persons, ...plan.items.map(standingAtTest)].reduce(plus);
}

function weightAt(mass: number, place: Positions[string] | undefined): WeightItem[] {
  return place === undefined ? [] : [{ mass, x: place[0], y: place[1], z: place[2] }];
}

function standingAtTest(item: TestRecord["items"][number]): Moments {
  if (item.action === "deduct") return momentsOf(item);
  if (item.action === "add") return minus(total([]), momentsOf(item));
  return minus(momentsOf(item), momentsOf({ mass: item.mass, x: item.toX, y: item.toY, z: item.toZ }));
}

function liquidsUnder({ liquids }: SimulatedShip, { slopeAlong, tanHeel }: Waterplane): Moments {
  return total(
    liquids.map((liquid) => {
      const { mass, density, lcg, tcg, vcg, inertiaLongitudinal = 0 } = liquid;
      if (mass === 0) return { mass, x: lcg, y: tcg, z: vcg };
      // a shift of the centre times the mass is ρ·i·slope
      const along = (density * inertiaLongitudinal * slopeAlong) / mass;
      const [athwart, up] = tilted(liquid, tanHeel);
      return { mass, x: lcg + along, y: tcg + athwart, z: vcg + up + (along * slopeAlong) / 2 };
    }),
  );
}

function tilted({ box, volume, freeSurfaceInertia }: SimulatedShip["liquids"][number], tanHeel: number): readonly [number, number] {
  if (box === undefined || freeSurfaceInertia === 0) {
    const athwart = (freeSurfaceInertia * tanHeel) / volume;
    return [athwart, (athwart * tanHeel) / 2];
  }
  const [upright, now] = [liquidInBox(box, volume, 0), liquidInBox(box, volume, tanHeel)];
  return [now.tcg - upright.tcg, now.vcg - upright.vcg];
}

function contentsOf(tank: TestRecord["tanks"][number], level: number, attitude: Parameters<typeof tankContents>[2]) {
  const contents = tankContents(tank, level, attitude);
  if (!contents.ok) return contents;
  return answer({ ...contents.value, density: tank.density, ...(tank.box ? { box: tank.box } : {}) });
}
