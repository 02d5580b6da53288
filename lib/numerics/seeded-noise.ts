/** Chance that repeats: the same seed gives the same numbers on every machine. */
export type Noise = {
  /** between 0 and 1 */
  readonly uniform: () => number;
  /** of mean 0 and the given standard deviation */
  readonly normal: (deviation: number) => number;
};

/**
 * Noise from a seed.
 * Source: generator mulberry32 (T. Ettinger, public domain) and the transform of Box and Muller (1958), both *from memory*.
 */
export function seededNoise(seed: number): Noise {
  let state = seed >>> 0;
  function uniform(): number {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  }
  function normal(deviation: number): number {
    const radius = Math.sqrt(-2 * Math.log(1 - uniform()));
    return deviation * radius * Math.cos(2 * Math.PI * uniform());
  }
  return { uniform, normal };
}
