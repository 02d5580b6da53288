/**
 * The ship's frame, stated here and nowhere else.
 *
 * x forward of the aft perpendicular (AP), y to starboard, z above the moulded baseline; metres.
 * Heel is positive starboard side down, trim positive by the stern, hog negative, sag positive.
 * A shift to starboard, its moment, the bob's move along the batten and the heel are then all positive together.
 * The frame is left-handed: no cross product is ever taken in it.
 *
 * The waterplane at rest, seen from the ship:
 *
 *     z(x, y) = a + b·x + c·y + s·4x(L − x)/L²
 *
 * a: draft on the centreline at AP [m]; b = −trim/L; c = tan(heel); s: sag at midships [m].
 */
export type Waterplane = {
  readonly draftAtAp: number;
  readonly slopeAlong: number;
  readonly tanHeel: number;
  readonly sag: number;
  readonly lbp: number;
};

/** Height of the waterplane above the baseline at (x, y) [m]. */
export function waterplaneHeight(plane: Waterplane, x: number, y: number): number {
  return plane.draftAtAp + plane.slopeAlong * x + plane.tanHeel * y + plane.sag * sagShape(plane.lbp, x);
}

/** The sag parabola: 0 at the perpendiculars, 1 at midships. */
export function sagShape(lbp: number, x: number): number {
  return (4 * x * (lbp - x)) / lbp ** 2;
}

/** Trim over the length between perpendiculars, positive by the stern [m]. */
export function trimOf(plane: Waterplane): number {
  return negated(plane.slopeAlong) * plane.lbp;
}

/** b of a waterplane whose trim is given: trim by the stern lowers the bow's draft. */
export function slopeAlongFromTrim(trim: number, lbp: number): number {
  return negated(trim) / lbp;
}

/** The heel of a waterplane as an angle, positive starboard side down [°]. */
export function heelDegreesOf(plane: Waterplane): number {
  return (Math.atan(plane.tanHeel) * 180) / Math.PI;
}

/** The side on which a heel, shift or moment lies: port is negative. */
export function sideOf(value: number): "port" | "starboard" | "upright" {
  if (value === 0) return "upright";
  return value < 0 ? "port" : "starboard";
}

// −0 would show as "-0" and fail an exact comparison
function negated(value: number): number {
  return value === 0 ? 0 : -value;
}
