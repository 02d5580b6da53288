import type { MomentTangentLine, MoveOnLine } from "./inclined-ship";
import { meanResiduals } from "./mean-residuals";
import { misreadOf } from "./misread";
import { type FittedPattern, fittedPattern, patternsOf } from "./move-patterns";
import { roundingOf } from "./standardised-residuals";

/** Why a plot may not be straight. */
export type HintCause = FittedPattern["cause"] | "misread";

/** A likely cause, the moves that it touches, and the numbers that speak for it. */
export type Hint = {
  readonly cause: HintCause;
  readonly session: number;
  /** to be repeated or explained, in their order */
  readonly moves: readonly number[];
  readonly evidence: {
    /** at the move touched most, measured − straight [tangent]; of a misread batten against the other stations */
    readonly size: number;
    /** relative to the heel of the largest moment */
    readonly share: number;
    /** how often scatter alone shows as much */
    readonly probability: number;
    /** stations of a misread batten; empty for other causes */
    readonly stations: readonly string[];
  };
};

/**
 * What a plot that is not straight tells, session by session, likeliest first; empty where it is straight or has too few moves.
 *
 * A batten that stands off from the other stations of its move is named alone: it comes first to be read again. Otherwise the
 * move means are held against each way a plot may bend, and the one that explains most is named, with every other cause that
 * explains nearly as much: these the moves can't separate. `floor` [tangent]: the readings' own uncertainty of a move's mean.
 * Source: IMO 2008 IS Code, part B annex 1 *from memory*; how often it is right: DEVELOPERS.md, Patterns in the plot.
 */
export function plotHints(line: MomentTangentLine, floor = 0): readonly Hint[] {
  const heel = Math.max(0, ...line.moves.map(({ tanHeel }) => Math.abs(tanHeel)));
  if (heel === 0 || line.slope === 0) return [];
  const sessions = [...new Set(line.moves.map(({ session }) => session))];
  return sessions.flatMap((session) => hintsOfSession(line, session, floor)).map((found) => hint(found, heel));
}

type Found = Omit<Hint, "evidence"> & Omit<Hint["evidence"], "share">;

function hint({ cause, session, moves, size, probability, stations }: Found, heel: number): Hint {
  return { cause, session, moves, evidence: { size, share: size / heel, probability, stations } };
}

function hintsOfSession(line: MomentTangentLine, session: number, floor: number): readonly Found[] {
  const moves = line.moves.filter((move) => move.session === session);
  const stations = line.stations.filter((station) => station.session === session);
  const least = Math.max(floor, roundingOf(moves));
  const misread = misreadOf(stations, least * Math.sqrt(stations.length));
  if (misread !== null && misread.probability < seldom) {
    return [{ ...misread, cause: "misread", session, moves: [misread.move] }];
  }
  const likely = likelyPatterns(moves, line.slope, least);
  return likely.map(({ cause, moves: touched, size, probability }) => ({
    cause,
    session,
    moves: touched,
    size,
    probability,
    stations: [],
  }));
}

/** A reading is called misread where chance shows as much in fewer tests than this. */
const seldom = 0.01;

/** The same for one pattern alone. Some twenty are tried, so a straight plot is called bent more often: see the study. */
const seldomForOne = 0.002;

/** Share of the best explanation from which on another one can't be told from it; a choice of ours. */
const nearlyAsMuch = 0.9;

function likelyPatterns(moves: readonly MoveOnLine[], slope: number, floor: number): readonly FittedPattern[] {
  const { points, degreesOfFreedom } = meanResiduals(moves);
  if (degreesOfFreedom < 3) return [];
  // a line that falls is judged as its mirror image that rises
  const rising = slope > 0 ? points : points.map((point) => ({ ...point, moment: -point.moment }));
  const fitted = patternsOf(rising).flatMap((pattern) => fittedPattern(pattern, rising, degreesOfFreedom, floor) ?? []);
  const best = bestOfEachCause(fitted.filter(({ probability }) => probability < seldomForOne));
  const most = best[0]?.explained ?? 0;
  return best.filter(({ explained }) => explained >= nearlyAsMuch * most);
}

// of patterns that explain alike the simpler cause, named first in the list of patterns, goes first
function bestOfEachCause(fitted: readonly FittedPattern[]): readonly FittedPattern[] {
  const byCause = new Map<HintCause, FittedPattern>();
  for (const pattern of fitted) {
    const best = byCause.get(pattern.cause);
    if (best === undefined || pattern.explained > best.explained + 1e-9) byCause.set(pattern.cause, pattern);
  }
  return [...byCause.values()].sort((a, b) => (Math.abs(a.explained - b.explained) < 1e-9 ? 0 : b.explained - a.explained));
}
