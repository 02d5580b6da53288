import { studentTTail } from "@/lib/numerics/student-t";
import { mean, sum } from "@/lib/numerics/sum";
import type { StationLine } from "./inclined-ship";

/** A reading that stands off from what the other stations show at the same move. */
export type Misread = {
  readonly move: number;
  /** two that can't be told apart where only two were read */
  readonly stations: readonly string[];
  /** reading − the other stations [tangent] */
  readonly size: number;
  /** how often the largest of all readings stands off as far by chance */
  readonly probability: number;
};

/**
 * The reading of one session that stands off most from its move's other stations, each station allowed a zero and a slope of
 * its own against the mean.
 *
 *     d = residual − mean of the move;   t = q/(s·√f),   f = (1 − 1/J)·(1 − h)
 *
 * q: d less its own straight line over the moment; s: from all other readings; J stations, h: leverage of the move on that line.
 * Probability by Student's t, two-sided, times the readings (Bonferroni). `floor` [tangent]: the least s. A gust moves all
 * stations and is not seen here. Null with one station, or too few readings to judge by.
 * Source: externally studentised residuals, R. D. Cook and S. Weisberg (1982) *from memory*.
 */
export function misreadOf(stations: readonly StationLine[], floor: number): Misread | null {
  const readings = deviationsOf(stations);
  const degreesOfFreedom = sum(readings.map(({ alike }) => 1 - 1 / alike)) - 2 * (stations.length - 1);
  if (stations.length < 2 || degreesOfFreedom < 2.5) return null;
  const squares = sum(readings.map(({ off }) => off ** 2));
  const judged = readings.flatMap((reading) => {
    const { off, free } = reading;
    if (free < 1e-9) return [];
    const variance = Math.max((squares - off ** 2 / free) / (degreesOfFreedom - 1), floor ** 2, 1e-24);
    return [{ ...reading, standardised: Math.abs(off) / Math.sqrt(variance * free) }];
  });
  const [worst] = judged.sort((a, b) => b.standardised - a.standardised);
  if (worst === undefined) return null;
  const chances = stations.length === 2 ? readings.length / 2 : readings.length;
  const probability = Math.min(1, 2 * chances * studentTTail(worst.standardised, degreesOfFreedom - 1));
  const ofMove = readings.filter(({ move }) => move === worst.move).map(({ station }) => station);
  const suspects = worst.alike === 2 ? ofMove : [worst.station];
  return { move: worst.move, stations: [...new Set(suspects)], size: worst.off / worst.free, probability };
}

type Deviation = { readonly station: string; readonly move: number; readonly off: number; readonly free: number; readonly alike: number };

function deviationsOf(stations: readonly StationLine[]): readonly Deviation[] {
  const all = stations.flatMap(({ commonResiduals }) => commonResiduals);
  const ofMove = (move: number) => all.filter((point) => point.move === move).map(({ residual }) => residual);
  return stations.flatMap(({ id, commonResiduals }) => {
    const compared = commonResiduals.flatMap((point) => {
      const residuals = ofMove(point.move);
      return residuals.length < 2 ? [] : [{ ...point, alike: residuals.length, apart: point.residual - mean(residuals) }];
    });
    return compared.length < 3 ? [] : offOwnLine(id, compared);
  });
}

type Compared = { readonly move: number; readonly moment: number; readonly alike: number; readonly apart: number };

function offOwnLine(station: string, points: readonly Compared[]): readonly Deviation[] {
  const centre = mean(points.map(({ moment }) => moment));
  const level = mean(points.map(({ apart }) => apart));
  const spread = sum(points.map(({ moment }) => (moment - centre) ** 2));
  if (spread === 0) return [];
  const slope = sum(points.map(({ moment, apart }) => (moment - centre) * (apart - level))) / spread;
  return points.map(({ move, moment, alike, apart }) => ({
    station,
    move,
    alike,
    off: apart - level - slope * (moment - centre),
    free: (1 - 1 / alike) * (1 - 1 / points.length - (moment - centre) ** 2 / spread),
  }));
}
