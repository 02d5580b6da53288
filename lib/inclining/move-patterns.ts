import { fTail } from "@/lib/numerics/f-distribution";
import { sum, sumOfProducts } from "@/lib/numerics/sum";
import type { MeanResidual } from "./mean-residuals";

/** A way in which a plot may bend, and how far at each move for one unit of its size. */
export type Pattern = {
  readonly cause: "gust" | "free-liquid" | "restraint" | "steady-wind";
  /** by move, in the order of the points */
  readonly shape: readonly number[];
  /** the size that the cause can have: more heel, less heel, or either */
  readonly sign: 1 | -1 | 0;
  /** the moves that it touches most */
  readonly moves: readonly number[];
};

export type FittedPattern = Pattern & {
  /** at the move it touches most, measured − straight [tangent] */
  readonly size: number;
  /** share of the scatter about the straight line that it explains */
  readonly explained: number;
  /** how often scatter alone lets this pattern explain as much */
  readonly probability: number;
};

/**
 * Every way a plot may bend for one cause, by moments and the order of the moves:
 *
 *     free liquid: M·|M|;  restraint: M − M₀ beyond a moment M₀ of one side;  steady wind: 1 from a move on;  gust: 1 at a move
 *
 * Restraint may begin at each moment that was measured and halfway between; wind leaves at least two moves before and after it.
 * Source: what plots that are not straight tell, IMO 2008 IS Code, part B annex 1 *from memory*.
 */
export function patternsOf(points: readonly MeanResidual[]): readonly Pattern[] {
  return [...gusts(points), freeLiquid(points), ...restraints(points, 1), ...restraints(points, -1), ...winds(points)];
}

/**
 * A pattern fitted to the moves beside the straight line, by least squares.
 *
 *     size = Σ x⊥·e / Σ x⊥²,   F = gain / ((Σ e² − gain)/(ν − 1)),   gain = (Σ x⊥·e)² / Σ x⊥²
 *
 * x⊥: what the line leaves of the pattern; e: residuals of the line with ν degrees of freedom. The scatter that remains is never
 * taken for smaller than `floor` [tangent]. Null where the line takes the pattern up, or its size has the wrong sign.
 * Source: F test of one more term, N. R. Draper and H. Smith, Applied Regression Analysis *from memory*.
 */
export function fittedPattern(
  pattern: Pattern,
  points: readonly MeanResidual[],
  degreesOfFreedom: number,
  floor: number,
): FittedPattern | null {
  const left = offLine(pattern.shape, points);
  const spread = sumOfProducts(left, left);
  const squares = sum(points.map(({ residual }) => residual ** 2));
  if (spread <= 1e-9 * sumOfProducts(pattern.shape, pattern.shape) || squares === 0) return null;
  const product = sumOfProducts(
    left,
    points.map(({ residual }) => residual),
  );
  const size = product / spread;
  if (size * pattern.sign < 0) return null;
  const gain = product ** 2 / spread;
  const rest = Math.max((squares - gain) / (degreesOfFreedom - 1), floor ** 2);
  if (rest <= 0) return null;
  const largest = pattern.shape.reduce((most, each) => (Math.abs(each) > Math.abs(most) ? each : most), 0);
  return { ...pattern, size: size * largest, explained: gain / squares, probability: fTail(gain / rest, 1, degreesOfFreedom - 1) };
}

function gusts(points: readonly MeanResidual[]): Pattern[] {
  return points.map(({ no }) => ({
    cause: "gust",
    shape: points.map((point) => (point.no === no ? 1 : 0)),
    sign: 0,
    moves: [no],
  }));
}

function freeLiquid(points: readonly MeanResidual[]): Pattern {
  const largest = largestMoment(points);
  return {
    cause: "free-liquid",
    shape: points.map(({ moment }) => (moment * Math.abs(moment)) / largest ** 2),
    sign: 1,
    moves: points.filter(({ moment }) => Math.abs(moment) >= 0.9 * largest).map(({ no }) => no),
  };
}

// on the port side everything is mirrored: the moment, and the heel that is missing
function restraints(points: readonly MeanResidual[], side: 1 | -1): Pattern[] {
  const moments = points.map(({ moment }) => side * moment);
  const largest = Math.max(...moments);
  const measured = [...new Set([0, ...moments.filter((moment) => moment > 0)])].sort((a, b) => a - b);
  const knots = measured.slice(0, -1).flatMap((knot, i) => [knot, (knot + (measured[i + 1] ?? knot)) / 2]);
  return knots.map((knot) => ({
    cause: "restraint",
    shape: moments.map((moment) => (side * Math.max(0, moment - knot)) / (largest - knot)),
    sign: -1,
    moves: points.filter((_, i) => (moments[i] ?? 0) > knot).map(({ no }) => no),
  }));
}

function winds(points: readonly MeanResidual[]): Pattern[] {
  return points.slice(2, -1).map((_, i) => ({
    cause: "steady-wind",
    shape: points.map((_, k) => (k >= i + 2 ? 1 : 0)),
    sign: 0,
    moves: points.slice(i + 2).map(({ no }) => no),
  }));
}

function offLine(shape: readonly number[], points: readonly MeanResidual[]): number[] {
  const count = points.length;
  const centre = sum(points.map(({ moment }) => moment)) / count;
  const level = sum(shape) / count;
  const levers = points.map(({ moment }) => moment - centre);
  const slope =
    sumOfProducts(
      levers,
      shape.map((each) => each - level),
    ) / sumOfProducts(levers, levers);
  return shape.map((each, i) => each - level - slope * (levers[i] as number));
}

function largestMoment(points: readonly MeanResidual[]): number {
  return Math.max(...points.map(({ moment }) => Math.abs(moment)));
}
