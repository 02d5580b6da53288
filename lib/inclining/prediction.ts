import { buoyancyArm } from "@/lib/hydrostatics/buoyancy-arm";
import { equilibrium } from "@/lib/hydrostatics/equilibrium";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { sum } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";
import { heelAtRest } from "./generalised-fit";
import type { NoReferenceMove } from "./shift-moments";
import type { IncliningTestData } from "./test-data";
import type { Move, Station } from "./test-plan";

/** The ship as she is expected to be inclined: tonnes, metres, t/m³; KG fluid. */
export type ExpectedShip = {
  readonly displacement: number;
  readonly lcg: number;
  readonly tcg: number;
  readonly vcg: number;
  readonly density: number;
};

/** What a move should show. */
export type PredictedMove = {
  readonly no: number;
  /** against move 0 [t·m] */
  readonly moment: number;
  /** change of heel against move 0 */
  readonly tanHeel: number;
  /** on each batten against its zero; the difference of the legs' levels for a U-tube; null for an inclinometer [mm] */
  readonly deflectionsMm: Readonly<Record<string, number | null>>;
};

export type NoOffsets = { readonly type: "NoOffsets"; readonly path: string };
export type NoRestExpected = { readonly type: "NoRestExpected"; readonly move: number; readonly vcg: number };

type Planned = Pick<IncliningTestData, "vessel" | "hydrostatics" | "weights" | "moves" | "stations">;

/**
 * What each move of a plan should show before anybody steps aboard, from the ship as she is expected to be.
 *
 * By the equilibrium of the hull where her offsets are there: f(c) − f(c₀) − KG·(c − c₀) = M/Δ, f(c) = y_B + c·z_B.
 * Deflection = length·(change of tan); of a U-tube span·(change of tan).
 * Refused: no move 0; a hull that does not float so; a ship that would find no rest. By a table see `predictedByGm`.
 * Source: equilibrium of a floating body, *common practice*.
 */
export function predictedMoves(plan: Planned, ship: ExpectedShip): Result<readonly PredictedMove[]> {
  const { hydrostatics, vessel } = plan;
  const zero = plan.moves.find(({ no }) => no === 0);
  if (!zero) return refuse({ type: "NoReferenceMove", path: "moves" } satisfies NoReferenceMove);
  if (hydrostatics.kind !== "offsets") return refuse({ type: "NoOffsets", path: "hydrostatics" } satisfies NoOffsets);
  const hull = hullFromOffsets(hydrostatics);
  if (!hull.ok) return hull;
  const rest = equilibrium(hull.value, ship, { lbp: vessel.lbp, density: ship.density });
  if (!rest.ok) return rest;
  const { plane, hydrostatics: at } = rest.value;
  const moments = plan.moves.map((move) => ({ move, moment: momentOf(plan, move, zero) }));
  const largest = Math.max(...moves(moments)) / (ship.displacement * (at.kmt - ship.vcg));
  const held = { lbp: vessel.lbp, guess: plane, volume: at.volume, lcg: ship.lcg, vcg: ship.vcg };
  const reach = 1.5 * largest + 0.01;
  const arm = buoyancyArm(hull.value, held, plane.tanHeel - reach, plane.tanHeel + reach, 13);
  if (!arm.ok) return arm;
  const found: PredictedMove[] = [];
  for (const { move, moment } of moments) {
    const tanHeel = heelAtRest(arm.value, ship.vcg, ship.tcg + moment / ship.displacement, plane.tanHeel);
    if (tanHeel === null) return refuse({ type: "NoRestExpected", move: move.no, vcg: ship.vcg } satisfies NoRestExpected);
    found.push(shown(plan, move.no, moment, tanHeel - plane.tanHeel));
  }
  return answer(found);
}

/**
 * The same from displacement and GM alone, tan(heel) = M/(Δ·GM): small heels of a ship with upright sides.
 * Refused: no move 0. Source: IMO 2008 IS Code, part B annex 1 *from memory*.
 */
export function predictedByGm(
  plan: Planned,
  { displacement, gmFluid }: { readonly displacement: number; readonly gmFluid: number },
): Result<readonly PredictedMove[], NoReferenceMove> {
  const zero = plan.moves.find(({ no }) => no === 0);
  if (!zero) return refuse({ type: "NoReferenceMove", path: "moves" });
  return answer(
    plan.moves.map((move) => {
      const moment = momentOf(plan, move, zero);
      return shown(plan, move.no, moment, moment / (displacement * gmFluid));
    }),
  );
}

function moves(moments: readonly { readonly moment: number }[]): number[] {
  return moments.map(({ moment }) => Math.abs(moment));
}

function momentOf({ weights }: Planned, move: Move, zero: Move): number {
  return sum(weights.map(({ id, mass }) => mass * ((move.positions[id]?.[1] ?? 0) - (zero.positions[id]?.[1] ?? 0))));
}

function shown({ stations }: Planned, no: number, moment: number, tanHeel: number): PredictedMove {
  return {
    no,
    moment,
    tanHeel,
    deflectionsMm: Object.fromEntries(stations.map((station) => [station.id, deflectionOf(station, tanHeel)])),
  };
}

function deflectionOf(station: Station, tanHeel: number): number | null {
  if (station.instrument === "inclinometer") return null;
  const metres = station.instrument === "pendulum" ? station.length : station.span;
  return (station.reversed ? -1000 : 1000) * metres * tanHeel;
}
