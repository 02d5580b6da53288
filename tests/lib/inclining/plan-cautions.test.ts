import { expect, test } from "vitest";
import type { Expectation, ExpectedMove } from "@/lib/inclining/expected-moves";
import { planCautions } from "@/lib/inclining/plan-cautions";

const degrees = (each: number) => Math.tan((each * Math.PI) / 180);
const plane = { draftAtAp: 3, slopeAlong: 0, tanHeel: 0, sag: 0, lbp: 54 };

test("a plan of two degrees to each side with long pendulums calls for nothing", () => {
  expect(planCautions(planned([0, 2, -2]))).toEqual([]);
});

test("more than four degrees stops the plan, at the move that would do it", () => {
  const found = planCautions(planned([0, 2, -4.01]));
  expect(found).toMatchObject([{ type: "HeelTooLarge", stop: true, move: 2, mostDegrees: 4 }]);
  expect(planCautions(planned([0, 3.99, -3.99]))).toEqual([]);
});

test("a deck edge in the water and a GM that is small or negative stop the plan first", () => {
  const wet = { ...planned([0, 2, -2]), gmFluid: -0.1 };
  const moves = wet.moves.map((move, i) => ({ ...move, leastFreeboard: i === 1 ? -0.02 : 0.4 }));
  expect(planCautions({ ...wet, moves }).map(({ type, stop }) => [type, stop])).toEqual([
    ["GmSmall", true],
    ["DeckEdgeInWater", true],
  ]);
});

test("a knuckle that crosses the water is told, and does not stop the plan", () => {
  const knuckle = { kind: "knuckle", x: 20, side: "port", tanHeel: -0.02 } as const;
  const edge = { ...knuckle, kind: "deck-edge" } as const;
  expect(planCautions({ ...planned([0, 2, -2]), edges: [knuckle, edge] })).toEqual([
    { type: "KnuckleInWater", stop: false, crossings: [knuckle] },
  ]);
});

test("too little heel to one side and too short a pendulum are told apart", () => {
  const found = planCautions(planned([0, 2, -0.9]));
  expect(found).toMatchObject([
    { type: "HeelTooSmall", side: "port", leastDegrees: 1 },
    { type: "DeflectionTooSmall", station: "A", leastMm: 150 },
  ]);
});

/** Moves of these heels [degrees], one pendulum of 5 m. */
function planned(heels: readonly number[]): Expectation {
  const moves = heels.map((heel, no): ExpectedMove => {
    const tanHeel = degrees(heel);
    return { no, moment: 100 * heel, tanHeel, deflectionsMm: { A: 5000 * tanHeel, I: null }, leastFreeboard: 0.5 };
  });
  return { by: "offsets", gmFluid: 1, plane, moves, edges: [] };
}
