import type { Waterplane } from "@/lib/frame";
import { type NoSignChange, rootBetween } from "@/lib/numerics/root";
import type { Result } from "@/lib/result";
import type { Hull } from "./hull";
import { immersedBody } from "./immersed-body";

/**
 * The draft at AP at which a waterplane of given trim, heel and sag holds a given volume, to a millimetre: where a search begins.
 * Refuses (no sign change) a volume that no draft gives; the refusal holds what is missing at the dry and the sunken hull.
 */
export function draftAtApFor(hull: Hull, volume: number, tilted: Waterplane): Result<number, NoSignChange> {
  const reach = reachOf(hull, tilted);
  const missing = (draftAtAp: number) => immersedBody(hull, { ...tilted, draftAtAp }).volume - volume;
  return rootBetween(missing, hull.keel - reach, hull.top + reach, 1e-3);
}

// the most that tilt and sag can raise or lower the waterplane within the hull
function reachOf(hull: Hull, { slopeAlong, tanHeel, sag, lbp }: Waterplane): number {
  const x = Math.max(Math.abs(hull.xAft), Math.abs(hull.xForward));
  return Math.abs(slopeAlong) * x + Math.abs(tanHeel) * hull.greatestHalfBreadth + Math.abs(sag) * 4 * (x / lbp) * (1 + x / lbp);
}
