import type { MomentTangentLine, StationLine } from "./inclined-ship";
import { momentTangentLine } from "./moment-tangent-line";
import { uprightOnEvenKeel } from "./ship-afloat";
import type { IncliningTestData } from "./test-data";
import type { BattenReading } from "./test-readings";

/** Where a reading that takes no part would lie [t·m, tangent]: from the zero of its series on the line that counts. */
export type PointOffLine = {
  readonly series: Pick<StationLine, "id" | "series" | "session">;
  readonly move: number;
  readonly moment: number;
  readonly tan: number;
  /** measured − fitted by the line without it */
  readonly residual: number;
};

/**
 * A batten reading of the test that does not count, as it would lie if it alone counted in its slot, measured from the line
 * through all that do count: a point left out must not bend the line it is judged by.
 *
 * Null where the reading gives no tangent, where its move takes no part, or where its series has no other reading.
 */
export function battenOffLine(
  test: IncliningTestData,
  line: MomentTangentLine,
  reading: BattenReading,
  atZero = uprightOnEvenKeel(test),
): PointOffLine | null {
  const battens = test.readings.battens.map((each) => (each === reading ? { ...each, status: "accepted" as const } : each));
  const counting = momentTangentLine({ ...test, readings: { ...test.readings, battens } }, atZero);
  if (!counting.ok) return null;
  const isOfReading = ({ id, series, session }: StationLine) =>
    id === reading.station && series === (reading.series ?? 1) && session === (reading.session ?? 1);
  const zero = line.stations.find(isOfReading)?.commonIntercept;
  const series = counting.value.stations.find(isOfReading);
  const point = series?.commonResiduals.find(({ move }) => move === reading.move);
  if (zero === undefined || !series || !point) return null;
  const tan = point.tan - zero;
  const { id, session } = series;
  return {
    series: { id, series: series.series, session },
    move: point.move,
    moment: point.moment,
    tan,
    residual: tan - line.slope * point.moment,
  };
}
