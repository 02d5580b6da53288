import { markSuspects } from "@/lib/hydrostatics/mark-suspects";
import { mean } from "@/lib/numerics/sum";
import { readingsThatCount } from "../readings-that-count";
import type { ShipAfloat } from "../ship-afloat";
import type { IncliningTestData } from "../test-data";
import type { Provenance, Round } from "../test-readings";
import type { CheckLimits } from "./check-limits";
import { type Change, type Finding, metOrAttention } from "./finding";

/** Five freeboards a side, or every draft mark on both sides, read in the round that counts. */
export function waterlineMarks(test: IncliningTestData, { freeboards: least }: CheckLimits): Finding {
  const { drafts, freeboards } = readingsThatCount(test);
  const read = new Set([...drafts, ...freeboards].map(([look]) => look?.value.mark ?? ""));
  const isRead = ({ id }: { readonly id: string }) => read.has(id);
  const freeboardSides = sides((test.freeboardMarks ?? []).filter(isRead));
  const marks = sides(test.draftMarks.filter(isRead));
  const unread = test.draftMarks.filter((mark) => !isRead(mark)).length;
  const byFreeboards = Math.min(freeboardSides.port, freeboardSides.starboard) >= least;
  const byMarks = unread === 0 && marks.port > 0 && marks.port === marks.starboard;
  const found = { freeboards: freeboardSides, marks, unread };
  return { id: "waterline-marks", verdict: metOrAttention(byFreeboards || byMarks), found, limit: { freeboards: least } };
}

/**
 * Whether one waterplane agrees with every mark. Where it does not, the marks to read again: several where the arrangement
 * can't tell which of them is wrong. Marks that just suffice contradict nothing, and that is for looking at.
 */
export function markAgreement({ waterline }: ShipAfloat, { markError: most }: CheckLimits): Finding {
  const { marks, degreesOfFreedom } = waterline;
  const suspects = markSuspects(waterline, most);
  const verdict = metOrAttention(suspects.length === 0 && degreesOfFreedom > 0);
  return { id: "mark-agreement", verdict, found: { suspects, marks, degreesOfFreedom }, limit: { most } };
}

/** Where and how deep the water was sampled; a large ship needs three places: fore, midships and aft. */
export function waterSamples({ vessel, readings }: IncliningTestData, { water }: ShipAfloat, { largeShip }: CheckLimits): Finding {
  const deepest = Math.max(0, ...readings.water.filter(isAccepted).map(({ depth }) => depth));
  const places = vessel.lbp >= largeShip ? 3 : 1;
  const isMet = water.places.length >= places && deepest > 0;
  return { id: "water-samples", verdict: metOrAttention(isMet), found: { places: water.places.length, deepest }, limit: { places } };
}

/** Drafts and freeboards of the round after the test against those before it [m]. */
export function draftsBeforeAfter({ readings }: IncliningTestData, { draftChange: most }: CheckLimits): Finding {
  const marks = [...readings.drafts, ...(readings.freeboards ?? [])].map((reading) => ({ ...reading, at: reading.mark }));
  const found = largestChange(marks);
  return { id: "drafts-before-after", verdict: metOrAttention(found !== null && Math.abs(found.change) <= most), found, limit: { most } };
}

/** Soundings after the test against those before it [m]. Nothing without tanks. */
export function soundingsBeforeAfter({ readings, tanks }: IncliningTestData, { soundingChange: most }: CheckLimits): readonly Finding[] {
  if (tanks.length === 0) return [];
  const soundings = readings.soundings.filter(({ move }) => move === undefined).map((reading) => ({ ...reading, at: reading.tank }));
  const found = largestChange(soundings);
  const verdict = metOrAttention(found !== null && Math.abs(found.change) <= most);
  return [{ id: "soundings-before-after", verdict, found, limit: { most } }];
}

type ReadInRound = Provenance & { readonly at: string; readonly round?: Round; readonly value: number };

function largestChange(readings: readonly ReadInRound[]): Change {
  const accepted = readings.filter(isAccepted);
  const changes = [...new Set(accepted.map(({ at }) => at))].flatMap((at) => {
    const of = (wanted: Round) => accepted.filter(({ at: where, round = "before" }) => where === at && round === wanted);
    const [before, after] = [of("before"), of("after")];
    return before.length > 0 && after.length > 0 ? [{ change: meanValue(after) - meanValue(before), at }] : [];
  });
  const [largest = null] = changes.sort((a, b) => Math.abs(b.change) - Math.abs(a.change));
  return largest;
}

function meanValue(readings: readonly ReadInRound[]): number {
  return mean(readings.map(({ value }) => value));
}

function sides(marks: readonly { readonly y: number }[]) {
  return { port: marks.filter(({ y }) => y < 0).length, starboard: marks.filter(({ y }) => y > 0).length };
}

function isAccepted({ status = "accepted" }: Provenance): boolean {
  return status === "accepted";
}
