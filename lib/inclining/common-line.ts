import { linearFit } from "@/lib/numerics/linear-fit";
import { mean, sum } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";
import type { CommonSlope, NoSpreadInMoment } from "./common-slope";
import type { FittedPoint, MomentTangentLine, MoveOnLine, StationLine } from "./inclined-ship";
import { type LineWeights, slopeThrough, weighingUncertainty, weightOf } from "./line-weights";
import { type SpreadPoint, slopeSpread } from "./slope-spread";
import type { StationSeries, TangentOfMove } from "./station-series";
import type { UncertaintyNotPositive } from "./weighted-slope";

/** The moment that acts at each move, against the zero of its session, and how far the weights went along the ship [t·m]. */
export type ActingMoment = { readonly no: number; readonly session: number; readonly moment: number; readonly along?: number };

export type NoBattenReadings = { readonly type: "NoBattenReadings" };

/**
 * The line through a test: tangent on moment by least squares, one common slope, an intercept for each series of each
 * station in each session, never forced through the origin.
 *
 * Beside it each series' own line, each move's mean change of heel, and the spread of the slope (null below three moves).
 * Only moves that some station has read take part. `weights`: all readings count alike, or each by how well it is known.
 * Refused: no reading at all; no two different moments; a reading to be weighed whose uncertainty is zero.
 * Source: IMO 2008 IS Code, part B annex 1 *from memory*.
 */
export function commonLine(
  series: readonly StationSeries[],
  moments: readonly ActingMoment[],
  weights: LineWeights = "equal",
): Result<MomentTangentLine, NoBattenReadings | NoSpreadInMoment | UncertaintyNotPositive> {
  const read = series.map((each) => ({ ...each, points: pointsOf(each, moments, weights) })).filter(({ points }) => points.length > 0);
  if (read.length === 0) return refuse({ type: "NoBattenReadings" });
  const fit = slopeThrough(read.map(({ points }) => points));
  if (!fit.ok) return fit;
  const fitted = read.map((each, j) => fittedSeries(each, j, fit.value));
  const points = fitted.flatMap((each) => each.points);
  return answer({
    slope: fit.value.slope,
    spread: slopeSpread(fit.value.slope, points),
    stations: fitted.map(stationLine),
    moves: moments.flatMap((move) => moveOnLine(move, points)),
  });
}

type ReadPoint = TangentOfMove & { readonly moment: number; readonly weighedBy?: number };
type ReadSeries = StationSeries & { readonly points: readonly ReadPoint[] };
type OnLine = SpreadPoint & {
  readonly no: number;
  readonly tan: number /** change against the zero of its series */;
  readonly change: number;
};
type FittedSeries = Omit<ReadSeries, "points"> & { readonly intercept: number; readonly points: readonly OnLine[] };

function pointsOf({ session, tangents }: StationSeries, moments: readonly ActingMoment[], weights: LineWeights): readonly ReadPoint[] {
  return tangents.flatMap((tangent) => {
    const move = moments.find((each) => each.no === tangent.move && each.session === session);
    const weighedBy = weighingUncertainty(weights, tangent);
    return move === undefined ? [] : [{ ...tangent, moment: move.moment, ...(weighedBy === null ? {} : { weighedBy }) }];
  });
}

// a series that was not read at zero takes its zero from the line
function fittedSeries(read: ReadSeries, j: number, { slope, intercepts }: CommonSlope): FittedSeries {
  const intercept = intercepts[j] ?? 0;
  const zero = read.points.find(({ move }) => move === 0)?.tan ?? intercept;
  const points = read.points.map(({ move, moment, tan, uncertainty, weighedBy }) => ({
    no: move,
    move: `${read.session}/${move}`,
    series: j,
    session: read.session,
    moment,
    tan,
    uncertainty,
    ...(weighedBy === undefined ? {} : { weighedBy }),
    residual: tan - (intercept + slope * moment),
    change: tan - zero,
  }));
  return { ...read, intercept, points };
}

function stationLine({ id, series, session, intercept, points }: FittedSeries): StationLine {
  const own = linearFit(
    points.map(({ moment }) => moment),
    points.map(({ tan }) => tan),
  );
  return {
    id,
    series,
    session,
    slope: own.ok ? own.value.slope : null,
    intercept: own.ok ? own.value.intercept : null,
    residuals: own.ok ? points.map((point, i) => fittedPoint(point, own.value.residuals[i] ?? 0)) : [],
    commonIntercept: intercept,
    commonResiduals: points.map((point) => fittedPoint(point, point.residual)),
  };
}

function fittedPoint({ no, moment, tan, weighedBy }: OnLine, residual: number): FittedPoint {
  return { move: no, moment, tan, residual, ...(weighedBy === undefined ? {} : { weighedBy }) };
}

function moveOnLine({ no, session, moment, along = 0 }: ActingMoment, points: readonly OnLine[]): readonly MoveOnLine[] {
  const read = points.filter((point) => point.no === no && point.session === session);
  if (read.length === 0) return [];
  const tanHeel = mean(read.map(({ change }) => change));
  const residual = sum(read.map((point) => weightOf(point) * point.residual)) / sum(read.map(weightOf));
  return [{ no, session, moment, along, tanHeel, residual, stations: read.length }];
}
