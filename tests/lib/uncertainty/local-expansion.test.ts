import { expect, test } from "vitest";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { answer, promised, refuse } from "@/lib/result";
import { localExpansion, modelOf } from "@/lib/uncertainty/local-expansion";
import { drawnAtOnce, interval95 } from "@/lib/uncertainty/monte-carlo";
import type { UncertainInput } from "@/lib/uncertainty/uncertain-input";

type Given = { readonly a: number; readonly b: number };
const input = (key: keyof Given, standard: number): UncertainInput<Given> => ({
  cause: key,
  standard,
  degreesOfFreedom: null,
  shifted: (given, by) => ({ ...given, [key]: given[key] + by }),
});

test("is exact for sums of parabolas", () => {
  const model = ({ a, b }: Given) => answer([3 + 2 * a - 5 * a * a + b, b * b]);
  const given = { a: 0.4, b: -1 };
  const { values, ...parts } = promised(localExpansion(model, given, [input("a", 0.1), input("b", 0.2)]));
  const into = modelOf({ values, ...parts }).into;
  const found = new Float64Array(2);
  for (const [za, zb] of [
    [0, 0],
    [1, -2],
    [2.5, 0.7],
  ] as const) {
    into(Float64Array.of(za, zb), found);
    const exact = promised(model({ a: 0.4 + 0.1 * za, b: -1 + 0.2 * zb }));
    expect(found[0]).toBeCloseTo(exact[0] ?? Number.NaN, 12);
    expect(found[1]).toBeCloseTo(exact[1] ?? Number.NaN, 12);
  }
});

test("takes the slope of one side where the other is refused", () => {
  const model = ({ a }: Given) => (a < 0 ? refuse({ type: "Empty" as const }) : answer([7 * a]));
  const { linear, quadratic } = promised(localExpansion(model, { a: 0, b: 0 }, [input("a", 0.5)]));
  expect(linear[0]?.[0]).toBeCloseTo(3.5, 12);
  expect(quadratic[0]?.[0]).toBeCloseTo(0, 12);
});

test("refuses what the model refuses where it stands, and to both sides of it", () => {
  const never = () => refuse({ type: "Never" as const });
  expect(localExpansion(never, { a: 0, b: 0 }, [])).toEqual(refuse({ type: "Never" }));
  const onlyHere = ({ a }: Given) => (a === 1 ? answer([1]) : refuse({ type: "Moved" as const }));
  expect(localExpansion(onlyHere, { a: 1, b: 0 }, [input("a", 0.1)])).toEqual(refuse({ type: "Moved" }));
});

test("spreads draws as the sum of the squares says", () => {
  const model = ({ a, b }: Given) => answer([a + 2 * b]);
  const inputs = [input("a", 3), input("b", 2)];
  const expansion = promised(localExpansion(model, { a: 10, b: 0 }, inputs));
  const [drawn] = drawnAtOnce(modelOf(expansion), inputs, 200_000, seededNoise(11));
  const [low, high] = interval95(drawn ?? new Float64Array());
  // u = √(3² + (2·2)²) = 5
  expect(Math.abs(low - (10 - 1.959964 * 5))).toBeLessThan(0.1);
  expect(high - low).toBeGreaterThan(2 * 1.959964 * 5 * 0.99);
  expect(high - low).toBeLessThan(2 * 1.959964 * 5 * 1.01);
});
