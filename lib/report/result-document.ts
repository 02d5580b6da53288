import type { CheckId, Verdict } from "@/lib/inclining/checks/finding";
import type { HintCause } from "@/lib/inclining/plot-hints";
import type { Defence } from "@/lib/lightship/defended-lightship";
import type { Examination } from "@/lib/lightship/examination";
import type { IncliningResult, LightshipTestData } from "@/lib/lightship/inclining-result";
import type { Stating } from "@/lib/lightship/lightship-interval";
import type { Cause } from "@/lib/lightship/uncertain-inputs";
import { assumptionSentences } from "./assumption-sentences";
import { checkSource } from "./check-sources";
import { foundWords, limitWords } from "./check-words";
import { hintEvidence } from "./hint-words";

/** The whole result of a test as it is handed on: what was found, how far it can be trusted, what was taken for granted. */
export type ResultDocument = Omit<IncliningResult, "lightship"> & {
  readonly lightship: IncliningResult["lightship"] & Pick<Defence, "interval95">;
  readonly budget: readonly { readonly input: Cause; readonly share: number }[];
  readonly checks: readonly CheckLine[];
  readonly hints: readonly HintLine[];
  readonly assumptions: readonly string[];
};

export type CheckLine = {
  readonly id: CheckId;
  readonly verdict: Verdict;
  readonly found: string;
  readonly limit: string;
  readonly source: string;
};

export type HintLine = { readonly cause: HintCause; readonly moves: readonly number[]; readonly evidence: string };

/** The result of a test, with its defence and what was found about the test itself, in the shape of the record format's result. */
export function resultDocument(
  test: LightshipTestData & Stating,
  result: IncliningResult,
  { interval95, budget }: Defence,
  { checks, hints }: Examination,
): ResultDocument {
  return {
    ...result,
    lightship: { ...result.lightship, interval95 },
    budget: budget.map(({ cause, share }) => ({ input: cause, share })),
    checks: checks.map((finding) => ({
      id: finding.id,
      verdict: finding.verdict,
      found: foundWords(finding),
      limit: limitWords(finding),
      source: checkSource(finding),
    })),
    hints: hints.map((hint) => ({ cause: hint.cause, moves: hint.moves, evidence: hintEvidence(hint) })),
    assumptions: assumptionSentences(test, result),
  };
}
