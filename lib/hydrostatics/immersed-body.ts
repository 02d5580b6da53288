import type { Waterplane } from "@/lib/frame";
import { sum } from "@/lib/numerics/sum";
import { type HalfBody, halfBodyBelow } from "./half-body";
import type { Hull } from "./hull";

/** Integrals over the whole immersed body and its waterplane about the ship's axes; y to starboard. */
export type ImmersedBody = HalfBody;

/**
 * Everything below a waterplane: both halves of the moulded hull with their shell, and the appendages.
 *
 * The shell factor multiplies every moulded integral, of the waterplane too: plating widens the waterplane about as much as
 * it adds to the volume, and only so is BM the rate at which the centre of buoyancy moves. Appendages add volume and moments.
 * Never refuses: a dry hull has volume 0, a sunken one waterplane area 0.
 */
export function immersedBody(hull: Hull, plane: Waterplane): ImmersedBody {
  const starboard = halfBodyBelow(hull, plane, plane.tanHeel);
  const port = plane.tanHeel === 0 ? starboard : halfBodyBelow(hull, plane, -plane.tanHeel);
  const { shellFactor: f, appendages } = hull;
  return {
    volume: f * (starboard.volume + port.volume) + sum(appendages.map((a) => a.volume)),
    momentX: f * (starboard.momentX + port.momentX) + sum(appendages.map((a) => a.volume * a.x)),
    momentY: f * (starboard.momentY - port.momentY) + sum(appendages.map((a) => a.volume * a.y)),
    momentZ: f * (starboard.momentZ + port.momentZ) + sum(appendages.map((a) => a.volume * a.z)),
    area: f * (starboard.area + port.area),
    areaX: f * (starboard.areaX + port.areaX),
    areaY: f * (starboard.areaY - port.areaY),
    areaXX: f * (starboard.areaXX + port.areaXX),
    areaXY: f * (starboard.areaXY - port.areaXY),
    areaYY: f * (starboard.areaYY + port.areaYY),
  };
}
