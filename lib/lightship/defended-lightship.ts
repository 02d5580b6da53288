import type { Faults } from "@/lib/inclining/faults";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { answer, type Result } from "@/lib/result";
import type { BudgetLine } from "@/lib/uncertainty/budget";
import { modelOf } from "@/lib/uncertainty/local-expansion";
import { drawnInStretches, interval95 } from "@/lib/uncertainty/monte-carlo";
import type { LightshipTestData } from "./inclining-result";
import { budgetOfVcg, numbersWithInterval, type Stating, uncertainLightship } from "./lightship-interval";
import type { Cause } from "./uncertain-inputs";

export type Interval = readonly [low: number, high: number];

/** How far a lightship can be trusted. */
export type Defence = {
  readonly interval95: Readonly<Record<(typeof numbersWithInterval)[number], Interval>>;
  /** of the lightship's KG */
  readonly budget: readonly (BudgetLine & { readonly cause: Cause })[];
  readonly draws: number;
};

export type Drawing = { readonly seed?: number; readonly draws?: number };

/** What a test is drawn with where it does not say: enough for three digits of an interval. */
export const usualDraws = 100_000;
const usualSeed = 1;

/**
 * 95 % intervals of a test's lightship and what contributes to them, told stretch by stretch how many draws are done.
 * The same seed gives the same digits everywhere. See `uncertainLightship` and `drawnInStretches`.
 * Refused: what the reduction refuses.
 */
export function* defendedInStretches(
  test: LightshipTestData & Stating & { readonly settings?: Drawing },
): Generator<number, Result<Defence, Faults>> {
  const { seed = usualSeed, draws = usualDraws } = test.settings ?? {};
  const uncertain = uncertainLightship(test);
  if (!uncertain.ok) return uncertain;
  const { expansion, inputs } = uncertain.value;
  const drawn = yield* drawnInStretches(modelOf(expansion), inputs, draws, seededNoise(seed));
  const intervals = numbersWithInterval.map((number, i) => [number, interval95(drawn[i] as Float64Array)] as const);
  return answer({ interval95: Object.fromEntries(intervals) as Defence["interval95"], budget: budgetOfVcg(uncertain.value), draws });
}

/** All at once. See `defendedInStretches`. */
export function defendedLightship(test: Parameters<typeof defendedInStretches>[0]): Result<Defence, Faults> {
  const stretches = defendedInStretches(test);
  for (;;) {
    const step = stretches.next();
    if (step.done) return step.value;
  }
}
