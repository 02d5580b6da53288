import type { PlotPoint } from "@/components/charts/plot-points";
import type { Attitude } from "@/lib/hydrostatics/tank";
import { battenOffLine } from "@/lib/inclining/batten-off-line";
import type { FittedPoint, MomentTangentLine, StationLine } from "@/lib/inclining/inclined-ship";
import { momentTangentLine } from "@/lib/inclining/moment-tangent-line";
import { attitudeUnder } from "@/lib/inclining/ship-afloat";
import { type TestSoFar, testSoFar } from "@/lib/inclining/test-so-far";
import type { TestRecord } from "@/lib/record/test-record";
import type { Result } from "@/lib/result";

const PER_METRE = 1000;

export type LineSoFar = {
  readonly line: MomentTangentLine;
  readonly points: readonly PlotPoint[];
  /** the series in the plot, in the plan's order */
  readonly stations: readonly string[];
};

/** The line through what counts so far, and beside it the points that take no part, as they would lie; null while there is none. */
export function lineSoFar(record: TestRecord, so: TestSoFar = testSoFar(record)): LineSoFar | null {
  const { line, afloat } = so;
  if (line === null) return null;
  const lies = afloat ? attitudeUnder(afloat.waterline) : undefined;
  const asIf: AsIf = (changed) => momentTangentLine(changed, lies);
  const counted = line.stations.flatMap((station) => station.commonResiduals.map((point) => pointOnLine(station, point)));
  return {
    line,
    points: [...counted, ...disagreeing(record, line, lies), ...excluded(record, line, asIf)],
    stations: [...new Set(line.stations.map(seriesName))],
  };
}

type AsIf = (record: TestRecord) => Result<MomentTangentLine>;

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
function disagreeing(record: TestRecord, line: MomentTangentLine, lies?: Attitude): PlotPoint[] {
  return record.readings.battens.flatMap((reading) => {
    if (reading.status !== "disagrees" || isReadAgain(record, reading)) return [];
    const point = battenOffLine(record, line, reading, lies);
    if (point === null) return [];
    const { series, move, moment, tan, residual } = point;
    return [{ station: seriesName(series), move, moment, tangent: tan * PER_METRE, residual: residual * PER_METRE, leftOut: "disagrees" }];
  });
}

function isReadAgain({ moves }: TestRecord, { move, repeat = 1 }: TestRecord["readings"]["battens"][number]): boolean {
  return moves.some((each) => each.no === move && (each.repeat ?? 1) > repeat);
}

function excluded(record: TestRecord, line: MomentTangentLine, asIf: AsIf): PlotPoint[] {
  return record.moves.flatMap((move) => {
    if (move.excluded === undefined) return [];
    const moves = record.moves.map((each) => (each === move ? { ...each, excluded: undefined } : each));
    const counting = asIf({ ...record, moves });
    return counting.ok ? hollow(counting.value, line, move.no, "its move is excluded") : [];
  });
}

// measured from the intercept of the line that counts: a point left out must not bend it
function hollow(counting: MomentTangentLine, line: MomentTangentLine, move: number, leftOut: string): PlotPoint[] {
  return counting.stations.flatMap((station) => {
    const zero = line.stations.find((each) => seriesName(each) === seriesName(station))?.commonIntercept;
    const point = station.commonResiduals.find((each) => each.move === move);
    if (zero === undefined || !point) return [];
    const tangent = (point.tan - zero) * PER_METRE;
    const residual = tangent - line.slope * point.moment * PER_METRE;
    return [{ station: seriesName(station), move, moment: point.moment, tangent, residual, leftOut }];
  });
}
