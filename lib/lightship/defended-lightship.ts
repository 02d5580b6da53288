import type { Faults } from "@/lib/inclining/faults";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { answer, type Result } from "@/lib/result";
import type { BudgetLine } from "@/lib/uncertainty/budget";
import { modelOf } from "@/lib/uncertainty/local-expansion";
import { drawnInStretches, interval95 } from "@/lib/uncertainty/monte-carlo";
import type { LightshipTestData } from "./inclining-result";
import { budgetOfVcg, type NumberWithInterval, numbersWithInterval, type Stating, uncertainLightship } from "./lightship-interval";
import { type ReducedTest, reducedTest } from "./reduced-test";
import type { Cause } from "./uncertain-inputs";

export type Interval = readonly [low: number, high: number];

/** How far a lightship can be trusted. */
export type Defence = {
  /** that of the generalised KG only where there is one */
  readonly interval95: Readonly<Record<Exclude<NumberWithInterval, "vcgGeneralised">, Interval>> & { readonly vcgGeneralised?: Interval };
  /** of the lightship's KG by the reduction that is the headline */
  readonly budget: readonly (BudgetLine & { readonly cause: Cause })[];
  readonly draws: number;
};

/** What a test is drawn with where it does not say: enough for three digits of an interval. */
export const usualDraws = 100_000;
const usualSeed = 1;

/**
 * 95 % intervals of a test's lightship and what contributes to them, told stretch by stretch how many draws are done.
 * The same seed gives the same digits everywhere. See `uncertainLightship` and `drawnInStretches`.
 * Refused: what the reduction refuses.
 */
export function* defendedInStretches(
  test: LightshipTestData & Stating,
  reduced: Result<ReducedTest, Faults> = reducedTest(test),
): Generator<number, Result<Defence, Faults>> {
  const { seed = usualSeed, draws = usualDraws } = test.settings ?? {};
  const uncertain = uncertainLightship(test, reduced);
  if (!uncertain.ok) return uncertain;
  const { expansion, inputs } = uncertain.value;
  const drawn = yield* drawnInStretches(modelOf(expansion), inputs, draws, seededNoise(seed));
  const intervals = drawn.map((values, i) => [numbersWithInterval[i], interval95(values)] as const);
  const isGeneralised = test.settings?.method === "generalised" && drawn.length === numbersWithInterval.length;
  return answer({
    interval95: Object.fromEntries(intervals) as Defence["interval95"],
    budget: budgetOfVcg(uncertain.value, isGeneralised ? "vcgGeneralised" : "vcg"),
    draws,
  });
}

/** All at once. See `defendedInStretches`. */
export function defendedLightship(...asked: Parameters<typeof defendedInStretches>): Result<Defence, Faults> {
  const stretches = defendedInStretches(...asked);
  for (;;) {
    const step = stretches.next();
    if (step.done) return step.value;
  }
}
