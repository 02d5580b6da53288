/**
 * Sum that keeps the digits a plain loop loses: the part cut off at every addition is carried along.
 * Error about one rounding of the result whatever the number of terms, and the same for any order to that rounding.
 *
 * Source: A. Neumaier, Rundungsfehleranalyse einiger Verfahren zur Summation endlicher Summen, ZAMM 54 (1974) 39–51 (from memory).
 */
export function sum(values: readonly number[]): number {
  let total = 0;
  let lost = 0;
  for (const value of values) {
    const next = total + value;
    lost += Math.abs(total) >= Math.abs(value) ? total - next + value : value - next + total;
    total = next;
  }
  return total + lost;
}

/** Σ aᵢ·bᵢ, the additions compensated. */
export function sumOfProducts(a: readonly number[], b: readonly number[]): number {
  return sum(a.map((value, i) => value * (b[i] as number)));
}

/** Arithmetic mean. The caller makes sure there is something to average. */
export function mean(values: readonly number[]): number {
  if (values.length === 0) throw new RangeError("mean of nothing");
  return sum(values) / values.length;
}

/** Experimental standard deviation, n − 1 degrees of freedom. The caller makes sure of two values. */
export function standardDeviation(values: readonly number[]): number {
  if (values.length < 2) throw new RangeError(`standard deviation of ${values.length} values`);
  const centre = mean(values);
  return Math.sqrt(sum(values.map((value) => (value - centre) ** 2)) / (values.length - 1));
}
