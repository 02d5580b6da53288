import { typedText } from "@/components/ui/typed-number";
import type { ReadingValue } from "@/lib/sync/event";
import type { Conditions, ConditionsForm } from "./conditions-form";

export const emptyConditions: ConditionsForm = { wind: "", moorings: "", underKeel: "", headcount: "", bobFree: "", note: "" };

/** The texts that would give this condition again. */
export function formOfConditions(value: ReadingValue): ConditionsForm {
  const seen = value as Conditions;
  return {
    wind: seen.wind ?? "",
    moorings: seen.moorings ?? "",
    underKeel: seen.underKeel === undefined ? "" : typedText(seen.underKeel),
    headcount: seen.headcount === undefined ? "" : String(seen.headcount),
    bobFree: seen.bobFree === undefined ? "" : seen.bobFree ? "yes" : "no",
    note: seen.note ?? "",
  };
}
