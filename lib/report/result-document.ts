import type { CheckId, Verdict } from "@/lib/inclining/checks/finding";
import type { Faults } from "@/lib/inclining/faults";
import type { HintCause } from "@/lib/inclining/plot-hints";
import type { CheckedTest } from "@/lib/lightship/checks";
import { type Defence, defendedLightship } from "@/lib/lightship/defended-lightship";
import { type Examination, examinationOf } from "@/lib/lightship/examination";
import { type IncliningResult, type LightshipTestData, resultOf } from "@/lib/lightship/inclining-result";
import type { Stating } from "@/lib/lightship/lightship-interval";
import { reducedTest } from "@/lib/lightship/reduced-test";
import type { Cause } from "@/lib/lightship/uncertain-inputs";
import { answer, type Result } from "@/lib/result";
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

/** The whole result of a test, by one reduction. Refused with every fault and its place in the record. */
export function wholeResult(test: CheckedTest & LightshipTestData & Stating): Result<ResultDocument, Faults> {
  const reduced = reducedTest(test);
  if (!reduced.ok) return reduced;
  const defence = defendedLightship(test, reduced);
  if (!defence.ok) return defence;
  return answer(resultDocument(test, resultOf(test, reduced.value), defence.value, examinationOf(test, reduced.value)));
}

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
