import { battenOffLine } from "@/lib/inclining/batten-off-line";
import { markOffWaterline } from "@/lib/inclining/mark-off-waterline";
import { attitudeUnder } from "@/lib/inclining/ship-afloat";
import { tangentScale } from "@/lib/inclining/tangent-scale";
import { testSoFar } from "@/lib/inclining/test-so-far";
import type { TestRecord } from "@/lib/record/test-record";
import { signedFigure } from "@/lib/report/rounding";
import type { StandingReading } from "@/lib/sync/live";
import type { Slot } from "@/lib/sync/slot";

type BattenReading = TestRecord["readings"]["battens"][number];

/**
 * For each reading of a slot how far it lies off what the others say, as the instrument would show it: a batten off the line,
 * a mark off the waterline. Null where there is no fit to lie off, or where the wheelhouse has not yet heard the reading.
 */
export function offTheFit(record: TestRecord, slot: Slot, heads: readonly StandingReading[]): readonly (string | null)[] {
  if (slot.kind === "draft" || slot.kind === "freeboard") return heads.map((head) => offWaterline(record, slot.kind, nameOf(head)));
  if (slot.kind !== "batten") return heads.map(() => null);
  const { line, afloat } = testSoFar(record);
  return heads.map((head) => {
    const reading = record.readings.battens.find(({ id }) => id === nameOf(head));
    const lies = afloat ? attitudeUnder(afloat.waterline) : undefined;
    const point = line && reading ? battenOffLine(record, line, reading, lies) : null;
    return point && reading ? asShown(record, reading, point.residual) : null;
  });
}

// a correction goes by its own name in the record, a reading by the reading's
function nameOf({ corrected, event, reading }: StandingReading): string {
  return corrected ? event : reading;
}

function offWaterline(record: TestRecord, kind: "draft" | "freeboard", name: string): string | null {
  const marks = kind === "draft" ? record.readings.drafts : (record.readings.freeboards ?? []);
  const reading = marks.find(({ id }) => id === name);
  const off = reading ? markOffWaterline(record, kind, reading) : null;
  return off === null ? null : `${signedFigure(1000 * off, 0)} mm`;
}

/** A tangent as a difference on the station's own scale. */
function asShown({ stations }: TestRecord, { station: id, series = 1 }: BattenReading, tan: number): string | null {
  const station = stations.find((each) => each.id === id);
  const scale = station ? tangentScale(station, series, { shown: 0, tanHeel: 0 }, { readingMm: 0, readingDegrees: 0 }) : null;
  if (!station || !scale?.ok) return null;
  const off = tan / (scale.value(1).tan - scale.value(0).tan);
  return station.instrument === "inclinometer" ? `${signedFigure(off, 3)}°` : `${signedFigure(off, 1)} mm`;
}
