import { typedNumber, typedText } from "@/components/ui/typed-number";
import { answer, type Result, refuse } from "@/lib/result";

/** A draft or freeboard while it is typed: the estimates taken and the digits of the next one [m]. */
export type MarkEntry = { readonly estimates: readonly string[]; readonly typing: string };
export type MarkValue = { readonly value: number; readonly estimates?: number[] };

export type MarkRefusal =
  | { readonly type: "NothingTyped" }
  | { readonly type: "OutOfReach"; readonly value: number; readonly from: number; readonly to: number };

export const emptyMarkEntry: MarkEntry = { estimates: [], typing: "" };

/** No ship's marks run further; a draft typed in centimetres or feet lands outside. *common practice* */
const reach = { draft: { from: 0, to: 30 }, freeboard: { from: -2, to: 30 } } as const;

/** Estimates further apart than this were taken on different waves [m]. *common practice* */
const APART = 0.1;

export function estimatesOf({ estimates, typing }: MarkEntry): number[] {
  return [...estimates, typing].map(typedNumber).filter((value) => value !== null);
}

/** Mean of the estimates [m]; null before the first. */
export function meanOf(values: readonly number[]): number | null {
  return values.length === 0 ? null : values.reduce((sum, value) => sum + value, 0) / values.length;
}

/** The reading as it is kept: the mean, and the estimates where there are several. */
export function markValue(entry: MarkEntry, kind: "draft" | "freeboard"): Result<MarkValue, MarkRefusal> {
  const estimates = estimatesOf(entry);
  const value = meanOf(estimates);
  if (value === null) return refuse({ type: "NothingTyped" });
  const { from, to } = reach[kind];
  const outside = estimates.find((each) => each < from || each > to);
  if (outside !== undefined) return refuse({ type: "OutOfReach", value: outside, from, to });
  return answer(estimates.length === 1 ? { value } : { value, estimates });
}

export function markSentence(refusal: MarkRefusal): string | null {
  if (refusal.type === "NothingTyped") return null;
  return `${typedText(refusal.value)} m is no reading in metres: marks run from ${typedText(refusal.from)} to ${refusal.to} m.`;
}

/** What to look at again: estimates too far apart to be one waterline. */
export function markSecondLook(entry: MarkEntry): string | null {
  const values = estimatesOf(entry);
  const spread = Math.max(...values) - Math.min(...values);
  return values.length > 1 && spread > APART ? `The estimates ${values.join(", ")} m lie more than 0.1 m apart.` : null;
}

export function entryOfMark({ value, estimates }: MarkValue): MarkEntry {
  const all = estimates ?? [value];
  return { estimates: all.slice(0, -1).map(typedText), typing: all.slice(-1).map(typedText).join("") };
}
