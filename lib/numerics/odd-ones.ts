export type OddOne = { readonly index: number; readonly value: number; readonly expected: number };

/** How many times further than its neighbours a value must stand from the curve. */
const timesNeighbours = 6;
const reach = 2;
const fewest = 6;

/**
 * The values of a smooth curve that stand off it. Each is held against the polynomial through its four nearest neighbours;
 * it is odd where it differs by more than `least`, and by more than six times what its neighbours still differ once it has
 * been put right: a wrong figure spoils theirs, a true one does not. The two ends are not judged; fewer than six points
 * show nothing.
 *
 *     p(x) = Σⱼ yⱼ·Πₖ≠ⱼ (x − xₖ)/(xⱼ − xₖ)
 *
 * Abscissae are distinct and in order. Source: Lagrange's interpolation; finding a wrong figure in a table from the run of
 * its neighbours is the method of differences (common practice).
 */
export function oddOnes(xs: readonly number[], ys: readonly number[], least: number): readonly OddOne[] {
  if (xs.length < fewest) return [];
  const judged = ys.map((value, index) => judgement(xs, ys, value, index));
  return judged.flatMap(({ value, index, expected, off, share }) => {
    const around = judged.slice(Math.max(index - reach - 1, 0), index + reach + 2);
    const isOdd = off > least && share * timesNeighbours < 1 && around.every((other) => other.share >= share);
    return isOdd ? [{ index, value, expected }] : [];
  });
}

/** How far a value is off, and what share of it its neighbours are still off once it is put right. */
function judgement(xs: readonly number[], ys: readonly number[], value: number, index: number) {
  const isEnd = index === 0 || index === ys.length - 1;
  const expected = isEnd ? value : fromNeighbours(xs, ys, index);
  const off = Math.abs(value - expected);
  return {
    value,
    index,
    expected,
    off,
    share: off === 0 ? Number.POSITIVE_INFINITY : mostOffAround(xs, ys.with(index, expected), index) / off,
  };
}

function mostOffAround(xs: readonly number[], ys: readonly number[], index: number): number {
  const around = xs.map((_, k) => k).filter((k) => k !== index && Math.abs(k - index) <= reach + 1);
  return Math.max(...around.map((k) => Math.abs((ys[k] as number) - fromNeighbours(xs, ys, k))));
}

function fromNeighbours(xs: readonly number[], ys: readonly number[], i: number): number {
  const first = Math.min(Math.max(i - reach, 0), xs.length - 2 * reach - 1);
  const others = Array.from({ length: 2 * reach + 1 }, (_, k) => first + k).filter((k) => k !== i);
  const x = xs[i] as number;
  const weight = (j: number) =>
    others.reduce((product, k) => (k === j ? product : (product * (x - (xs[k] as number))) / ((xs[j] as number) - (xs[k] as number))), 1);
  return others.reduce((sum, j) => sum + weight(j) * (ys[j] as number), 0);
}
