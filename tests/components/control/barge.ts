import type { TestRecord } from "@/lib/record/test-record";

/**
 * A box barge 60 × 12 m at 2 m draft in water of 1.025 t/m³, without tanks, whose heel follows the moment exactly:
 * displacement 60·12·2·1.025 = 1476 t, KB = T/2, BM = B²/(12·T), so KMt = 7 m; with KG 4.8 m GM is 2.2 m.
 * Closed form of a wall-sided box, *common practice*.
 */
export const displacement = 60 * 12 * 2 * 1.025;
export const gm = 2.2;
const tanFor = (moment: number) => moment / (displacement * gm);

const stations: TestRecord["stations"] = [
  { id: "A", instrument: "pendulum", length: 4 },
  { id: "B", instrument: "pendulum", length: 3.6 },
  { id: "U", instrument: "u-tube", span: 9 },
];
/** y of W1 and of W2 at each move [m]; each weighs 5 t. */
const shifts: readonly (readonly [number, number])[] = [
  [-4, 4],
  [4, 4],
  [4, 4.5],
  [-4, 4],
  [-4, -4],
];
const batten = (no: number, station: string) => `0190a5d1-0000-7000-8000-${String(no * 10 + "ABU".indexOf(station)).padStart(12, "0")}`;

export function momentAt(no: number): number {
  const [first = 0, second = 0] = shifts[no] ?? [];
  return 5 * (first + 4) + 5 * (second - 4);
}

/** The barge with its battens read up to and including a move. */
export function bargeRecord(readUpTo: number): TestRecord {
  return {
    format: "battenbook-record",
    version: 1,
    test: { id: "0190a5d1-5d00-7000-8000-000000000001", title: "Barge, after building", date: "2026-05-04", place: "North quay" },
    vessel: { name: "Barge of the tests", lbp: 60, breadth: 12, depth: 5 },
    hydrostatics: {
      kind: "offsets",
      sections: [0, 60].map((x) => ({
        x,
        points: [
          [6, 0],
          [6, 5],
        ],
      })),
    },
    draftMarks: [0, 30, 60].flatMap((x) => [-6, 6].map((y) => ({ id: `${x}${y < 0 ? "P" : "S"}`, x, y, zero: 0 }))),
    stations,
    weights: [
      { id: "W1", mass: 5 },
      { id: "W2", mass: 5 },
    ],
    moves: shifts.map(([first, second], no) => ({ no, positions: { W1: [28, first, 5.6], W2: [32, second, 5.6] } })),
    tanks: [],
    aboard: [],
    items: [],
    readings: {
      battens: shifts.slice(0, readUpTo + 1).flatMap((_, no) => battensAt(no)),
      drafts: [0, 30, 60].flatMap((x) =>
        ["P", "S"].map((side) => ({ id: markId(x, side), mark: `${x}${side}`, round: "before" as const, value: 2 })),
      ),
      soundings: [],
      water: [{ id: "0190a5d1-0000-7000-8000-0000000000f0", place: "midships", depth: 1, density: 1.025 }],
    },
  };
}

function battensAt(no: number): TestRecord["readings"]["battens"] {
  const tan = tanFor(momentAt(no));
  const at = (station: string) => ({ id: batten(no, station), move: no, station, mode: "settled" as const });
  return [
    { ...at("A"), valuesMm: [12 + 4000 * tan] },
    { ...at("B"), valuesMm: [-30 + 3600 * tan] },
    { ...at("U"), portMm: [200 - 4500 * tan], starboardMm: [205 + 4500 * tan] },
  ];
}

function markId(x: number, side: string): string {
  return `0190a5d1-0000-7000-8000-${String(x * 10 + (side === "P" ? 1 : 2)).padStart(12, "0")}`;
}
