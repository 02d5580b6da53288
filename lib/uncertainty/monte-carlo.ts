import type { Noise } from "@/lib/numerics/seeded-noise";
import type { Chance } from "./uncertain-input";

/** Values drawn of each number of an answer. */
export type Draws = readonly Float64Array[];

/** Fills in the numbers of an answer for inputs that are off by so many standard uncertainties each. */
export type DrawnModel = { readonly numbers: number; readonly into: (off: Float64Array, answer: Float64Array) => void };

/**
 * Draws of a model's answer: every input off by chance at once, each by its own distribution. Shared causes are shared,
 * because each input is drawn once for all it acts on.
 *
 * Drawn in stretches, so that whoever waits can be told how far it has come: the generator gives the number drawn so far.
 * Source: JCGM 101:2008, 6.4 and 7.2 *from memory*.
 */
export function* drawnInStretches(
  model: DrawnModel,
  chances: readonly Chance[],
  draws: number,
  noise: Noise,
  stretch = 10_000,
): Generator<number, Draws> {
  const drawn = Array.from({ length: model.numbers }, () => new Float64Array(draws));
  const off = new Float64Array(chances.length);
  const answer = new Float64Array(model.numbers);
  for (let draw = 0; draw < draws; draw++) {
    for (let k = 0; k < chances.length; k++) off[k] = standardDraw(chances[k] as Chance, noise);
    model.into(off, answer);
    for (let i = 0; i < drawn.length; i++) (drawn[i] as Float64Array)[draw] = answer[i] as number;
    if ((draw + 1) % stretch === 0) yield draw + 1;
  }
  return drawn;
}

/** All draws at once. See `drawnInStretches`. */
export function drawnAtOnce(model: DrawnModel, chances: readonly Chance[], draws: number, noise: Noise): Draws {
  const stretches = drawnInStretches(model, chances, draws, noise, draws);
  for (;;) {
    const step = stretches.next();
    if (step.done) return step.value;
  }
}

/**
 * The probabilistically symmetric 95 % interval of drawn values: their quantiles at 2.5 % and 97.5 %.
 * Source: JCGM 101:2008, 7.7 *from memory*.
 */
export function interval95(drawn: Float64Array): readonly [number, number] {
  const sorted = drawn.slice().sort();
  return [quantile(sorted, 0.025), quantile(sorted, 0.975)];
}

function quantile(sorted: Float64Array, share: number): number {
  const place = share * (sorted.length - 1);
  const [low, high] = [sorted[Math.floor(place)] ?? Number.NaN, sorted[Math.ceil(place)] ?? Number.NaN];
  return low + (high - low) * (place - Math.floor(place));
}

const rootOfThree = Math.sqrt(3);

/** How many standard uncertainties an input is off; Student's t as it is, with its wider spread. */
function standardDraw({ distribution, degreesOfFreedom }: Chance, noise: Noise): number {
  if (distribution === "rectangular") return rootOfThree * (2 * noise.uniform() - 1);
  if (degreesOfFreedom === null) return noise.normal(1);
  let squares = 0;
  for (let i = 0; i < degreesOfFreedom; i++) squares += noise.normal(1) ** 2;
  return noise.normal(1) / Math.sqrt(squares / degreesOfFreedom);
}
