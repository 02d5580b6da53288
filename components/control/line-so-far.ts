import type { PlotPoint } from "@/components/charts/plot-points";
import type { Faults } from "@/lib/inclining/faults";
import type { FittedPoint, MomentTangentLine, StationLine } from "@/lib/inclining/inclined-ship";
import { momentTangentLine } from "@/lib/inclining/moment-tangent-line";
import type { TestRecord } from "@/lib/record/test-record";
import { answer, type Result } from "@/lib/result";

const PER_METRE = 1000;

export type LineSoFar = {
  readonly line: MomentTangentLine;
  readonly points: readonly PlotPoint[];
  /** the series in the plot, in the plan's order */
  readonly stations: readonly string[];
};

/** The line through what counts so far, and beside it the points that take no part, as they would lie. */
export function lineSoFar(record: TestRecord): Result<LineSoFar, Faults> {
  const line = momentTangentLine(record);
  if (!line.ok) return line;
  const counted = line.value.stations.flatMap((station) => station.commonResiduals.map((point) => pointOnLine(station, point)));
  return answer({
    line: line.value,
    points: [...counted, ...disagreeing(record, line.value), ...excluded(record, line.value)],
    stations: [...new Set(line.value.stations.map(seriesName))],
  });
}

/** A station's name, with its series where it has begun a new one, and its session after the first. */
export function seriesName({ id, series, session }: Pick<StationLine, "id" | "series" | "session">): string {
  return `${id}${series > 1 ? `, series ${series}` : ""}${session > 1 ? `, session ${session}` : ""}`;
}

function pointOnLine(station: StationLine, point: FittedPoint): PlotPoint {
  const tangent = (point.tan - station.commonIntercept) * PER_METRE;
  return {
    station: seriesName(station),
    move: point.move,
    moment: point.moment,
    tangent,
    residual: point.residual * PER_METRE,
    leftOut: null,
  };
}

/** Each disagreeing reading where it would lie if it alone counted in its slot. */
function disagreeing(record: TestRecord, line: MomentTangentLine): PlotPoint[] {
  return record.readings.battens.flatMap((reading) => {
    if (reading.status !== "disagrees") return [];
    const battens = record.readings.battens.map((each) => (each === reading ? { ...each, status: "accepted" as const } : each));
    const asIf = momentTangentLine({ ...record, readings: { ...record.readings, battens } });
    return asIf.ok ? hollow(asIf.value, line, reading.move, "disagrees").filter((point) => point.station.startsWith(reading.station)) : [];
  });
}

function excluded(record: TestRecord, line: MomentTangentLine): PlotPoint[] {
  return record.moves.flatMap((move) => {
    if (move.excluded === undefined) return [];
    const moves = record.moves.map((each) => (each === move ? { ...each, excluded: undefined } : each));
    const asIf = momentTangentLine({ ...record, moves });
    return asIf.ok ? hollow(asIf.value, line, move.no, "its move is excluded") : [];
  });
}

// measured from the intercept of the line that counts: a point left out must not bend it
function hollow(asIf: MomentTangentLine, line: MomentTangentLine, move: number, leftOut: string): PlotPoint[] {
  return asIf.stations.flatMap((station) => {
    const zero = line.stations.find((each) => seriesName(each) === seriesName(station))?.commonIntercept;
    const point = station.commonResiduals.find((each) => each.move === move);
    if (zero === undefined || !point) return [];
    const tangent = (point.tan - zero) * PER_METRE;
    const residual = tangent - line.slope * point.moment * PER_METRE;
    return [{ station: seriesName(station), move, moment: point.moment, tangent, residual, leftOut }];
  });
}
