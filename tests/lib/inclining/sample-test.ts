import type { IncliningTestData } from "@/lib/inclining/test-data";
import type { BattenReading } from "@/lib/inclining/test-readings";

/**
 * A barge of 60 × 12 m at 2 m in water of 1 t/m³ on even keel: Δ 1440 t, KMt 1 + 6 = 7 m. Two weights of 10 t.
 * Stations read the tangents given to `battens`; by default 1/5000 per t·m, GM_fluid 5000/1440 m.
 */
export function sampleTest(changes: Partial<IncliningTestData> = {}): IncliningTestData {
  return {
    vessel: { lbp: 60 },
    hydrostatics: { kind: "offsets", sections: [0, 60].map((x) => ({ x, points: boxSection })) },
    draftMarks: marks.map(([id, x, y]) => ({ id, x, y, zero: 0 })),
    stations: [
      { id: "A", instrument: "pendulum", length: 4 },
      { id: "B", instrument: "pendulum", length: 5 },
    ],
    weights: [
      { id: "W1", mass: 10 },
      { id: "W2", mass: 10 },
    ],
    moves: sampleMoves,
    tanks: [],
    aboard: [],
    readings: {
      battens: battens(tangents),
      drafts: marks.map(([mark]) => ({ id: `draft ${mark}`, mark, round: "before", value: 2 })),
      soundings: [],
      water: [{ id: "water", place: "midships", depth: 1, density: 1 }],
    },
    uncertainty: {},
    ...changes,
  };
}

/** Pendulum readings of A (4 m, zero at 100 mm) and B (5 m, zero at 40 mm) at tangents by move. */
export function battens(tans: readonly number[]): BattenReading[] {
  return tans.flatMap((tan, move) => [
    { id: `A${move}`, move, station: "A", mode: "settled" as const, valuesMm: [100 + 4000 * tan] },
    { id: `B${move}`, move, station: "B", mode: "settled" as const, valuesMm: [40 + 5000 * tan] },
  ]);
}

/** 0, 80, 160, 0, −80, −160 t·m. */
export const sampleMoves: IncliningTestData["moves"] = [
  [-4, 4],
  [4, 4],
  [4, 12],
  [-4, 4],
  [-4, -4],
  [-12, -4],
].map(([w1 = 0, w2 = 0], no) => ({ no, positions: { W1: [25, w1, 5], W2: [35, w2, 5] } }));

export const sampleMoments = [0, 80, 160, 0, -80, -160];
const tangents = sampleMoments.map((moment) => moment / 5000);

const boxSection: [number, number][] = [
  [6, 0],
  [6, 5],
];

const marks: readonly (readonly [string, number, number])[] = [
  ["AP", 0, -6],
  ["AS", 0, 6],
  ["FP", 60, -6],
  ["FS", 60, 6],
];
