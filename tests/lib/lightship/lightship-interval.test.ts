import { beforeAll, describe, expect, test } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { incliningResult, type LightshipTestData } from "@/lib/lightship/inclining-result";
import { budgetOfVcg, numbersWithInterval, type UncertainLightship, uncertainLightship } from "@/lib/lightship/lightship-interval";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { mean } from "@/lib/numerics/sum";
import { promised } from "@/lib/result";
import { modelOf } from "@/lib/uncertainty/local-expansion";
import { drawnAtOnce, interval95 } from "@/lib/uncertainty/monte-carlo";

const { record, truth } = skerryTern();
const ternTest = { ...record, readings: skerryTernReadings(7) };
let uncertain: UncertainLightship;

beforeAll(() => {
  uncertain = promised(uncertainLightship(ternTest));
});

test("stands at the lightship that the reduction gives", () => {
  const { lightship } = promised(incliningResult(ternTest));
  expect(uncertain.expansion.values).toEqual(numbersWithInterval.map((number) => lightship[number]));
});

test("holds the simulated ship's lightship in its 95 % intervals", () => {
  const draws = drawnAtOnce(modelOf(uncertain.expansion), uncertain.inputs, 100_000, seededNoise(1));
  for (const [i, number] of numbersWithInterval.entries()) {
    const [low, high] = interval95(draws[i] ?? new Float64Array());
    const real = number === "vcgGeneralised" ? truth.lightship.vcg : truth.lightship[number];
    expect(real).toBeGreaterThan(low);
    expect(real).toBeLessThan(high);
  }
});

test("says what to measure better: shares that sum to one, the largest first", () => {
  const budget = budgetOfVcg(uncertain);
  expect(budget.reduce((total, { share }) => total + share, 0)).toBeCloseTo(1, 12);
  expect(budget.map(({ share }) => share)).toEqual(budget.map(({ share }) => share).sort((a, b) => b - a));
  const stated = { ...ternTest.uncertainty, draft: 0.05 };
  expect(budgetOfVcg(promised(uncertainLightship({ ...ternTest, uncertainty: stated })))[0]?.cause).toBe("drafts");
});

describe("the expansion", () => {
  test("draws what the whole reduction gives with every input off at once: products of two inputs do not count", () => {
    // without the metacentre's own uncertainty, which is no part of the test
    const inputs = uncertain.inputs.slice(0, -1);
    const noise = seededNoise(4);
    const into = modelOf({ ...uncertain.expansion, linear: uncertain.expansion.linear.slice(0, -1) }).into;
    const found = new Float64Array(4);
    const spreads = numbersWithInterval.map((_, i) => Math.hypot(...uncertain.expansion.linear.map((row) => row[i] ?? 0)));
    const departures = Array.from({ length: 40 }, () => {
      const off = inputs.map(() => noise.normal(1));
      const moved = inputs.reduce(
        (given: LightshipTestData, { shifted, standard }, k) => shifted(given, standard * (off[k] ?? 0)),
        ternTest,
      );
      const { lightship } = promised(incliningResult(moved));
      into(Float64Array.from(off), found);
      return numbersWithInterval.map((number, i) => Math.abs((lightship[number] ?? Number.NaN) - (found[i] ?? 0)) / (spreads[i] ?? 0));
    });
    for (const [i] of numbersWithInterval.entries()) expect(mean(departures.map((row) => row[i] ?? 1))).toBeLessThan(0.02);
  });
});
