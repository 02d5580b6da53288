import { answer, type Refusal, type Result, refuse } from "@/lib/result";
import type { DrawnModel } from "./monte-carlo";
import type { UncertainInput } from "./uncertain-input";

/** How an answer of several numbers changes with each input, per standard uncertainty: linear and quadratic part. */
export type LocalExpansion = {
  readonly values: readonly number[];
  /** by input, then by number */
  readonly linear: readonly (readonly number[])[];
  readonly quadratic: readonly (readonly number[])[];
};

export type Model<T, R extends Refusal> = (given: T, input: UncertainInput<T> | null) => Result<readonly number[], R>;

/**
 * The second-order expansion of a model about what is given, inputs one by one, each stepped by its standard uncertainty u:
 *
 *     y(z) = y₀ + Σ (aₖ·zₖ + bₖ·zₖ²),   aₖ = (y(+uₖ) − y(−uₖ))/2,   bₖ = (y(+uₖ) + y(−uₖ))/2 − y₀
 *
 * zₖ: how many standard uncertainties the input is off. Products of two inputs are left out: whoever uses it shows that they
 * do not count. Where a step to one side is refused (a tank that is
 * empty as sounded), the other side alone gives the slope.
 * Refused: what the model refuses where it stands, or to both sides of it.
 * Source: JCGM 100:2008, 5.1.3 note 2 (numerical sensitivities) *from memory*.
 */
export function localExpansion<T, R extends Refusal>(
  model: Model<T, R>,
  given: T,
  inputs: readonly UncertainInput<T>[],
): Result<LocalExpansion, R> {
  const here = model(given, null);
  if (!here.ok) return here;
  const linear: (readonly number[])[] = [];
  const quadratic: (readonly number[])[] = [];
  for (const input of inputs) {
    const up = model(input.shifted(given, input.standard), input);
    const down = model(input.shifted(given, -input.standard), input);
    if (!up.ok && !down.ok) return refuse(up.refusal);
    const above = up.ok ? up.value : mirrored(here.value, down.ok ? down.value : []);
    const below = down.ok ? down.value : mirrored(here.value, above);
    linear.push(here.value.map((_, i) => ((above[i] ?? 0) - (below[i] ?? 0)) / 2));
    quadratic.push(here.value.map((value, i) => ((above[i] ?? 0) + (below[i] ?? 0)) / 2 - value));
  }
  return answer({ values: here.value, linear, quadratic });
}

/** The expansion as a model to draw from. */
export function modelOf({ values, linear, quadratic }: LocalExpansion): DrawnModel {
  const inputs = linear.length;
  const slopes = Float64Array.from(values.flatMap((_, i) => linear.map((row) => row[i] ?? 0)));
  const bends = Float64Array.from(values.flatMap((_, i) => quadratic.map((row) => row[i] ?? 0)));
  return {
    numbers: values.length,
    into: (off, answer) => {
      for (let i = 0; i < values.length; i++) {
        let value = values[i] as number;
        for (let k = 0; k < inputs; k++) {
          const z = off[k] as number;
          value += z * ((slopes[i * inputs + k] as number) + z * (bends[i * inputs + k] as number));
        }
        answer[i] = value;
      }
    },
  };
}

function mirrored(here: readonly number[], there: readonly number[]): number[] {
  return here.map((value, i) => 2 * value - (there[i] ?? value));
}
