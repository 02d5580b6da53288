import { commonLine } from "@/lib/inclining/common-line";
import type { MomentTangentLine } from "@/lib/inclining/inclined-ship";
import { promised } from "@/lib/result";

/** The eight movements of a test with four weights: 0, +1, +2, +1, 0, −1, −2, −1, 0, times 100 t·m. */
export const eightMovements = [0, 100, 200, 100, 0, -100, -200, -100, 0];

/** A slope of 1e-4 per t·m: 0.02, about 1.1°, at 200 t·m. */
export const sampleSlope = 1e-4;

/** What each station reads at each move, off a straight line [tangent]. */
export type OffLine = (move: number, station: number, moment: number) => number;

/** The line of a test of so many stations whose tangents are straight but for `off`; station j has a zero of its own. */
export function lineOff(off: OffLine, stations = 2, moments: readonly number[] = eightMovements): MomentTangentLine {
  const series = Array.from({ length: stations }, (_, j) => ({
    id: "ABCD".charAt(j),
    series: 1,
    session: 1,
    tangents: moments.map((moment, move) => ({ move, tan: 0.03 * j + sampleSlope * moment + off(move, j, moment), uncertainty: 0 })),
  }));
  return promised(
    commonLine(
      series,
      moments.map((moment, no) => ({ no, session: 1, moment })),
    ),
  );
}

/** The same line seen in a mirror: port becomes starboard. */
export function mirroredLine(off: OffLine, stations = 2, moments: readonly number[] = eightMovements): MomentTangentLine {
  return lineOff(
    (move, j, moment) => -off(move, j, -moment),
    stations,
    moments.map((moment) => -moment),
  );
}
