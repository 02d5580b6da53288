import { type Waterplane, waterplaneHeight } from "@/lib/frame";
import { type EdgeCrossing, edgesInTheWater } from "@/lib/hydrostatics/edges-in-the-water";
import { type EquilibriumRefusal, equilibrium } from "@/lib/hydrostatics/equilibrium";
import { hullFromOffsets, type Offsets } from "@/lib/hydrostatics/hull";
import { type HydrostaticTable, tableHydrostatics } from "@/lib/hydrostatics/hydrostatic-table";
import { rootBetween } from "@/lib/numerics/root";
import { answer, type Result, refuse } from "@/lib/result";
import { type ExpectedShip, type PredictedMove, predictedByGm, predictedMoves } from "./prediction";
import type { IncliningTestData } from "./test-data";

/** A move as it should show, with the least height of the deck edge above the water [m]; null where the hull is known by a table only. */
export type ExpectedMove = PredictedMove & { readonly leastFreeboard: number | null };

/** What a plan leads one to expect of a ship as she is thought to be. */
export type Expectation = {
  readonly by: "offsets" | "table";
  readonly gmFluid: number;
  readonly plane: Waterplane;
  readonly moves: readonly ExpectedMove[];
  /** edges that cross the water between the largest heels of the plan; empty by a table, which knows none */
  readonly edges: readonly EdgeCrossing[];
};

type Planned = Pick<IncliningTestData, "vessel" | "hydrostatics" | "weights" | "moves" | "stations">;

/**
 * Heel, deflections and freeboard of every move before the test. With offsets by the hull's equilibrium, with a table by the
 * table's KM_T on even keel at the expected volume and tan(heel) = M/(Δ·GM).
 *
 * Refused: what `predictedMoves`, `equilibrium` and the table refuse; a volume outside the table. GM below zero comes back as
 * it is by a table: the cautions stop such a plan.
 * Source: `predictedMoves`, `predictedByGm`.
 */
export function expectedMoves(plan: Planned, ship: ExpectedShip): Result<Expectation> {
  const { hydrostatics } = plan;
  return hydrostatics.kind === "offsets" ? byOffsets(plan, hydrostatics, ship) : byTable(plan, hydrostatics, ship);
}

function byOffsets(plan: Planned, offsets: Offsets, ship: ExpectedShip): Result<Expectation> {
  const hull = hullFromOffsets(offsets);
  if (!hull.ok) return hull;
  const rest = equilibrium(hull.value, ship, { lbp: plan.vessel.lbp, density: ship.density });
  if (!rest.ok) return rest;
  const predicted = predictedMoves(plan, ship);
  if (!predicted.ok) return predicted;
  const { plane, hydrostatics } = rest.value;
  const heels = predicted.value.map(({ tanHeel }) => plane.tanHeel + tanHeel);
  return answer({
    by: "offsets",
    gmFluid: hydrostatics.kmt - ship.vcg,
    plane,
    moves: predicted.value.map((move) => ({
      ...move,
      leastFreeboard: leastFreeboard(offsets, { ...plane, tanHeel: plane.tanHeel + move.tanHeel }),
    })),
    edges: edgesInTheWater(offsets, plane, [Math.min(...heels), Math.max(...heels)]),
  });
}

// the top of each section is its deck edge; sinkage with heel is left out, which is less than the square of the heel
function leastFreeboard({ sections }: Offsets, plane: Waterplane): number {
  const heights = sections.flatMap(({ x, points }) => {
    const [y, z] = points.at(-1) ?? [0, Number.POSITIVE_INFINITY];
    return [y, -y].map((side) => z - waterplaneHeight(plane, x, side));
  });
  return Math.min(...heights);
}

function byTable(plan: Planned, table: HydrostaticTable, ship: ExpectedShip): Result<Expectation> {
  const { lbp } = plan.vessel;
  const volume = ship.displacement / ship.density;
  const level = (draftAtAp: number): Waterplane => ({ draftAtAp, slopeAlong: 0, tanHeel: 0, sag: 0, lbp });
  const drafts = table.rows.map(({ draft }) => draft);
  const [shallow, deep] = [Math.min(...drafts), Math.max(...drafts)];
  const at = (draft: number) => tableHydrostatics(table, { plane: level(draft) });
  const [smallest, largest] = [at(shallow), at(deep)];
  if (!smallest.ok) return smallest;
  if (!largest.ok) return largest;
  const volumeAt = (draft: number) => {
    const found = at(draft);
    return found.ok ? found.value.volume : Number.NaN;
  };
  const draft = rootBetween((each) => volumeAt(each) - volume, shallow, deep, 1e-6);
  if (!draft.ok) {
    const [least, most] = [smallest.value.volume, largest.value.volume];
    return refuse({ type: "VolumeOutOfReach", volume, smallest: least, largest: most } satisfies EquilibriumRefusal);
  }
  const found = at(draft.value);
  if (!found.ok) return found;
  const gmFluid = found.value.kmt - ship.vcg;
  const moves = predictedByGm(plan, { displacement: ship.displacement, gmFluid });
  if (!moves.ok) return moves;
  return answer({
    by: "table",
    gmFluid,
    plane: level(draft.value),
    moves: moves.value.map((move) => ({ ...move, leastFreeboard: null })),
    edges: [],
  });
}
