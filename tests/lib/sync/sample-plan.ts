import type { DuePlan, Ordered } from "@/lib/sync/readings-due";

/** A plan with one of each: three instruments, three moves, a tank that stays and one whose ballast is shifted. */
export const samplePlan: DuePlan = {
  stations: [
    { id: "A", instrument: "pendulum", length: 4, series: [{ no: 2, length: 3.9 }] },
    { id: "U", instrument: "u-tube", span: 9 },
    { id: "I", instrument: "inclinometer" },
  ],
  moves: [
    { no: 0, positions: {} },
    { no: 1, positions: {}, repeat: 2 },
    { no: 2, positions: {} },
  ],
  draftMarks: [{ id: "AP", x: 0, y: -6, zero: 0 }],
  freeboardMarks: [{ id: "F1S", x: 30, y: 6, deckEdge: 5 }],
  tanks: [tank("FO1"), { ...tank("BW1"), shifts: true }],
  weights: [
    { id: "W1", mass: 10 },
    { id: "W2", mass: 10 },
  ],
  waterPlaces: [{ place: "midships", depth: 1 }],
  rounds: ["before", "after"],
};

export const nothingOrdered: Ordered = {
  repeats: new Map([
    [0, 1],
    [1, 2],
    [2, 1],
  ]),
  series: new Map([
    ["A", 2],
    ["U", 1],
    ["I", 1],
  ]),
};

function tank(id: string): DuePlan["tanks"][number] {
  const empty = { level: 0, volume: 0, lcg: 30, tcg: 0, vcg: 0, inertia: 0 };
  return { id, contents: "Fuel oil", density: 0.85, measure: "sounding", table: [empty] };
}
