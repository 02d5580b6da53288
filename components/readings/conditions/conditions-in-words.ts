import type { ReadingValue } from "@/lib/sync/event";
import type { Conditions } from "./conditions-form";

/** What was seen, in one line. */
export function conditionsInWords(value: ReadingValue): string {
  const seen = value as Conditions;
  const words = [
    seen.wind && `wind ${seen.wind}`,
    seen.moorings && `moorings ${seen.moorings}`,
    seen.underKeel !== undefined && `${seen.underKeel} m under the keel`,
    seen.headcount !== undefined && `${seen.headcount} aboard`,
    seen.bobFree !== undefined && (seen.bobFree ? "bob free" : "bob not free"),
    seen.note,
  ];
  return words.filter(Boolean).join(", ");
}
