import type { Refusal, Result } from "@/lib/result";
import { asInclined, gmFluidAt } from "./as-inclined";
import { faultsOf } from "./faults";
import type { AsInclined, MomentTangentLine } from "./inclined-ship";
import { type Liquid, liquidsAboard } from "./liquids";
import { momentTangentLine } from "./moment-tangent-line";
import { readingsThatCount } from "./readings-that-count";
import { attitudeUnder, type ShipAfloat, shipAfloat, uprightOnEvenKeel } from "./ship-afloat";
import type { IncliningTestData } from "./test-data";

/** What is known of a test while it still runs; null where something is missing for it. */
export type TestSoFar = {
  readonly movesUsed: number;
  readonly afloat: ShipAfloat | null;
  readonly liquids: readonly Liquid[] | null;
  readonly line: MomentTangentLine | null;
  /** preliminary: as soon as drafts, water, soundings and two moves have been read */
  readonly asInclined: AsInclined | null;
  /** as soon as drafts, water and two moves have been read: no tank need be sounded for it [m] */
  readonly gmFluid: number | null;
  /** what keeps the rest from being known, as the reduction would refuse it */
  readonly missing: readonly Refusal[];
};

/** A running test as far as its readings go: the same steps as `incliningTest`, each on its own, and what is missing. */
export function testSoFar(test: IncliningTestData): TestSoFar {
  const counted = readingsThatCount(test);
  const afloat = shipAfloat(test, counted);
  const lies = afloat.ok ? attitudeUnder(afloat.value.waterline) : uprightOnEvenKeel(test);
  const liquids = liquidsAboard(test, counted, lies);
  const line = momentTangentLine(test, lies, counted);
  const ship = afloat.ok && liquids.ok && line.ok ? asInclined(afloat.value, line.value, liquids.value, test.aboard) : null;
  return {
    movesUsed: line.ok ? line.value.moves.length : 0,
    afloat: afloat.ok ? afloat.value : null,
    liquids: liquids.ok ? liquids.value : null,
    line: line.ok ? line.value : null,
    asInclined: ship?.ok ? ship.value : null,
    gmFluid: ship?.ok ? ship.value.gmFluid : gmWithoutTanks(afloat, line),
    missing: faultsOf(afloat, liquids, line, ...(ship === null ? [] : [ship])),
  };
}

function gmWithoutTanks(afloat: Result<ShipAfloat>, line: Result<MomentTangentLine>): number | null {
  if (!afloat.ok || !line.ok) return null;
  const gm = gmFluidAt(afloat.value.hydrostatics.displacement, line.value);
  return gm.ok ? gm.value : null;
}
