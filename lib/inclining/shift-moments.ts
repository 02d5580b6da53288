import type { Attitude } from "@/lib/hydrostatics/tank";
import { sum } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";
import type { ActingMoment } from "./common-line";
import { type Faults, faultsOf, gathered, inside, refuseFaults } from "./faults";
import { ballastAtMove } from "./liquids";
import type { CountedReadings, Placed } from "./readings-that-count";
import type { IncliningTestData } from "./test-data";
import type { Move, TestWeight } from "./test-plan";

/** How a move has shifted the weights against the zero of its session [t·m]: athwartships (to starboard), upward and along (forward). */
export type ShiftMoment = Shift & { readonly no: number; readonly session: number };

/** How the ship lies at a move, for the soundings of ballast. */
export type AttitudeAt = (move: { readonly no: number; readonly session?: number }) => Attitude;

export type NoReferenceMove = { readonly type: "NoReferenceMove"; readonly path: string };
export type NoPosition = { readonly type: "NoPosition"; readonly weight: string; readonly move: number };

/**
 * The moments of the moves that were read, from the positions as measured at each of them.
 *
 *     athwart = Σ mᵢ·(yᵢ − yᵢ₀),   upward = Σ mᵢ·(zᵢ − zᵢ₀),   along = Σ mᵢ·(xᵢ − xᵢ₀)
 *
 * Where ballast is the shifting weight, its soundings at each move add theirs.
 * Positions in metres, masses in tonnes. A session without a move 0 of its own counts from the test's.
 * Source: IMO 2008 IS Code, part B annex 1 *from memory*.
 * Refused: no move 0; a move that lacks a weight's position or the soundings of ballast that shifts.
 */
export function shiftMoments(
  test: IncliningTestData,
  counted: CountedReadings,
  attitudeAt: AttitudeAt,
): Result<readonly ShiftMoment[], Faults> {
  const placed = test.moves.map((value, i) => ({ value, path: `moves[${i}]` }));
  const read = counted.moves.filter(({ value }) => isRead(value, counted));
  return gathered(read.map((move) => shiftMoment({ test, counted, attitudeAt }, move, zeroOf(placed, move.value))));
}

/**
 * The moments that act at the heel the ship has at each move: a weight that was also raised has the arm of the heel.
 *
 *     M* = athwart + tan(heel) · upward
 *
 * Source: the lever of a weight about the line of buoyancy, y + tan(heel)·z, *common practice*.
 */
export function actingMoments(moments: readonly ShiftMoment[], attitudeAt: AttitudeAt): readonly ActingMoment[] {
  return moments.map((move) => ({
    no: move.no,
    session: move.session,
    moment: move.athwart + attitudeAt(move).tanHeel * move.upward,
    along: move.along,
  }));
}

type Known = { readonly test: IncliningTestData; readonly counted: CountedReadings; readonly attitudeAt: AttitudeAt };
type Shift = { readonly athwart: number; readonly upward: number; readonly along: number };

function shiftMoment(known: Known, move: Placed<Move>, zero: Placed<Move> | undefined): Result<ShiftMoment, Faults> {
  if (zero === undefined) return refuseFaults([{ type: "NoReferenceMove", path: "moves" } satisfies NoReferenceMove]);
  const weights = gathered(known.test.weights.map((weight) => shiftOfWeight(weight, move, zero)));
  const ballast = gathered(known.test.tanks.flatMap((tank, i) => (tank.shifts ? [shiftOfBallast(known, i, move.value, zero.value)] : [])));
  if (!weights.ok || !ballast.ok) return refuseFaults(faultsOf(weights, ballast));
  const shifts = [...weights.value, ...ballast.value];
  return answer({
    no: move.value.no,
    session: sessionOf(move.value),
    athwart: sum(shifts.map(({ athwart }) => athwart)),
    upward: sum(shifts.map(({ upward }) => upward)),
    along: sum(shifts.map(({ along }) => along)),
  });
}

function shiftOfWeight({ id, mass }: TestWeight, move: Placed<Move>, zero: Placed<Move>): Result<Shift, Faults> {
  const to = move.value.positions[id];
  const from = zero.value.positions[id];
  if (to === undefined) return inside(`${move.path}.positions`, noPosition(id, move));
  if (from === undefined) return inside(`${zero.path}.positions`, noPosition(id, zero));
  return answer({ athwart: mass * (to[1] - from[1]), upward: mass * (to[2] - from[2]), along: mass * (to[0] - from[0]) });
}

function shiftOfBallast({ test, counted, attitudeAt }: Known, tank: number, move: Move, zero: Move): Result<Shift, Faults> {
  const to = ballastAtMove(test, counted, tank, move, attitudeAt(move));
  const from = ballastAtMove(test, counted, tank, zero, attitudeAt(zero));
  if (!to.ok || !from.ok) return refuseFaults(faultsOf(to, from));
  return answer({
    athwart: to.value.mass * to.value.tcg - from.value.mass * from.value.tcg,
    upward: to.value.mass * to.value.vcg - from.value.mass * from.value.vcg,
    along: to.value.mass * to.value.lcg - from.value.mass * from.value.lcg,
  });
}

// where a weight stood is known even where the readings of that move do not count
function zeroOf(moves: readonly Placed<Move>[], { session }: Move): Placed<Move> | undefined {
  const zeros = moves.filter(({ value }) => value.no === 0);
  return zeros.findLast(({ value }) => sessionOf(value) === (session ?? 1)) ?? zeros.findLast(({ value }) => sessionOf(value) === 1);
}

function isRead(move: Move, { battens }: CountedReadings): boolean {
  return battens.some((looks) => looks.some(({ value }) => value.move === move.no && (value.session ?? 1) === sessionOf(move)));
}

function sessionOf({ session }: Move): number {
  return session ?? 1;
}

function noPosition(weight: string, { value }: Placed<Move>): Result<never, NoPosition> {
  return refuse({ type: "NoPosition", weight, move: value.no });
}
