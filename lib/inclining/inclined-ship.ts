/**
 * What an inclining test finds, as the story `incliningTest` tells it.
 * Metres, tonnes, t·m, tangents; the frame of `lib/frame.ts`.
 */
export type FittedPoint = {
  readonly move: number;
  readonly moment: number;
  readonly tan: number;
  readonly residual: number;
  /** standard uncertainty that it is weighed by; left out where all count alike */
  readonly weighedBy?: number;
};

/** One series of one station within one session: it has a zero of its own. */
export type StationLine = {
  readonly id: string;
  readonly series: number;
  readonly session: number;
  /** by itself [1/(t·m)]; null below three moves, or where they all have one moment */
  readonly slope: number | null;
  /** tangent at zero moment on its own batten, by itself */
  readonly intercept: number | null;
  /** measured − fitted by its own line; empty where it has none */
  readonly residuals: readonly FittedPoint[];
  /** tangent at zero moment on the line with the common slope */
  readonly commonIntercept: number;
  /** measured − fitted by the line with the common slope */
  readonly commonResiduals: readonly FittedPoint[];
};

export type MoveOnLine = {
  readonly no: number;
  readonly session: number;
  /** moment that acts [t·m]: from the measured positions, with the share of a weight that also moved in height */
  readonly moment: number;
  /** the weights' moment along the ship against the zero of its session, forward [t·m]: it changes her trim */
  readonly along: number;
  /** change of heel against the zero of its session, mean over the stations read */
  readonly tanHeel: number;
  /** mean over the stations of measured − fitted by the common slope, weighed as the line is */
  readonly residual: number;
  readonly stations: number;
};

/** How well the slope is known: from the scatter of the moves, and not less than the readings' own uncertainty gives. */
export type SlopeSpread = {
  readonly slopeUncertainty: number;
  /** what the scatter of the moves alone gives */
  readonly byScatter: number;
  readonly degreesOfFreedom: number;
  /** half of the 95 % interval, relative to the slope */
  readonly halfWidth95: number;
  /** standard deviation of the moves' mean residuals [tangent] */
  readonly betweenMoves: number;
  /** standard deviation of stations about their move's mean [tangent]; null with one station */
  readonly withinMoves: number | null;
};

/** Tangent on moment by least squares: one common slope, one intercept per station, series and session. */
export type MomentTangentLine = {
  /** heel per moment [1/(t·m)] */
  readonly slope: number;
  /** null with fewer than three moves */
  readonly spread: SlopeSpread | null;
  readonly stations: readonly StationLine[];
  readonly moves: readonly MoveOnLine[];
};

/** The ship as inclined, at the state of the draft round. */
export type AsInclined = {
  readonly displacement: number;
  readonly gmFluid: number;
  readonly freeSurfaceCorrection: number;
  readonly gmSolid: number;
  /** solid: every liquid at its own centre */
  readonly vcg: number;
  readonly lcg: number;
  readonly tcg: number;
};
