import type { CheckId, Finding } from "@/lib/inclining/checks/finding";

const isCode = "IMO 2008 IS Code, part B";

const sources: Readonly<Record<CheckId, string>> = {
  "heel-range": `${isCode}, annex 1 (from memory)`,
  deflection: `${isCode}, annex 1 (from memory)`,
  stations: `${isCode}, ch. 8; one below 30 m: class practice (from memory)`,
  "unequal-lengths": `${isCode}, annex 1 (from memory); IMO gives no number`,
  movements: `${isCode}, 8.4.1.2`,
  straightness: `statistical test; IMO gives no number (${isCode}, 8.4.1.2 asks for a straight line)`,
  "station-agreement": "common practice; IMO gives no number",
  "station-sense": "common practice",
  "zero-drift": `${isCode}, 8.4.1.2 rechecks the zero; IMO gives no number`,
  "initial-list": `${isCode}, annex 1 (from memory)`,
  trim: "class practice; 46 CFR (from memory)",
  "waterline-marks": `${isCode}, 8.4.1.1`,
  "mark-agreement": "common practice; no standard gives a number",
  "drafts-before-after": "common practice",
  "water-samples": `${isCode}, annex 1 (from memory)`,
  "slack-tanks": `${isCode}, annex 1 (from memory)`,
  "slack-levels": `${isCode}, annex 1 (from memory)`,
  "soundings-before-after": "common practice",
  headcount: `${isCode}, annex 1: number of people constant`,
  "under-keel": `${isCode}, 8.2.2.6; IMO gives no number`,
  certificates: `${isCode}, ch. 8: certified weights`,
  missing: "IACS Rec. 31 (from memory)",
  surplus: "IACS Rec. 31 (from memory)",
  "previous-displacement": "SOLAS II-1/5.5",
  "previous-lcg": "SOLAS II-1/5.5",
  "previous-vcg": "SOLAS II-1/5.4, explanatory notes",
};

const ofSister = "MSC/Circ.1158, sister ships";

/** Where the limit of a check comes from; one that the test sets for itself is called so, beside the source of the usual one. */
export function checkSource(finding: Finding): string {
  return finding.isSetForTest ? `a setting of this test, in place of the usual limit (${usualSource(finding)})` : usualSource(finding);
}

function usualSource(finding: Finding): string {
  const isOfSister = finding.id === "previous-displacement" || finding.id === "previous-lcg";
  return isOfSister && finding.found.kind === "sister" ? ofSister : sources[finding.id];
}
