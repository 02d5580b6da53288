import { markRow, type Waterline } from "./waterline";

/** A mark that by itself would explain the misfit, with the error it would have to have [m]. */
export type MarkSuspect = { readonly mark: string; readonly error: number };

/**
 * The marks among which a wrong reading hides, most likely first; empty where no mark is off by more than `limit`.
 *
 * If mark k alone is wrong by e, the residuals are r = e·(I − H)₍ₖ₎, so e = rₖ/(1 − hₖ), and correcting it takes rₖ²/(1 − hₖ)
 * off the sum of squares. Every mark that takes off nearly as much as the best one is a candidate: few marks cannot separate
 * them, and naming one would be a guess. A mark that the fit rests on wholly (h = 1) can't be judged and is left out.
 *
 * Source: W. Baarda, A testing procedure for use in geodetic networks (1968), data snooping (from memory).
 */
export function markSuspects(waterline: Waterline, limit: number): readonly MarkSuspect[] {
  const judged = waterline.points.flatMap(({ mark, x, y }) => {
    const free = 1 - leverage(waterline, x, y);
    const residual = waterline.residuals[mark] as number;
    return free > 1e-9 ? [{ mark, error: residual / free, explained: residual ** 2 / free }] : [];
  });
  const best = Math.max(...judged.map(({ explained }) => explained), 0);
  return judged
    .filter(({ error, explained }) => explained >= nearlyAsMuch * best && Math.abs(error) > limit)
    .sort((a, b) => b.explained - a.explained)
    .map(({ mark, error }) => ({ mark, error }));
}

/** Share of the best explanation from which on another one can't be told from it; a choice of ours. */
const nearlyAsMuch = 0.8;

function leverage({ plane, covariance }: Waterline, x: number, y: number): number {
  const row = markRow(plane.lbp, x, y);
  return row.reduce((total, left, i) => total + left * row.reduce((inner, right, j) => inner + (covariance[i]?.[j] ?? 0) * right, 0), 0);
}
