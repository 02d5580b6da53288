import type { EdgeCrossing } from "@/lib/hydrostatics/edges-in-the-water";
import type { Expectation, ExpectedMove } from "./expected-moves";

/** What is to be said of a plan before anybody steps aboard; `stop` until an engineer overrides it in writing. */
export type PlanCaution =
  | { readonly type: "GmSmall"; readonly stop: true; readonly gmFluid: number; readonly least: number }
  | { readonly type: "HeelTooLarge"; readonly stop: true; readonly move: number; readonly tanHeel: number; readonly mostDegrees: number }
  | { readonly type: "DeckEdgeInWater"; readonly stop: true; readonly move: number; readonly leastFreeboard: number }
  | { readonly type: "KnuckleInWater"; readonly stop: false; readonly crossings: readonly EdgeCrossing[] }
  | {
      readonly type: "HeelTooSmall";
      readonly stop: false;
      readonly side: "port" | "starboard";
      readonly tanHeel: number;
      readonly leastDegrees: number;
    }
  | {
      readonly type: "DeflectionTooSmall";
      readonly stop: false;
      readonly station: string;
      readonly deflectionMm: number;
      readonly leastMm: number;
    };

/**
 * Least GM at which a ship is inclined without a second thought [m]. Source: IMO 2008 IS Code, part A 2.2.4, from memory: it
 * speaks of ships in service, and serves here as a mark to stop and think.
 */
const leastGm = 0.15;
/** Largest and least heel to each side, least deflection to each side. Source: IMO 2008 IS Code, part B annex 1, from memory. */
const mostDegrees = 4;
const leastDegrees = 1;
const leastDeflectionMm = 150;

/** The cautions that a plan calls for, those that stop it first. */
export function planCautions({ gmFluid, moves, edges }: Expectation): readonly PlanCaution[] {
  const small: PlanCaution[] = gmFluid < leastGm ? [{ type: "GmSmall", stop: true, gmFluid, least: leastGm }] : [];
  const knuckles = edges.filter(({ kind }) => kind === "knuckle");
  return [
    ...small,
    ...moves.flatMap(tooLarge),
    ...moves.flatMap(deckEdge),
    ...(knuckles.length > 0 ? [{ type: "KnuckleInWater", stop: false, crossings: knuckles } as const] : []),
    ...tooSmall(moves),
    ...deflections(moves),
  ];
}

function tooLarge({ no, tanHeel }: ExpectedMove): PlanCaution[] {
  return Math.abs(tanHeel) > tangentOf(mostDegrees) ? [{ type: "HeelTooLarge", stop: true, move: no, tanHeel, mostDegrees }] : [];
}

function deckEdge({ no, leastFreeboard }: ExpectedMove): PlanCaution[] {
  const isIn = leastFreeboard !== null && leastFreeboard <= 0;
  return isIn ? [{ type: "DeckEdgeInWater", stop: true, move: no, leastFreeboard }] : [];
}

function tooSmall(moves: readonly ExpectedMove[]): PlanCaution[] {
  const heels = moves.map(({ tanHeel }) => tanHeel);
  const sides = [
    { side: "port" as const, tanHeel: Math.min(0, ...heels) },
    { side: "starboard" as const, tanHeel: Math.max(0, ...heels) },
  ];
  return sides.flatMap(({ side, tanHeel }): PlanCaution[] =>
    Math.abs(tanHeel) < tangentOf(leastDegrees) ? [{ type: "HeelTooSmall", stop: false, side, tanHeel, leastDegrees }] : [],
  );
}

// what counts is the smaller of a station's two sides
function deflections(moves: readonly ExpectedMove[]): PlanCaution[] {
  const stations = Object.keys(moves[0]?.deflectionsMm ?? {});
  return stations.flatMap((station): PlanCaution[] => {
    const shown = moves.flatMap(({ deflectionsMm }) => deflectionsMm[station] ?? []);
    if (shown.length === 0) return [];
    const deflectionMm = Math.min(Math.max(0, ...shown), Math.max(0, ...shown.map((each) => -each)));
    return deflectionMm < leastDeflectionMm
      ? [{ type: "DeflectionTooSmall", stop: false, station, deflectionMm, leastMm: leastDeflectionMm }]
      : [];
  });
}

function tangentOf(degrees: number): number {
  return Math.tan((degrees * Math.PI) / 180);
}
