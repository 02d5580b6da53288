import { type CheckLimits, limitsOf, usualLimits } from "@/lib/inclining/checks/check-limits";
import type { CheckedTest as CheckedInclining } from "@/lib/inclining/checks/checked-test";
import type { CheckId, Finding } from "@/lib/inclining/checks/finding";
import { deflection, heelRange, initialList, trimOfHydrostatics } from "@/lib/inclining/checks/heel-checks";
import { movements, straightness } from "@/lib/inclining/checks/movement-checks";
import { draftsBeforeAfter, markAgreement, soundingsBeforeAfter, waterlineMarks, waterSamples } from "@/lib/inclining/checks/round-checks";
import { agreementOfStations, driftOfZero, senseOfStations, stationCount, unequalLengths } from "@/lib/inclining/checks/station-checks";
import { certificates, headcount, underKeel } from "@/lib/inclining/checks/surroundings-checks";
import { slackLevels, slackTanks } from "@/lib/inclining/checks/tank-checks";
import type { InclinedShip } from "@/lib/inclining/inclining-test";
import { completeness } from "./completeness";
import type { LightshipTestData } from "./inclining-result";
import type { Lightship, LightshipItem } from "./lightship";
import { comparedWithPrevious, type PreviousShip } from "./previous-ship";

/** A test with all that the checks look at; a test record is one of these. */
export type CheckedTest = CheckedInclining &
  Pick<LightshipTestData, "settings"> & { readonly items: readonly LightshipItem[]; readonly previous?: PreviousShip };

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
  limits: CheckLimits = limitsOf(test),
): readonly Finding[] {
  return findings(test, ship, lightship, limits).map((finding) =>
    isSetForTest(finding, limits) ? { ...finding, isSetForTest: true } : finding,
  );
}

function findings(test: CheckedTest, ship: InclinedShip, lightship: Lightship, limits: CheckLimits): readonly Finding[] {
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
    markAgreement(afloat, limits),
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

function isSetForTest({ id }: Finding, limits: CheckLimits): boolean {
  const keys = limitsBehind[id] ?? [];
  return keys.some((key) => JSON.stringify(limits[key]) !== JSON.stringify(usualLimits[key]));
}

/** Which limits each check is held against; a check that is not here has none that a test could set. */
const limitsBehind: { readonly [Id in CheckId]?: readonly (keyof CheckLimits)[] } = {
  "heel-range": ["heel"],
  deflection: ["deflectionMm"],
  stations: ["stations", "smallShip"],
  "unequal-lengths": ["equalLengths"],
  movements: ["movements"],
  straightness: ["straightness"],
  "station-agreement": ["stationSlope"],
  "zero-drift": ["zeroDrift"],
  "initial-list": ["initialList"],
  trim: ["trim"],
  "waterline-marks": ["freeboards"],
  "mark-agreement": ["markError"],
  "drafts-before-after": ["draftChange"],
  "water-samples": ["largeShip"],
  "slack-tanks": ["slackGroups"],
  "slack-levels": ["deepTank", "doubleBottomTank"],
  "soundings-before-after": ["soundingChange"],
  "under-keel": ["underKeel"],
  missing: ["missing"],
  surplus: ["surplus"],
};
