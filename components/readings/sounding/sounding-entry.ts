import { typedNumber, typedText } from "@/components/ui/typed-number";
import { answer, type Result, refuse } from "@/lib/result";

export type SoundingEntry = { readonly typing: string };
export type SoundingValue = { readonly value: number };
export type SoundingRefusal =
  | { readonly type: "NothingTyped" }
  | { readonly type: "OutOfReach"; readonly value: number; readonly to: number };

export const emptySounding: SoundingEntry = { typing: "" };

/** No tape on board runs further [m]; centimetres typed as metres land outside. *common practice* */
const LONGEST_TAPE = 30;

/** A sounding or ullage [m]: zero or more, within the tape. */
export function soundingValue({ typing }: SoundingEntry): Result<SoundingValue, SoundingRefusal> {
  const value = typedNumber(typing);
  if (value === null) return refuse({ type: "NothingTyped" });
  if (value < 0 || value > LONGEST_TAPE) return refuse({ type: "OutOfReach", value, to: LONGEST_TAPE });
  return answer({ value });
}

export function soundingSentence(refusal: SoundingRefusal): string | null {
  if (refusal.type === "NothingTyped") return null;
  return `${typedText(refusal.value)} m is no sounding in metres: the tape runs from 0 to ${refusal.to} m.`;
}

export function entryOfSounding({ value }: SoundingValue): SoundingEntry {
  return { typing: typedText(value) };
}
