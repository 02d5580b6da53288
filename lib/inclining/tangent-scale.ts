import { answer, type Result, refuse } from "@/lib/result";
import { inclinometerTangent, pendulumTangent, uTubeTangent, type ZeroLength } from "./instrument";
import type { ReadingUncertainty } from "./reading-uncertainty";
import type { Pendulum, Station, UTube } from "./test-plan";

/** A tangent on a station's own scale, and the standard uncertainty that one reading alone gives it. */
export type ReadTangent = { readonly tan: number; readonly uncertainty: number };

/** From what a station shows (mm, or degrees) to the tangent. */
export type TangentScale = (shown: number) => ReadTangent;

/** What an angle leans on: what the inclinometer shows at zero [degrees], and the tangent of heel the ship then has. */
export type AngleAtZero = { readonly shown: number; readonly tanHeel: number };

/**
 * How one series of a station turns what it shows into a tangent: by its pendulum's length, its U-tube's span, or the angle.
 *
 * A series carries its own length or span; otherwise the station's holds.
 * Refused: a length or span of zero, with its place under the station.
 */
export function tangentScale(
  station: Station,
  series: number,
  zero: AngleAtZero,
  { readingMm, readingDegrees }: ReadingUncertainty,
): Result<TangentScale, ZeroLength & { readonly path?: string }> {
  if (station.instrument === "inclinometer") return answer((shown) => tangentOfAngle(shown, zero, readingDegrees));
  const { length, path } = lengthOf(station, series);
  const slope = station.instrument === "pendulum" ? pendulumTangent(1, length) : uTubeTangent(0, 1, length);
  if (!slope.ok) return refuse({ ...slope.refusal, path });
  const legs = station.instrument === "pendulum" ? 1 : 2;
  const uncertainty = slope.value * readingMm * Math.sqrt(legs);
  return answer((shown) => ({ tan: slope.value * shown, uncertainty }));
}

function tangentOfAngle(shown: number, zero: AngleAtZero, readingDegrees: number): ReadTangent {
  const tan = inclinometerTangent(shown, zero.shown, zero.tanHeel);
  return { tan, uncertainty: ((readingDegrees * Math.PI) / 180) * (1 + tan ** 2) };
}

function lengthOf(station: Pendulum | UTube, no: number): { readonly length: number; readonly path: string } {
  const isPendulum = station.instrument === "pendulum";
  const lengths = isPendulum ? station.series?.map(lengthOfSeries) : station.series?.map(spanOfSeries);
  const key = isPendulum ? "length" : "span";
  const index = station.series?.findIndex((series) => series.no === no) ?? -1;
  const ofSeries = lengths?.[index];
  if (ofSeries !== undefined) return { length: ofSeries, path: `series[${index}].${key}` };
  return { length: isPendulum ? station.length : station.span, path: key };
}

function lengthOfSeries(series: { readonly length?: number }): number | undefined {
  return series.length;
}

function spanOfSeries(series: { readonly span?: number }): number | undefined {
  return series.span;
}
