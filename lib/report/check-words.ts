import type { Change, CheckId, Finding, Verdict } from "@/lib/inclining/checks/finding";
import { figure, shortFigure, signedFigure } from "./rounding";

type Of<Id extends CheckId> = Extract<Finding, { readonly id: Id }>;
type Words<Id extends CheckId> = {
  readonly name: string;
  readonly found: (found: Of<Id>["found"], finding: Of<Id>) => string;
  readonly limit: (limit: Of<Id>["limit"]) => string;
};

const words: { readonly [Id in CheckId]: Words<Id> } = {
  "heel-range": {
    name: "Heel to each side",
    found: (found) => bothSides(found, (side) => `${figure(side, 2)}°`),
    limit: ({ least, most }) => `${shortFigure(least)}° to ${shortFigure(most)}° each side`,
  },
  deflection: {
    name: "Deflection of the pendulums",
    found: ({ station, ...sides }) => `station ${station} least: ${bothSides(sides, (side) => `${figure(side, 0)} mm`)}`,
    limit: ({ leastMm }) => `at least ${shortFigure(leastMm)} mm each side`,
  },
  stations: {
    name: "Stations",
    found: ({ stations }) => counted(stations, "station"),
    limit: ({ recommended, least, smallShip }) =>
      `${recommended} recommended, at least ${least}; one less may be accepted by class below ${shortFigure(smallShip)} m`,
  },
  "unequal-lengths": {
    name: "Lengths of the pendulums",
    found: ({ lengths }) => `${lengths.map((length) => figure(length, 3)).join(", ")} m`,
    limit: ({ share }) => `unequal: more than ${limitPercent(share)} apart (a setting)`,
  },
  movements: {
    name: "Weight movements",
    found: ({ movements }) => counted(movements, "movement"),
    limit: ({ full, straight }) => `${full}, or ${straight} where the plot is straight after them`,
  },
  straightness: { name: "Straightness of the plot", found: straightnessFound, limit: straightnessLimit },
  "station-agreement": {
    name: "Agreement of the stations",
    found: ({ station, deviation }) => `station ${station}: ${signedPercent(deviation)} off the common slope`,
    limit: ({ share }) => `at most ${limitPercent(share)} (a setting)`,
  },
  "station-sense": {
    name: "Sense of the stations",
    found: ({ against }) => (against.length === 0 ? "all go one way" : `against the others: ${against.join(", ")}`),
    limit: () => "all go one way",
  },
  "zero-drift": {
    name: "Drift of zero",
    found: ({ drift, heel }) =>
      drift === null ? "zero was read once only" : `${signedFigure(1000 * drift, 2)} mm per m of ${figure(1000 * heel, 1)} mm per m`,
    limit: ({ share }) => `at most ${limitPercent(share)} of the largest heel (a setting)`,
  },
  "initial-list": {
    name: "List at zero",
    found: ({ degrees }) => `${figure(Math.abs(degrees), 2)}°${degrees === 0 ? "" : degrees > 0 ? " to starboard" : " to port"}`,
    limit: ({ most }) => `at most ${shortFigure(most)}°`,
  },
  trim: {
    name: "Trim and the hydrostatics",
    found: ({ beyond, share }) =>
      beyond === 0 ? "hydrostatics at the measured trim" : `${signedFigure(beyond, 3)} m beyond theirs, ${percent(share, 2)} of length`,
    limit: ({ share }) => `at most ${limitPercent(share)} of length beyond their trim`,
  },
  "waterline-marks": {
    name: "Marks and freeboards read",
    found: ({ freeboards, marks, unread }) =>
      `freeboards ${sides(freeboards)}, draft marks ${sides(marks)}${unread === 0 ? "" : `, ${unread} unread`}`,
    limit: ({ freeboards }) => `${freeboards} freeboards a side, or all draft marks on both sides`,
  },
  "mark-agreement": {
    name: "Agreement of the marks",
    found: markAgreementFound,
    limit: ({ most }) => `none off by more than ${figure(most, 3)} m (a setting)`,
  },
  "drafts-before-after": {
    name: "Drafts before and after",
    found: changeFound,
    limit: ({ most }) => `at most ${figure(most, 3)} m (a setting)`,
  },
  "water-samples": {
    name: "Water samples",
    found: ({ places, deepest }) => `${counted(places, "place")}, down to ${figure(deepest, 1)} m`,
    limit: ({ places }) => `at depth${places > 1 ? `, at ${places} places: fore, midships and aft` : ""}`,
  },
  "slack-tanks": {
    name: "Slack tanks",
    found: ({ slack }) => (slack.length === 0 ? "none" : slack.join(", ")),
    limit: ({ groups }) => (groups === 1 ? "one pair, or one on the centreline" : `at most ${groups} pairs or tanks on the centreline`),
  },
  "slack-levels": {
    name: "Filling of slack tanks",
    found: ({ outside, judged }) =>
      outside.length === 0
        ? `${counted(judged, "tank")} within`
        : outside.map(({ tank, filled }) => `${tank} filled to ${percent(filled, 0)}`).join(", "),
    limit: ({ deep, doubleBottom }) =>
      `deep tanks ${limitPercent(deep[0])} to ${limitPercent(deep[1])}, double bottom ${limitPercent(doubleBottom[0])} to ${limitPercent(doubleBottom[1])}`,
  },
  "soundings-before-after": {
    name: "Soundings before and after",
    found: changeFound,
    limit: ({ most }) => `at most ${figure(most, 3)} m (a setting)`,
  },
  headcount: { name: "Headcount through the moves", found: headcountFound, limit: () => "unchanged" },
  "under-keel": {
    name: "Clearance under the keel",
    found: (found) => (found === null ? "not noted" : `${figure(found.least, 1)} m at least`),
    limit: ({ least }) => `clear of the bottom; at least ${shortFigure(least)} m (a setting)`,
  },
  certificates: {
    name: "Certificates",
    found: ({ without }) => (without.length === 0 ? "named for all" : `not named: ${without.join(", ")}`),
    limit: () => "named for each; their age is for the surveyor to see",
  },
  missing: { name: "Still to come aboard", found: ofLightship, limit: mostOfLightship },
  surplus: { name: "To go ashore, without liquids", found: ofLightship, limit: mostOfLightship },
  "previous-displacement": {
    name: "Displacement compared",
    found: (found) => comparedFound(found, "t"),
    limit: ({ share }) => `at most ${percent(share, 2)}`,
  },
  "previous-lcg": {
    name: "LCG compared",
    found: (found) => comparedFound(found, "m"),
    limit: ({ share }) => `at most ${percent(share, 1)} of length`,
  },
  "previous-vcg": {
    name: "VCG compared",
    found: (found) => comparedFound(found, "m"),
    limit: ({ share }) => `at most ${percent(share, 1)}`,
  },
};

const verdicts: Readonly<Record<Verdict, string>> = { met: "met", attention: "attention", "not-met": "not met" };

/** What is checked, as a line of the list names it. */
export function checkName(id: CheckId): string {
  return words[id].name;
}

/** What a check found, in words. */
export function foundWords(finding: Finding): string {
  return wordsOf(finding).found(finding.found, finding);
}

/** What a check is held against, in words; a limit of our own is called a setting. */
export function limitWords(finding: Finding): string {
  return wordsOf(finding).limit(finding.limit);
}

/** The verdict as a word. */
export function verdictWord(verdict: Verdict): string {
  return verdicts[verdict];
}

type AnyWords = {
  readonly found: (found: Finding["found"], finding: Finding) => string;
  readonly limit: (limit: Finding["limit"]) => string;
};

// the table pairs each check with its own words; the pairing itself is beyond the checker
function wordsOf(finding: Finding): AnyWords {
  return words[finding.id] as unknown as AnyWords;
}

function straightnessFound({ standardised, move, probability }: Of<"straightness">["found"]): string {
  if (standardised === null) return "too few moves to tell";
  const lack = probability === null ? "no moment repeated" : `lack of fit as large in ${percent(probability, 1)} of straight lines`;
  return `move ${move} off by ${figure(Math.abs(standardised), 1)} standard deviations; ${lack}`;
}

function straightnessLimit({ standardised, probability }: Of<"straightness">["limit"]): string {
  const most = standardised === null ? "" : `at most ${figure(standardised, 1)} standard deviations; `;
  return `${most}lack of fit not below ${limitPercent(probability)} (a setting)`;
}

function markAgreementFound({ suspects, marks, degreesOfFreedom }: Of<"mark-agreement">["found"]): string {
  if (degreesOfFreedom === 0) return `${marks} marks just suffice: nothing tells whether they agree`;
  if (suspects.length === 0) return `${marks} marks agree with one waterplane`;
  const each = suspects.map(({ mark, error }) => `${mark} (by ${signedFigure(error, 3)} m)`);
  const [only, ...others] = each;
  if (others.length === 0) return `read ${only} again: it alone would explain the misfit`;
  return `read again: one of ${each.join(", ")} may be wrong, and these marks can’t tell which`;
}

function changeFound(found: Change): string {
  return found === null ? "not read in both rounds" : `${found.at} changed most: ${signedFigure(found.change, 3)} m`;
}

function headcountFound(found: Of<"headcount">["found"]): string {
  if (found === null) return "not noted";
  return found.least === found.most ? `${found.least} throughout` : `${found.least} to ${found.most}`;
}

function ofLightship({ share }: { readonly share: number }): string {
  return `${percent(share, 1)} of the lightship`;
}

function mostOfLightship({ share }: { readonly share: number }): string {
  return `at most ${limitPercent(share)} of the lightship`;
}

function comparedFound({ kind, deviation, other }: Of<"previous-lcg">["found"], unit: string): string {
  return `${signedPercent(deviation)} against ${shortFigure(other)} ${unit} of ${kind === "earlier" ? "the earlier test" : "the sister ship"}`;
}

function bothSides({ port, starboard }: { readonly port: number; readonly starboard: number }, words: (side: number) => string): string {
  return `${words(port)} to port, ${words(starboard)} to starboard`;
}

function sides({ port, starboard }: { readonly port: number; readonly starboard: number }): string {
  return `${port} to port and ${starboard} to starboard`;
}

function counted(count: number, what: string): string {
  return `${count} ${what}${count === 1 ? "" : "s"}`;
}

function percent(share: number, decimals: number): string {
  return `${figure(100 * share, decimals)} %`;
}

// a limit stands as it was set
function limitPercent(share: number): string {
  return `${shortFigure(100 * share)} %`;
}

function signedPercent(share: number): string {
  return `${signedFigure(100 * share, 2)} %`;
}
