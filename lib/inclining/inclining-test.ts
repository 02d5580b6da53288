import { answer, type Result } from "@/lib/result";
import { asInclined } from "./as-inclined";
import { type Faults, faultsOf, inside, refuseFaults } from "./faults";
import { type GeneralisedShip, generalisedShip } from "./generalised-ship";
import type { AsInclined, MomentTangentLine, SlopeSpread } from "./inclined-ship";
import { type Liquid, liquidsAboard } from "./liquids";
import { momentTangentLine } from "./moment-tangent-line";
import { readingsThatCount } from "./readings-that-count";
import { attitudeUnder, type ShipAfloat, shipAfloat, uprightOnEvenKeel } from "./ship-afloat";
import type { IncliningTestData } from "./test-data";

export type InclinedShip = {
  readonly afloat: ShipAfloat;
  readonly liquids: readonly Liquid[];
  readonly line: JudgedLine;
  readonly asInclined: AsInclined;
  /** by the hull's own equilibrium; null where her hydrostatics can't give it */
  readonly generalised: GeneralisedShip | null;
};

/** A line with moves enough to judge its scatter. */
export type JudgedLine = MomentTangentLine & { readonly spread: SlopeSpread };

export type TooFewMoves = { readonly type: "TooFewMoves"; readonly got: number; readonly needed: number };

/**
 * An inclining test, from its readings to the ship as inclined.
 *
 * Of all that was read, some counts. Marks and water samples tell how the ship floats, and her hydrostatics what she
 * displaces there; soundings what stands in her tanks; weights and battens how far she heels for a moment. From these follow
 * her metacentric height and her centre of gravity, liquids, persons and test weights still aboard.
 * Refused with every fault and its place in the record; there is no partial answer.
 */
export function incliningTest(test: IncliningTestData): Result<InclinedShip, Faults> {
  const counted = readingsThatCount(test);
  const afloat = shipAfloat(test, counted);
  const lies = afloat.ok ? attitudeUnder(afloat.value.waterline) : uprightOnEvenKeel(test);
  const liquids = liquidsAboard(test, counted, lies);
  const line = momentTangentLine(test, lies, counted);
  if (!afloat.ok || !liquids.ok || !line.ok) return refuseFaults(faultsOf(afloat, liquids, line));
  if (!isJudged(line.value)) return refuseFaults([tooFewMoves(line.value)]);

  const ship = asInclined(afloat.value, line.value, liquids.value, test.aboard);
  if (!ship.ok) return inside("readings.battens", ship);
  const generalised = generalisedShip(test, afloat.value, line.value, { classical: ship.value, liquids: liquids.value });
  return answer({ afloat: afloat.value, liquids: liquids.value, line: line.value, asInclined: ship.value, generalised });
}

function isJudged(line: MomentTangentLine): line is JudgedLine {
  return line.spread !== null;
}

// the scatter of a line needs a move more than the slope and each session's zero
function tooFewMoves({ moves }: MomentTangentLine): TooFewMoves {
  return { type: "TooFewMoves", got: moves.length, needed: 2 + new Set(moves.map(({ session }) => session)).size };
}
