import fc from "fast-check";
import type { Waterplane } from "@/lib/frame";

/** A waterplane without trim, heel or sag but for what is said. */
export function planeAt(draftAtAp: number, lbp: number, other: Partial<Waterplane> = {}): Waterplane {
  return { draftAtAp, slopeAlong: 0, tanHeel: 0, sag: 0, lbp, ...other };
}

/** Waterplanes at which the workboat floats: up to 6° of heel, 0.8 m of trim, 5 cm of sag. */
export const workboatPlanes = fc.record({
  draftAtAp: fc.double({ min: 1.8, max: 2.6, noNaN: true }),
  slopeAlong: fc.double({ min: -0.03, max: 0.03, noNaN: true }),
  tanHeel: fc.double({ min: -0.1, max: 0.1, noNaN: true }),
  sag: fc.double({ min: -0.05, max: 0.05, noNaN: true }),
  lbp: fc.constant(28),
});
