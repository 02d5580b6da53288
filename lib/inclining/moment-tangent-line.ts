import type { Attitude } from "@/lib/hydrostatics/tank";
import type { Result } from "@/lib/result";
import { commonLine } from "./common-line";
import { type Faults, inside } from "./faults";
import type { MomentTangentLine } from "./inclined-ship";
import { readingUncertaintyOf } from "./reading-uncertainty";
import { type CountedReadings, readingsThatCount } from "./readings-that-count";
import { type AttitudeAt, actingMoments, type ShiftMoment, shiftMoments } from "./shift-moments";
import { uprightOnEvenKeel } from "./ship-afloat";
import { stationSeries } from "./station-series";
import type { IncliningTestData } from "./test-data";

/**
 * The line of a test as far as it has gone: from the batten readings that count and the weights' measured positions.
 *
 * How the ship lies at zero comes from the draft marks; where it is left out she is taken as upright on even keel. It matters
 * only to weights that also moved in height, to ballast that shifts and to inclinometers. Their moments need the heel that
 * the line itself gives, so the line is drawn again until it stands still.
 * Refused, all at once and each with its place: what readings, stations, moves and moments refuse.
 */
export function momentTangentLine(
  test: IncliningTestData,
  atZero: Attitude = uprightOnEvenKeel(test),
  counted: CountedReadings = readingsThatCount(test),
): Result<MomentTangentLine, Faults> {
  let line = lineAt(test, counted, atZero, () => atZero);
  for (let pass = 0; line.ok && pass < 20; pass++) {
    const before = line.value;
    line = lineAt(test, counted, atZero, (move) => ({ ...atZero, tanHeel: atZero.tanHeel + changeAt(before, move) }));
    if (line.ok && Math.abs(line.value.slope - before.slope) <= 1e-13 * Math.abs(before.slope)) break;
  }
  return line;
}

function lineAt(
  test: IncliningTestData,
  counted: CountedReadings,
  atZero: Attitude,
  attitudeAt: AttitudeAt,
): Result<MomentTangentLine, Faults> {
  const shifts = shiftMoments(test, counted, attitudeAt);
  if (!shifts.ok) return shifts;
  const upright = { tanHeel: atZero.tanHeel, zeroMoves: (session: number) => zeroMoves(shifts.value, session) };
  const series = stationSeries(test.stations, counted.battens, upright, readingUncertaintyOf(test.uncertainty));
  if (!series.ok) return series;
  return inside("readings.battens", commonLine(series.value, actingMoments(shifts.value, attitudeAt), test.settings?.weights));
}

// an inclinometer's zero: move 0, or where its series begins later a move at which the weights stand as at zero
function zeroMoves(shifts: readonly ShiftMoment[], session: number): readonly number[] {
  const ofSession = shifts.filter((shift) => shift.session === session);
  const largest = Math.max(...ofSession.map(({ athwart }) => Math.abs(athwart)));
  const standing = ofSession.filter(({ no, athwart }) => no !== 0 && Math.abs(athwart) <= largest / 100);
  return [0, ...standing.map(({ no }) => no)];
}

function changeAt({ moves }: MomentTangentLine, { no, session }: { readonly no: number; readonly session?: number }): number {
  return moves.find((move) => move.no === no && move.session === (session ?? 1))?.tanHeel ?? 0;
}
