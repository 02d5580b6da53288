import { mean, standardDeviation } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";
import type { BattenMode } from "./test-readings";

export type TooFewTurningPoints = { readonly type: "TooFewTurningPoints"; readonly got: number; readonly needed: 3 };
export type NoMarks = { readonly type: "NoMarks" };

/** Where the bob hangs, and how its marks or its swings scatter about that place; null with one only. */
export type RestingPoint = { readonly value: number; readonly scatter: number | null };

/**
 * The resting point of one batten reading, in the unit of its marks.
 *
 * Settled: the mean of one or more marks. Turning points: three or more successive extremes v₁…vₙ of a swing,
 *
 *     mean of (vᵢ₋₁ + 2vᵢ + vᵢ₊₁)/4 over the inner points
 *
 * A swing that decays linearly leaves no bias; even and odd n both count.
 * Refused: no mark at all; fewer than three turning points.
 * Source: method of swings of precision weighing, *common practice*.
 */
export function restingPoint(mode: BattenMode, values: readonly number[]): Result<RestingPoint, TooFewTurningPoints | NoMarks> {
  if (values.length === 0) return refuse({ type: "NoMarks" });
  if (mode === "settled") return answer(meanAndScatter(values));
  if (values.length < 3) return refuse({ type: "TooFewTurningPoints", got: values.length, needed: 3 });
  return answer(meanAndScatter(swingCentres(values)));
}

/** Whether successive turning points lie on alternating sides, as a free bob's do; equal neighbours are a bob come to rest. */
export function turningPointsAlternate(values: readonly number[]): boolean {
  const steps = values.slice(1).map((value, i) => value - (values[i] ?? value));
  return steps.slice(1).every((step, i) => step * (steps[i] ?? 0) <= 0);
}

function swingCentres(values: readonly number[]): number[] {
  return values.slice(1, -1).map((value, i) => ((values[i] ?? value) + 2 * value + (values[i + 2] ?? value)) / 4);
}

function meanAndScatter(values: readonly number[]): RestingPoint {
  return { value: mean(values), scatter: values.length < 2 ? null : standardDeviation(values) };
}
