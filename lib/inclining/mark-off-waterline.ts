import { waterplaneHeight } from "@/lib/frame";
import { markPoints } from "@/lib/hydrostatics/mark-point";
import { waterlineOfRound } from "./draft-rounds";
import type { IncliningTestData } from "./test-data";
import type { MarkReading } from "./test-readings";

/**
 * How far a draft or freeboard that does not count lies off the waterline of all that do [m]: read − fitted, positive for water
 * higher up the hull. The waterline is that of its own round.
 *
 * Null where the other marks of the round give no waterline, or the reading no point on the hull.
 */
export function markOffWaterline(test: IncliningTestData, kind: "draft" | "freeboard", reading: MarkReading): number | null {
  const { draftMarks, freeboardMarks } = test;
  const read = kind === "draft" ? { drafts: [reading], freeboards: [] } : { drafts: [], freeboards: [reading] };
  const points = markPoints({ draftMarks, freeboardMarks, ...read });
  const waterline = waterlineOfRound(test, reading.round);
  if (!points.ok || waterline === null) return null;
  const [point] = points.value;
  return point ? point.z - waterplaneHeight(waterline.plane, point.x, point.y) : null;
}
