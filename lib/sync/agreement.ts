import { restingPoint } from "@/lib/inclining/resting-point";
import type { TestRecord } from "@/lib/record/test-record";
import type { ReadingValue } from "./event";
import type { SlotKind } from "./slot";

/** How far apart (max − min) readings of one slot may lie and still be replicates. Settings of the test; *common practice*. */
export type AgreementLimits = NonNullable<NonNullable<TestRecord["settings"]>["agreement"]>;

export const usualAgreement: AgreementLimits = { battenMm: 2, degrees: 0.02, draft: 0.02, sounding: 0.01, density: 0.0005 };

// what is measured with a tape: two people agree to a centimetre on a weight's place, half of that on a length
const PLACE = 0.01;
const LENGTH = 0.005;

/** Whether all values lie together within the limit of their kind. Conditions and notes do not contradict each other. */
export function isAgreed(kind: SlotKind, values: readonly ReadingValue[], limits: AgreementLimits): boolean {
  const compared = values.map((value) => comparedFigures(kind, value, limits));
  const width = Math.max(0, ...compared.map(({ length }) => length));
  return Array.from({ length: width }, (_, i) => compared.map((figures) => figures[i])).every(isTogether);
}

type Figure = { readonly figure: number; readonly limit: number };

function isTogether(figures: readonly (Figure | undefined)[]): boolean {
  // a reading of another shape than its neighbours can't agree with them
  if (figures.some((one) => one === undefined)) return false;
  const shown = figures.flatMap((one) => (one ? [one.figure] : []));
  const spread = Math.max(...shown) - Math.min(...shown);
  // 100.2 − 98.2 is 2.0000000000000004 in binary: exactly the limit agrees
  return spread <= (figures[0]?.limit ?? 0) * (1 + 1e-9);
}

function comparedFigures(kind: SlotKind, value: ReadingValue, limits: AgreementLimits): Figure[] {
  if ("valuesMm" in value) return rest(value.mode, value.valuesMm, limits.battenMm);
  if ("valuesDegrees" in value) return rest(value.mode, value.valuesDegrees, limits.degrees);
  if ("portMm" in value)
    return [...rest(value.mode, value.portMm, limits.battenMm), ...rest(value.mode, value.starboardMm, limits.battenMm)];
  if ("value" in value) return [{ figure: value.value, limit: kind === "draft" || kind === "freeboard" ? limits.draft : limits.sounding }];
  if ("density" in value) return [{ figure: value.density, limit: limits.density }];
  if ("place" in value) return value.place.map((figure) => ({ figure, limit: PLACE }));
  if ("length" in value) return [{ figure: value.length, limit: LENGTH }];
  return [];
}

function rest(mode: "settled" | "turning-points", values: readonly number[], limit: number): Figure[] {
  const point = restingPoint(mode, values);
  return point.ok ? [{ figure: point.value.value, limit }] : [];
}
