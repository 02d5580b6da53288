import { describe, expect, it } from "vitest";
import type { CheckId, Finding } from "@/lib/inclining/checks/finding";
import { checkSource } from "@/lib/report/check-sources";
import { checkName, foundWords, limitWords, verdictWord } from "@/lib/report/check-words";

type FindingOf<Id extends CheckId> = Omit<Extract<Finding, { readonly id: Id }>, "id" | "verdict">;

/** One finding of every check with its words; the mapped type fails to compile where one is missing. */
const every: { readonly [Id in CheckId]: FindingOf<Id> & { readonly words: readonly [found: string, limit: string] } } = {
  "heel-range": {
    found: { port: 1.304, starboard: 1.4 },
    limit: { least: 1, most: 4 },
    words: ["1.30° to port, 1.40° to starboard", "1° to 4° each side"],
  },
  deflection: {
    found: { station: "A", port: 149.4, starboard: 160 },
    limit: { leastMm: 150 },
    words: ["station A least: 149 mm to port, 160 mm to starboard", "at least 150 mm each side"],
  },
  stations: {
    found: { stations: 1 },
    limit: { recommended: 3, least: 2, smallShip: 30 },
    words: ["1 station", "3 recommended, at least 2; one less may be accepted by class below 30 m"],
  },
  "unequal-lengths": {
    found: { lengths: [3.98, 4.5] },
    limit: { share: 0.02 },
    words: ["3.980, 4.500 m", "unequal: more than 2 % apart (a setting)"],
  },
  movements: {
    found: { movements: 7 },
    limit: { full: 8, straight: 6 },
    words: ["7 movements", "8, or 6 where the plot is straight after them"],
  },
  straightness: {
    found: { standardised: -2.31, move: 4, probability: 0.0312 },
    limit: { standardised: 3.82, probability: 0.05 },
    words: [
      "move 4 off by 2.3 standard deviations; lack of fit as large in 3.1 % of straight lines",
      "at most 3.8 standard deviations; lack of fit not below 5 % (a setting)",
    ],
  },
  "station-agreement": {
    found: { station: "B", deviation: -0.0123 },
    limit: { share: 0.02 },
    words: ["station B: −1.23 % off the common slope", "at most 2 % (a setting)"],
  },
  "station-sense": { found: { against: ["C"] }, limit: null, words: ["against the others: C", "all go one way"] },
  "zero-drift": {
    found: { drift: -0.00025, heel: 0.0231 },
    limit: { share: 0.02 },
    words: ["−0.25 mm per m of 23.1 mm per m", "at most 2 % of the largest heel (a setting)"],
  },
  "initial-list": { found: { degrees: -0.314 }, limit: { most: 0.5 }, words: ["0.31° to port", "at most 0.5°"] },
  trim: {
    found: { beyond: 0.7, share: 0.0117 },
    limit: { share: 0.01 },
    words: ["+0.700 m beyond theirs, 1.17 % of length", "at most 1 % of length beyond their trim"],
  },
  "waterline-marks": {
    found: { freeboards: { port: 0, starboard: 0 }, marks: { port: 3, starboard: 2 }, unread: 1 },
    limit: { freeboards: 5 },
    words: [
      "freeboards 0 to port and 0 to starboard, draft marks 3 to port and 2 to starboard, 1 unread",
      "5 freeboards a side, or all draft marks on both sides",
    ],
  },
  "mark-agreement": {
    found: {
      suspects: [
        { mark: "MS", error: 0.1 },
        { mark: "MP", error: -0.1 },
      ],
      marks: 6,
      degreesOfFreedom: 2,
    },
    limit: { most: 0.02 },
    words: [
      "read again: one of MS (by +0.100 m), MP (by −0.100 m) may be wrong, and these marks can’t tell which",
      "none off by more than 0.020 m (a setting)",
    ],
  },
  "drafts-before-after": {
    found: { change: -0.012, at: "FP" },
    limit: { most: 0.02 },
    words: ["FP changed most: −0.012 m", "at most 0.020 m (a setting)"],
  },
  "water-samples": {
    found: { places: 3, deepest: 2 },
    limit: { places: 3 },
    words: ["3 places, down to 2.0 m", "at depth, at 3 places: fore, midships and aft"],
  },
  "slack-tanks": {
    found: { slack: ["FO1", "FO2"], groups: 2 },
    limit: { groups: 1 },
    words: ["FO1, FO2", "one pair, or one on the centreline"],
  },
  "slack-levels": {
    found: { outside: [{ tank: "FO1", filled: 0.93 }], judged: 2 },
    limit: { deep: [0.2, 0.8], doubleBottom: [0.4, 0.6] },
    words: ["FO1 filled to 93 %", "deep tanks 20 % to 80 %, double bottom 40 % to 60 %"],
  },
  "soundings-before-after": { found: null, limit: { most: 0.01 }, words: ["not read in both rounds", "at most 0.010 m (a setting)"] },
  headcount: { found: { least: 9, most: 10 }, limit: null, words: ["9 to 10", "unchanged"] },
  "under-keel": { found: null, limit: { least: 0.3 }, words: ["not noted", "clear of the bottom; at least 0.3 m (a setting)"] },
  certificates: {
    found: { without: ["W1"] },
    limit: null,
    words: ["not named: W1", "named for each; their age is for the surveyor to see"],
  },
  missing: { found: { share: 0.0123 }, limit: { share: 0.02 }, words: ["1.2 % of the lightship", "at most 2 % of the lightship"] },
  surplus: { found: { share: 0.05 }, limit: { share: 0.04 }, words: ["5.0 % of the lightship", "at most 4 % of the lightship"] },
  "previous-displacement": {
    found: { kind: "earlier", deviation: 0.0151, other: 1296.2 },
    limit: { share: 0.02 },
    words: ["+1.51 % against 1296.2 t of the earlier test", "at most 2.00 %"],
  },
  "previous-lcg": {
    found: { kind: "sister", deviation: -0.002, other: 24.97 },
    limit: { share: 0.005 },
    words: ["−0.20 % against 24.97 m of the sister ship", "at most 0.5 % of length"],
  },
  "previous-vcg": {
    found: { kind: "earlier", deviation: 0.02, other: 5.688 },
    limit: { share: 0.01 },
    words: ["+2.00 % against 5.688 m of the earlier test", "at most 1.0 %"],
  },
};

const findings = Object.entries(every).map(([id, { words, ...facts }]) => ({
  id,
  words,
  finding: { id, verdict: "met", ...facts } as unknown as Finding,
}));

describe("the words of a check", () => {
  it.each(findings)("$id", ({ words, finding }) => {
    expect([foundWords(finding), limitWords(finding)]).toEqual(words);
    expect(checkName(finding.id)).toMatch(/^[A-Z]/);
    expect(checkSource(finding).length).toBeGreaterThan(5);
  });

  it("say that what was not noted was not noted", () => {
    const words = (id: CheckId, found: unknown, limit: unknown = null) =>
      foundWords({ id, verdict: "attention", found, limit } as unknown as Finding);
    expect(words("headcount", null)).toBe("not noted");
    expect(words("zero-drift", { drift: null, heel: 0.02 })).toBe("zero was read once only");
    expect(words("straightness", { standardised: null, move: null, probability: null })).toBe("too few moves to tell");
    expect(words("slack-tanks", { slack: [], groups: 0 })).toBe("none");
    expect(words("initial-list", { degrees: 0 })).toBe("0.00°");
  });

  it("say plainly that no standard gives a number for straightness", () => {
    const straight = findings.find(({ id }) => id === "straightness")?.finding as Finding;
    expect(checkSource(straight)).toContain("IMO gives no number");
    expect(limitWords(straight)).toContain("(a setting)");
  });

  it("have a word for each verdict", () => {
    expect(["met", "attention", "not-met"].map((verdict) => verdictWord(verdict as Finding["verdict"]))).toEqual([
      "met",
      "attention",
      "not met",
    ]);
  });
});
