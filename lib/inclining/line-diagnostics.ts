import type { AsInclined, FittedPoint, MomentTangentLine, StationLine } from "./inclined-ship";
import { slopeThrough } from "./line-weights";

/** The line and GM as they would be without one move. */
export type WithoutMove = {
  readonly no: number;
  readonly session: number;
  /** relative to the slope of all moves */
  readonly slopeChange: number;
  readonly gmFluid: number;
};

/**
 * How the slope and GM change when each move is left out in turn: a move that decides the result shows.
 *
 *     GMₖ = GM + (1/βₖ − 1/β)/Δ
 *
 * β: slope of all moves, βₖ: without move k [1/(t·m)]. A move without which there is no line is left out of the list.
 * Source: deletion of one case, R. D. Cook and S. Weisberg, Residuals and Influence in Regression (1982) *from memory*.
 */
export function withoutEachMove(line: MomentTangentLine, ship: Pick<AsInclined, "displacement" | "gmFluid">): readonly WithoutMove[] {
  return line.moves.flatMap(({ no, session }) => {
    const series = line.stations.map((station) => pointsWithout(station, no, session)).filter((points) => points.length > 0);
    const fit = slopeThrough(series);
    if (!fit.ok || fit.value.slope === 0) return [];
    const { slope } = fit.value;
    const gmFluid = ship.gmFluid + (1 / slope - 1 / line.slope) / ship.displacement;
    return [{ no, session, slopeChange: slope / line.slope - 1, gmFluid }];
  });
}

/** How one station's own line stands to the common one. */
export type StationAgreement = {
  readonly id: string;
  readonly series: number;
  readonly session: number;
  /** own slope relative to the common one, less 1 */
  readonly slopeDeviation: number;
  /** its bob goes the way of the others */
  readonly hasSense: boolean;
};

/** Each station's own slope against the common one; stations that have no line of their own are left out. */
export function stationAgreement({ slope, stations }: MomentTangentLine): readonly StationAgreement[] {
  return stations.flatMap(({ id, series, session, slope: own }) =>
    own === null || slope === 0 ? [] : [{ id, series, session, slopeDeviation: own / slope - 1, hasSense: own * slope > 0 }],
  );
}

/** How far a station's zero moved between its first and its last zero move [tangent]. */
export type ZeroDrift = {
  readonly id: string;
  readonly series: number;
  readonly session: number;
  readonly from: number;
  readonly to: number;
  readonly drift: number;
};

/**
 * Each station's last zero against its first: what is left of a moment near zero is taken off by the common slope.
 * Moments within 1 % of the largest count as zero; a station read at one zero only has no drift to show.
 */
export function zeroDrift({ stations }: MomentTangentLine): readonly ZeroDrift[] {
  const largest = Math.max(0, ...stations.flatMap(({ commonResiduals }) => commonResiduals.map(({ moment }) => Math.abs(moment))));
  return stations.flatMap((station) => {
    const zeros = station.commonResiduals.filter(({ moment }) => Math.abs(moment) <= largest / 100).sort(byMove);
    const [first, last] = [zeros[0], zeros.at(-1)];
    if (first === undefined || last === undefined || first === last) return [];
    const { id, series, session } = station;
    return [{ id, series, session, from: first.move, to: last.move, drift: last.residual - first.residual }];
  });
}

function pointsWithout({ session, commonResiduals }: StationLine, no: number, ofSession: number): readonly FittedPoint[] {
  return session === ofSession ? commonResiduals.filter(({ move }) => move !== no) : commonResiduals;
}

function byMove(a: FittedPoint, b: FittedPoint): number {
  return a.move - b.move;
}
