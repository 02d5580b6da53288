import { type CheckLimits, usualLimits } from "@/lib/inclining/checks/check-limits";
import type { CheckedTest as CheckedInclining } from "@/lib/inclining/checks/checked-test";
import type { Finding } from "@/lib/inclining/checks/finding";
import { deflection, heelRange, initialList, trimOfHydrostatics } from "@/lib/inclining/checks/heel-checks";
import { movements, straightness } from "@/lib/inclining/checks/movement-checks";
import { draftsBeforeAfter, soundingsBeforeAfter, waterlineMarks, waterSamples } from "@/lib/inclining/checks/round-checks";
import { agreementOfStations, driftOfZero, senseOfStations, stationCount, unequalLengths } from "@/lib/inclining/checks/station-checks";
import { certificates, headcount, underKeel } from "@/lib/inclining/checks/surroundings-checks";
import { slackLevels, slackTanks } from "@/lib/inclining/checks/tank-checks";
import type { InclinedShip } from "@/lib/inclining/inclining-test";
import { completeness } from "./completeness";
import type { Lightship, LightshipItem } from "./lightship";
import { comparedWithPrevious, type PreviousShip } from "./previous-ship";

/** A test with all that the checks look at; a test record is one of these. */
export type CheckedTest = CheckedInclining & { readonly items: readonly LightshipItem[]; readonly previous?: PreviousShip };

/**
 * What a surveyor would look at, in the order of a test: each check with what was found, the limit and a verdict.
 *
 * Findings, not errors: the result stands whatever they say, and the engineer decides. A check that the test gives no ground
 * for (lengths of one pendulum, a comparison with no other ship) is left out.
 */
export function checksOf(
  test: CheckedTest,
  ship: InclinedShip,
  lightship: Lightship,
  limits: CheckLimits = usualLimits,
): readonly Finding[] {
  const { afloat, line, liquids } = ship;
  const straight = straightness(test, line, limits);
  return [
    heelRange(line, limits),
    ...deflection(test, line, limits),
    stationCount(test, line, limits),
    ...unequalLengths(test, limits),
    movements(line, straight.verdict === "met", limits),
    straight,
    ...agreementOfStations(line, limits),
    ...senseOfStations(line),
    driftOfZero(line, limits),
    initialList(afloat, limits),
    trimOfHydrostatics(test, afloat, limits),
    waterlineMarks(test, limits),
    draftsBeforeAfter(test, limits),
    waterSamples(test, afloat, limits),
    slackTanks(test, liquids, limits),
    ...slackLevels(test, liquids, limits),
    ...soundingsBeforeAfter(test, limits),
    headcount(test),
    underKeel(test, limits),
    certificates(test),
    ...completeness(test.items, lightship, limits),
    ...(test.previous ? comparedWithPrevious(lightship, test.previous, test.vessel.lbp) : []),
  ];
}
