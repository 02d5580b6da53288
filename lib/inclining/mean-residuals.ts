import { mean, sum } from "@/lib/numerics/sum";
import type { MoveOnLine } from "./inclined-ship";

/** One move off the line through the move means: mean over its stations, measured − fitted [tangent]. */
export type MeanResidual = {
  readonly no: number;
  readonly session: number;
  readonly moment: number;
  readonly residual: number;
  /** share of a move's own error that the line follows: h */
  readonly leverage: number;
};

export type MeanResiduals = {
  readonly points: readonly MeanResidual[];
  /** moves less the slope and each session's zero; may be 0 or less */
  readonly degreesOfFreedom: number;
};

/**
 * The move means off their own line: one slope, one zero per session.
 *
 *     hₖ = 1/K_s + (Mₖ − M̄_s)² / Σ (M − M̄)²
 *
 * K_s: moves of the session. Moves count alike, however many stations read them; where all stations read all moves these are
 * the mean residuals of the common line.
 * Source: leverage in a straight-line fit, N. R. Draper and H. Smith, Applied Regression Analysis *from memory*.
 */
export function meanResiduals(moves: readonly MoveOnLine[]): MeanResiduals {
  const sessions = [...new Set(moves.map(({ session }) => session))];
  const centred = sessions.flatMap((session) => aboutCentre(moves.filter((move) => move.session === session)));
  const spread = sum(centred.map(({ lever }) => lever ** 2));
  const slope = spread === 0 ? 0 : sum(centred.map(({ lever, residual }) => lever * residual)) / spread;
  const points = centred.map(({ move: { no, session, moment }, lever, residual, alike }) => ({
    no,
    session,
    moment,
    residual: residual - slope * lever,
    leverage: 1 / alike + (spread === 0 ? 0 : lever ** 2 / spread),
  }));
  return { points, degreesOfFreedom: moves.length - 1 - sessions.length };
}

function aboutCentre(moves: readonly MoveOnLine[]) {
  const centre = mean(moves.map(({ moment }) => moment));
  const level = mean(moves.map(({ residual }) => residual));
  return moves.map((move) => ({ move, lever: move.moment - centre, residual: move.residual - level, alike: moves.length }));
}
