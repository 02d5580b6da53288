import { answer, type Result, refuse } from "@/lib/result";

export type ZeroLength = { readonly type: "ZeroLength"; readonly length: number };

/**
 * Tangent on a pendulum's batten, from the batten's own arbitrary zero.
 *
 *     tan = v / length
 *
 * v in millimetres increasing to starboard; length from the pivot to the batten's face, in metres.
 * Refused: a length that is not above zero.
 * Source: IMO 2008 IS Code, part B annex 1 *from memory*.
 */
export function pendulumTangent(restMm: number, length: number): Result<number, ZeroLength> {
  if (!(length > 0)) return refuse({ type: "ZeroLength", length });
  return answer(restMm / 1000 / length);
}

/**
 * Tangent shown by a U-tube.
 *
 *     tan = (level in the starboard leg − level in the port leg) / span
 *
 * Levels in millimetres on each leg's own scale, span athwartships between the legs in metres.
 * Refused: a span that is not above zero.
 * Source: *common practice*.
 */
export function uTubeTangent(portMm: number, starboardMm: number, span: number): Result<number, ZeroLength> {
  if (!(span > 0)) return refuse({ type: "ZeroLength", length: span });
  return answer((starboardMm - portMm) / 1000 / span);
}

/**
 * Tangent of the ship's heel shown by an inclinometer, whose zero adds in the angle and not in the tangent.
 *
 *     tan = tan(heel at zero + angle − angle at zero)
 *
 * Angles in degrees; the heel at zero is the tangent found by the draft marks.
 * Source: an inclinometer shows an angle from its own zero, *common practice*.
 */
export function inclinometerTangent(angleDegrees: number, zeroDegrees: number, tanHeelAtZero: number): number {
  return Math.tan(Math.atan(tanHeelAtZero) + ((angleDegrees - zeroDegrees) * Math.PI) / 180);
}
