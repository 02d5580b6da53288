import { between, placeInTable, valueAt } from "@/lib/numerics/interpolation";
import { promised } from "@/lib/result";

type Points = readonly (readonly [number, number])[];

/** Half of a section: from the centreline at the keel over the deck edge (last but one) to the centreline at the deck (last). */
export type HalfSection = { readonly halfBreadths: readonly number[]; readonly heights: readonly number[] };

/**
 * Two neighbouring half-sections, keel to deck edge, with the same number of points, closed over the deck.
 * Equal numbers stay as they are; different ones are both resampled at the union of their girth fractions.
 */
export function resampledPair(aft: Points, forward: Points): readonly [HalfSection, HalfSection] {
  if (aft.length === forward.length) return [closedOverDeck(aft), closedOverDeck(forward)];
  const aftGirths = girthFractions(aft);
  const forwardGirths = girthFractions(forward);
  const union = unionOf(aftGirths, forwardGirths);
  return [closedOverDeck(resampled(aft, aftGirths, union)), closedOverDeck(resampled(forward, forwardGirths, union))];
}

function closedOverDeck(points: Points): HalfSection {
  const halfBreadths = points.map(([halfBreadth]) => halfBreadth);
  const heights = points.map(([, z]) => z);
  return { halfBreadths: [...halfBreadths, 0], heights: [...heights, heights.at(-1) as number] };
}

// distance along the girth over the whole girth; all zero where the section is a single place
function girthFractions(points: Points): number[] {
  const girths = [0];
  for (let i = 1; i < points.length; i++) girths.push((girths[i - 1] as number) + distance(points, i));
  const whole = girths.at(-1) as number;
  return whole === 0 ? girths : girths.map((girth) => girth / whole);
}

function distance(points: Points, i: number): number {
  const [y0, z0] = points[i - 1] as readonly [number, number];
  const [y1, z1] = points[i] as readonly [number, number];
  return Math.hypot(y1 - y0, z1 - z0);
}

// fractions nearer than rounding are one
function unionOf(a: readonly number[], b: readonly number[]): number[] {
  const sorted = [...a, ...b].sort((p, q) => p - q);
  return sorted.filter((fraction, i) => i === 0 || fraction - (sorted[i - 1] as number) > 1e-12);
}

function resampled(points: Points, girths: readonly number[], fractions: readonly number[]): Points {
  if (girths.at(-1) === 0) return fractions.map(() => points[0] as readonly [number, number]);
  const distinct = girths.map((_, i) => i).filter((i) => i === 0 || (girths[i] as number) > (girths[i - 1] as number));
  const knots = distinct.map((i) => girths[i] as number);
  const kept = distinct.map((i) => points[i] as readonly [number, number]);
  return fractions.map((fraction) => pointAtGirth(kept, knots, Math.min(fraction, 1)));
}

function pointAtGirth(points: Points, knots: readonly number[], fraction: number): readonly [number, number] {
  const place = promised(placeInTable(knots, fraction));
  const halfBreadth = valueAt(
    points.map(([y]) => y),
    place,
  );
  const low = (points[place.index] as readonly [number, number])[1];
  return [
    halfBreadth,
    place.fraction === 0 ? low : between(low, (points[place.index + 1] as readonly [number, number])[1], place.fraction),
  ];
}
