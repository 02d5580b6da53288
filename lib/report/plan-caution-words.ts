import type { PlanCaution } from "@/lib/inclining/plan-cautions";
import { figure } from "./rounding";

/** A caution of a plan as a person reads it, with what to do about it. */
export function planCautionSentence(caution: PlanCaution): string {
  switch (caution.type) {
    case "GmSmall":
      return `GM ${figure(caution.gmFluid, 2)} m is expected, less than ${figure(caution.least, 2)} m: do not incline her so. Take weight off, or ballast low, and plan again.`;
    case "HeelTooLarge":
      return `Move ${caution.move} would heel her ${degrees(caution.tanHeel)}°, more than ${caution.mostDegrees}°: take less weight or a shorter shift.`;
    case "DeckEdgeInWater":
      return `At move ${caution.move} the deck edge would be ${figure(-caution.leastFreeboard, 2)} m under water.`;
    case "KnuckleInWater":
      return `A knuckle of the hull crosses the water between the largest heels (${placesOf(caution.crossings)}): the line will not be straight there, and the classical result may be wrong by centimetres. Ballast or trim her clear of it, or rest on the generalised result.`;
    case "HeelTooSmall":
      return `To ${caution.side} she would heel ${degrees(caution.tanHeel)}° at most, less than ${caution.leastDegrees}°: take more weight or a longer shift.`;
    case "DeflectionTooSmall":
      return `Station ${caution.station} would show ${figure(caution.deflectionMm, 0)} mm on its lesser side, less than ${caution.leastMm} mm: hang it longer, or shift more.`;
  }
}

function degrees(tanHeel: number): string {
  return figure((Math.atan(Math.abs(tanHeel)) * 180) / Math.PI, 2);
}

function placesOf(crossings: readonly { readonly x: number; readonly side: string }[]): string {
  const sides = [...new Set(crossings.map(({ side }) => side))].join(" and ");
  const places = crossings.map(({ x }) => x);
  const [aft, forward] = [figure(Math.min(...places), 1), figure(Math.max(...places), 1)];
  return aft === forward ? `${sides}, ${aft} m forward of AP` : `${sides}, ${aft} to ${forward} m forward of AP`;
}
