import type { Defence } from "@/lib/lightship/defended-lightship";
import type { IncliningResult } from "@/lib/lightship/inclining-result";
import type { Stating } from "@/lib/lightship/lightship-interval";
import type { Cause } from "@/lib/lightship/uncertain-inputs";
import { assumptionSentences } from "./assumption-sentences";

/** The whole result of a test as it is handed on: what was found, how far it can be trusted, what was taken for granted. */
export type ResultDocument = Omit<IncliningResult, "lightship"> & {
  readonly lightship: IncliningResult["lightship"] & Pick<Defence, "interval95">;
  readonly budget: readonly { readonly input: Cause; readonly share: number }[];
  readonly assumptions: readonly string[];
};

/** The result of a test, with its defence, in the shape of the record format's result. */
export function resultDocument(test: Stating, result: IncliningResult, { interval95, budget }: Defence): ResultDocument {
  return {
    ...result,
    lightship: { ...result.lightship, interval95 },
    budget: budget.map(({ cause, share }) => ({ input: cause, share })),
    assumptions: assumptionSentences(test, result),
  };
}
