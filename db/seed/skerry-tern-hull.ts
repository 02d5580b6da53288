/**
 * The invented hull of MV Skerry Tern as offsets, from a formula.
 *
 * Between keel height k and deck edge (d, h) a section is
 *
 *     y = d · (1 − (1 − t)^a)^b,   t = (z − k)/(h − k)
 *
 * a large and b small: flat floor, bilge and upright side (midships); a and b near 1: a V with straight sides (aft);
 * b above 1: hollow, flared sections (forward). Definition of an invented ship.
 */
export function skerryTernSections(): { x: number; points: [number, number][] }[] {
  return shapes.map(({ x, ...shape }) => ({ x, points: heights.map((t) => pointAt(shape, t)) }));
}

type Shape = { readonly keel: number; readonly deck: number; readonly halfBreadth: number; readonly a: number; readonly b: number };

/** Closer together at the floor and the bilge, where a section turns most. */
const heights = [0, 0.005, 0.02, 0.045, 0.08, 0.125, 0.18, 0.245, 0.32, 0.42, 0.54, 0.68, 0.84, 1];

/** 21 sections from the transom, 2 m abaft AP, to the stem head, 56 m forward of it: 58 m over all. */
const shapes: readonly ({ readonly x: number } & Shape)[] = [
  { x: -2, keel: 3.1, deck: 5.6, halfBreadth: 5.3, a: 3.2, b: 0.62 },
  { x: 0, keel: 2.55, deck: 5.55, halfBreadth: 5.6, a: 3.4, b: 0.6 },
  { x: 2, keel: 1.85, deck: 5.5, halfBreadth: 5.8, a: 3.6, b: 0.6 },
  { x: 4, keel: 1.0, deck: 5.47, halfBreadth: 5.95, a: 3.8, b: 0.62 },
  { x: 6, keel: 0.35, deck: 5.45, halfBreadth: 6.05, a: 4.1, b: 0.62 },
  { x: 8.5, keel: 0, deck: 5.42, halfBreadth: 6.12, a: 4.6, b: 0.58 },
  { x: 11.5, keel: 0, deck: 5.4, halfBreadth: 6.18, a: 5.4, b: 0.5 },
  { x: 15, keel: 0, deck: 5.4, halfBreadth: 6.2, a: 6.4, b: 0.42 },
  { x: 19, keel: 0, deck: 5.4, halfBreadth: 6.2, a: 7.4, b: 0.36 },
  { x: 23, keel: 0, deck: 5.4, halfBreadth: 6.2, a: 8, b: 0.33 },
  { x: 27, keel: 0, deck: 5.4, halfBreadth: 6.2, a: 8, b: 0.33 },
  { x: 31, keel: 0, deck: 5.43, halfBreadth: 6.2, a: 7.6, b: 0.36 },
  { x: 34.5, keel: 0, deck: 5.48, halfBreadth: 6.16, a: 6.6, b: 0.43 },
  { x: 37.5, keel: 0, deck: 5.56, halfBreadth: 6.06, a: 5.4, b: 0.53 },
  { x: 40.5, keel: 0, deck: 5.67, halfBreadth: 5.86, a: 4.2, b: 0.66 },
  { x: 43.5, keel: 0, deck: 5.82, halfBreadth: 5.52, a: 3.2, b: 0.82 },
  { x: 46.5, keel: 0, deck: 6.0, halfBreadth: 4.98, a: 2.5, b: 1.0 },
  { x: 49, keel: 0.05, deck: 6.18, halfBreadth: 4.32, a: 2, b: 1.2 },
  { x: 51.5, keel: 0.3, deck: 6.4, halfBreadth: 3.4, a: 1.6, b: 1.45 },
  { x: 54, keel: 3.5, deck: 6.65, halfBreadth: 1.95, a: 1.3, b: 1.3 },
  { x: 56, keel: 6.0, deck: 6.85, halfBreadth: 0.3, a: 1, b: 1 },
];

function pointAt({ keel, deck, halfBreadth, a, b }: Shape, t: number): [number, number] {
  return [toMillimetre(halfBreadth * (1 - (1 - t) ** a) ** b), toMillimetre(keel + t * (deck - keel))];
}

// offsets are given to the millimetre
function toMillimetre(value: number): number {
  return Math.round(value * 1000) / 1000;
}
