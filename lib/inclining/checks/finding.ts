import type { MarkSuspect } from "@/lib/hydrostatics/mark-suspects";

/** What an engineer makes of a finding is for the engineer to say; a finding only sets what was found beside a limit. */
export type Verdict = "met" | "attention" | "not-met";

type Sides = { readonly port: number; readonly starboard: number };

/** What each check finds and what it is held against. Degrees, metres, tangents; millimetres where the name says so; shares of 1. */
export type CheckFacts = {
  "heel-range": { readonly found: Sides; readonly limit: { readonly least: number; readonly most: number } };
  /** of the pendulum whose bob moved least */
  deflection: { readonly found: Sides & { readonly station: string }; readonly limit: { readonly leastMm: number } };
  stations: {
    readonly found: { readonly stations: number };
    /** below `smallShip` [m] one less than the least may be accepted */
    readonly limit: { readonly recommended: number; readonly least: number; readonly smallShip: number };
  };
  "unequal-lengths": { readonly found: { readonly lengths: readonly number[] }; readonly limit: { readonly share: number } };
  "station-agreement": {
    readonly found: { readonly station: string; readonly deviation: number };
    readonly limit: { readonly share: number };
  };
  "station-sense": { readonly found: { readonly against: readonly string[] }; readonly limit: null };
  "zero-drift": {
    /** null where zero was read only once */
    readonly found: { readonly drift: number | null; readonly heel: number };
    readonly limit: { readonly share: number };
  };
  movements: { readonly found: { readonly movements: number }; readonly limit: { readonly full: number; readonly straight: number } };
  straightness: {
    readonly found: {
      readonly standardised: number | null;
      readonly move: number | null;
      /** of a lack of fit as large; null where no moment was repeated */
      readonly probability: number | null;
    };
    readonly limit: { readonly standardised: number | null; readonly probability: number };
  };
  "initial-list": { readonly found: { readonly degrees: number }; readonly limit: { readonly most: number } };
  /** trim beyond that for which the hydrostatics are given */
  trim: { readonly found: { readonly beyond: number; readonly share: number }; readonly limit: { readonly share: number } };
  "waterline-marks": {
    readonly found: { readonly freeboards: Sides; readonly marks: Sides; readonly unread: number };
    readonly limit: { readonly freeboards: number };
  };
  "mark-agreement": {
    /** marks among which a reading hides that no waterplane agrees with, each with the error that it alone would have to have */
    readonly found: { readonly suspects: readonly MarkSuspect[]; readonly marks: number; readonly degreesOfFreedom: number };
    readonly limit: { readonly most: number };
  };
  "water-samples": {
    readonly found: { readonly places: number; readonly deepest: number };
    readonly limit: { readonly places: number };
  };
  "drafts-before-after": { readonly found: Change; readonly limit: { readonly most: number } };
  "soundings-before-after": { readonly found: Change; readonly limit: { readonly most: number } };
  "slack-tanks": {
    readonly found: { readonly slack: readonly string[]; readonly groups: number };
    readonly limit: { readonly groups: number };
  };
  "slack-levels": {
    readonly found: { readonly outside: readonly { readonly tank: string; readonly filled: number }[]; readonly judged: number };
    readonly limit: { readonly deep: Range; readonly doubleBottom: Range };
  };
  headcount: { readonly found: { readonly least: number; readonly most: number } | null; readonly limit: null };
  "under-keel": { readonly found: { readonly least: number } | null; readonly limit: { readonly least: number } };
  certificates: { readonly found: { readonly without: readonly string[] }; readonly limit: null };
  missing: { readonly found: { readonly share: number }; readonly limit: { readonly share: number } };
  surplus: { readonly found: { readonly share: number }; readonly limit: { readonly share: number } };
  "previous-displacement": Compared;
  "previous-lcg": Compared;
  "previous-vcg": Compared;
};

export type Range = readonly [low: number, high: number];

/** The largest change between the rounds and where; null where nothing was read in both. */
export type Change = { readonly change: number; readonly at: string } | null;

/** `kind`: with what, `other`: its number; the deviation and its limit as shares of the other ship's displacement or VCG, of length for LCG. */
export type Compared = {
  readonly found: { readonly kind: "earlier" | "sister"; readonly deviation: number; readonly other: number };
  readonly limit: { readonly share: number };
};

export type CheckId = keyof CheckFacts;

/** One check: what was found, the limit, and what stands between them. */
export type Finding = {
  readonly [Id in CheckId]: { readonly id: Id; readonly verdict: Verdict } & CheckFacts[Id] & SetForTest;
}[CheckId];

/** Present where the limit is one that the test sets for itself, in place of the usual one. */
type SetForTest = { readonly isSetForTest?: true };

/** Met or not, for limits that a standard sets. */
export function metOrNot(isMet: boolean): Verdict {
  return isMet ? "met" : "not-met";
}

/** Met or to be looked at, for limits that are settings and for what was not noted. */
export function metOrAttention(isMet: boolean): Verdict {
  return isMet ? "met" : "attention";
}
