import { answer, type Result, refuse } from "@/lib/result";

export type NoSignChange = {
  readonly type: "NoSignChange";
  readonly low: number;
  readonly high: number;
  readonly atLow: number;
  readonly atHigh: number;
};

/**
 * A root of a continuous function between two limits where it has opposite signs, to within `tolerance` in x.
 * False position with the stale end halved, and plain halving whenever that is slow: never leaves the bracket.
 * Refuses limits between which the sign does not change: without a bracket a root finder invents roots.
 *
 * Source: M. Dowell & P. Jarratt, The "Pegasus" and "Illinois" methods, BIT 11 (1971) and 12 (1972) (from memory).
 */
export function rootBetween(f: (x: number) => number, low: number, high: number, tolerance: number): Result<number, NoSignChange> {
  const atLow = f(low);
  const atHigh = f(high);
  if (atLow === 0) return answer(low);
  if (atHigh === 0) return answer(high);
  if (!(atLow * atHigh < 0)) return refuse({ type: "NoSignChange", low, high, atLow, atHigh });
  return answer(narrowed(f, { x: low, f: atLow }, { x: high, f: atHigh }, tolerance));
}

type Point = { readonly x: number; readonly f: number };

function narrowed(f: (x: number) => number, first: Point, second: Point, tolerance: number): number {
  let stale = first;
  let newest = second;
  for (let step = 0; Math.abs(newest.x - stale.x) > tolerance; step++) {
    const x = nextLook(stale, newest, step % 3 === 2);
    if (x === stale.x || x === newest.x) break;
    const next = { x, f: f(x) };
    if (next.f === 0) return x;
    stale = Math.sign(next.f) === Math.sign(newest.f) ? { x: stale.x, f: stale.f / 2 } : newest;
    newest = next;
  }
  return newest.x;
}

// a chord that rounding sends to an end of the bracket tells nothing: halve instead
function nextLook(stale: Point, newest: Point, halve: boolean): number {
  const chord = stale.x - (stale.f * (newest.x - stale.x)) / (newest.f - stale.f);
  return halve || chord === stale.x || chord === newest.x ? (stale.x + newest.x) / 2 : chord;
}
