import { heelDegreesOf, sagShape, trimOf, type Waterplane, waterplaneHeight } from "@/lib/frame";
import { leastSquares } from "@/lib/numerics/least-squares";
import { answer, type Result, refuse } from "@/lib/result";
import { type DraftMark, type FreeboardMark, type MarkPoint, type MarkReading, type MarkRefusal, markPoints } from "./mark-point";

/** Four numbers of the waterplane, in this order: draft on the centreline at AP, slope along, tan(heel), sag. */
export type WaterplaneCovariance = readonly (readonly number[])[];

export type Waterline = {
  readonly plane: Waterplane;
  /** measured − fitted height at each mark [m] */
  readonly residuals: Readonly<Record<string, number>>;
  /** on the centreline at the perpendiculars and at L/2, sag included */
  readonly draftAft: number;
  readonly draftForward: number;
  readonly draftMidships: number;
  readonly trim: number;
  readonly heelDegrees: number;
  /** false: the marks could not tell the sag, and it is taken as 0 */
  readonly sagFitted: boolean;
  readonly marks: number;
  /** marks − fitted unknowns */
  readonly degreesOfFreedom: number;
  /** standard deviation of the residuals; null where the marks just suffice */
  readonly residualDeviation: number | null;
  /** covariance of the four per unit variance of one mark; the sag's row and column are 0 where it was not fitted */
  readonly covariance: WaterplaneCovariance;
  readonly points: readonly MarkPoint[];
};

export type WaterlineReadings = {
  readonly lbp: number;
  readonly draftMarks: readonly DraftMark[];
  readonly freeboardMarks?: readonly FreeboardMark[];
  readonly drafts: readonly MarkReading[];
  readonly freeboards?: readonly MarkReading[];
};

export type WaterlineRefusal =
  | MarkRefusal
  | { readonly type: "TooFewMarks"; readonly got: number; readonly needed: number }
  | { readonly type: "MarksAtOneLength"; readonly x: number; readonly marks: number }
  | { readonly type: "MarksAtOneBreadth"; readonly y: number; readonly marks: number }
  | { readonly type: "MarksInOneLine"; readonly marks: number };

/**
 * The waterplane that all draft and freeboard readings of one round agree on best, by least squares:
 *
 *     z = a + b·x + c·y + s·4x(L − x)/L²
 *
 * The sag s is fitted only where the marks span at least half the length with one of them in its middle third; otherwise
 * it is 0 and `sagFitted` says so. Refuses fewer than three marks, marks at one length (no trim), at one breadth (no heel)
 * or in one line, a reading of an unknown mark, two readings of one mark, a reading outside a raked mark's table.
 *
 * Source: adjustment of all marks at once, common practice; the parabola for hog and sag as in the UN/ECE code of uniform
 * standards for draught surveys, ECE/ENERGY/19 (1992) (from memory).
 */
export function waterlineFromMarks(readings: WaterlineReadings): Result<Waterline, WaterlineRefusal> {
  const points = markPoints(readings);
  if (!points.ok) return points;
  const fault = faultOf(points.value);
  if (fault) return refuse(fault);

  const withSag = canTellSag(points.value, readings.lbp) ? fitted(points.value, readings.lbp, true) : null;
  if (withSag?.ok) return withSag;
  return fitted(points.value, readings.lbp, false);
}

/** What a mark at (x, y) says about the four numbers of the waterplane. */
export function markRow(lbp: number, x: number, y: number): readonly [number, number, number, number] {
  return [1, x, y, sagShape(lbp, x)];
}

/** Draft on the centreline at x [m above the moulded baseline]. */
export function draftAt(plane: Waterplane, x: number): number {
  return waterplaneHeight(plane, x, 0);
}

/** Freeboard of a deck edge at (x, y, z) [m]; negative under water. */
export function freeboardAt(plane: Waterplane, deckEdge: { readonly x: number; readonly y: number; readonly z: number }): number {
  return deckEdge.z - waterplaneHeight(plane, deckEdge.x, deckEdge.y);
}

function faultOf(points: readonly MarkPoint[]): WaterlineRefusal | null {
  const [first] = points;
  if (!first || points.length < 3) return { type: "TooFewMarks", got: points.length, needed: 3 };
  if (points.every(({ x }) => x === first.x)) return { type: "MarksAtOneLength", x: first.x, marks: points.length };
  if (points.every(({ y }) => y === first.y)) return { type: "MarksAtOneBreadth", y: first.y, marks: points.length };
  return null;
}

function canTellSag(points: readonly MarkPoint[], lbp: number): boolean {
  const lengths = points.map(({ x }) => x);
  const spansHalf = Math.max(...lengths) - Math.min(...lengths) >= lbp / 2;
  return spansHalf && lengths.some((x) => x >= lbp / 3 && x <= (2 * lbp) / 3);
}

function fitted(points: readonly MarkPoint[], lbp: number, sagFitted: boolean): Result<Waterline, WaterlineRefusal> {
  const rows = points.map(({ x, y }) => markRow(lbp, x, y).slice(0, sagFitted ? 4 : 3));
  const fit = leastSquares(
    rows,
    points.map(({ z }) => z),
  );
  if (!fit.ok) return refuse({ type: "MarksInOneLine", marks: points.length });
  const [draftAtAp = 0, slopeAlong = 0, tanHeel = 0, sag = 0] = fit.value.coefficients;
  const plane = { draftAtAp, slopeAlong, tanHeel, sag, lbp };
  const { degreesOfFreedom, residualSumOfSquares } = fit.value;
  return answer({
    plane,
    residuals: Object.fromEntries(points.map(({ mark }, i) => [mark, fit.value.residuals[i] as number])),
    draftAft: draftAt(plane, 0),
    draftForward: draftAt(plane, lbp),
    draftMidships: draftAt(plane, lbp / 2),
    trim: trimOf(plane),
    heelDegrees: heelDegreesOf(plane),
    sagFitted,
    marks: points.length,
    degreesOfFreedom,
    residualDeviation: degreesOfFreedom > 0 ? Math.sqrt(residualSumOfSquares / degreesOfFreedom) : null,
    covariance: ofFour(fit.value.covarianceFactor),
    points,
  });
}

function ofFour(factor: readonly (readonly number[])[]): WaterplaneCovariance {
  const four = [0, 1, 2, 3];
  return four.map((i) => four.map((j) => factor[i]?.[j] ?? 0));
}
