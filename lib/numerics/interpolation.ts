import { answer, type Result, refuse } from "@/lib/result";

export type OutsideTable = { readonly type: "OutsideTable"; readonly value: number; readonly lowest: number; readonly highest: number };

/** Where a value stands among ascending knots: between `index` and `index + 1`, at `fraction` of the way. */
export type PlaceInTable = { readonly index: number; readonly fraction: number };

/**
 * The place of a value among ascending, distinct knots; the last knot is at fraction 1 of the last interval.
 * Refuses a value below the first or above the last knot, with both. One knot answers for itself alone.
 */
export function placeInTable(knots: readonly number[], value: number): Result<PlaceInTable, OutsideTable> {
  const lowest = knots[0];
  const highest = knots.at(-1);
  if (lowest === undefined || highest === undefined) throw new RangeError("look-up in an empty table");
  if (!(value >= lowest && value <= highest)) return refuse({ type: "OutsideTable", value, lowest, highest });
  if (knots.length === 1) return answer({ index: 0, fraction: 0 });
  const above = knots.findIndex((knot, i) => i > 0 && value <= knot);
  const low = knots[above - 1] as number;
  return answer({ index: above - 1, fraction: (value - low) / ((knots[above] as number) - low) });
}

/** The value at a place found by `placeInTable`, linear between its neighbours. */
export function valueAt(values: readonly number[], place: PlaceInTable): number {
  const low = values[place.index] as number;
  return place.fraction === 0 ? low : between(low, values[place.index + 1] as number, place.fraction);
}

/** Linear interpolation in one table: y at x. Refuses x outside the knots, with their limits. */
export function interpolated(knots: readonly number[], values: readonly number[], x: number): Result<number, OutsideTable> {
  const place = placeInTable(knots, x);
  return place.ok ? answer(valueAt(values, place.value)) : place;
}

/** low at fraction 0, high at fraction 1, both exactly. */
export function between(low: number, high: number, fraction: number): number {
  return fraction === 1 ? high : low + fraction * (high - low);
}
