import { between } from "@/lib/numerics/interpolation";
import type { Strip } from "./hull";

/**
 * Half a section below the waterline, and the cut that the waterline makes in it.
 * `y` is the half-breadth outward from the centreline, so port and starboard share one formula.
 */
export type SectionBelowWaterline = {
  area: number;
  momentY: number;
  momentZ: number;
  /** ∫dy, ∫y dy and ∫y² dy along the waterline inside the section */
  breadth: number;
  breadthMoment: number;
  breadthSecondMoment: number;
};

/**
 * The half-section at fraction t of a strip, below the line z = height + slope·y.
 *
 * Every hull edge below the line spans a triangle with the point where the line meets the centreline; edges on the
 * centreline and on the line span none, so the clipped polygon never has to be closed:
 *
 *     A = ½Σk,  ∫y = ⅙Σ(y₀+y₁)k,  ∫z' = ⅙Σ(z'₀+z'₁)k,  k = y₀z'₁ − y₁z'₀,  z' = z − height
 *
 * An edge that leaves the water going up adds its crossing to the cut, one that enters it going up takes it off.
 *
 * Source: Green's theorem.
 */
export function sectionBelowWaterline(strip: Strip, t: number, height: number, slope: number): SectionBelowWaterline {
  const cut = { area: 0, momentY: 0, momentZ: 0, breadth: 0, breadthMoment: 0, breadthSecondMoment: 0 };
  const { aft, forward } = strip;
  let y0 = 0;
  let z0 = 0;
  let above0 = 0;
  for (let i = 0; i < aft.heights.length; i++) {
    const y1 = between(aft.halfBreadths[i] as number, forward.halfBreadths[i] as number, t);
    const z1 = between(aft.heights[i] as number, forward.heights[i] as number, t) - height;
    const above1 = z1 - slope * y1;
    if (i > 0) addEdge(cut, y0, z0, above0, y1, z1, above1);
    y0 = y1;
    z0 = z1;
    above0 = above1;
  }
  cut.momentZ += height * cut.area;
  return cut;
}

// a point on the waterline counts as above it
function addEdge(cut: SectionBelowWaterline, y0: number, z0: number, above0: number, y1: number, z1: number, above1: number): void {
  if (above0 < 0 && above1 < 0) addTriangle(cut, y0, z0, y1, z1);
  if (above0 < 0 === above1 < 0) return;
  const fraction = above0 / (above0 - above1);
  const y = y0 + fraction * (y1 - y0);
  const z = z0 + fraction * (z1 - z0);
  if (above0 < 0) addTriangle(cut, y0, z0, y, z);
  else addTriangle(cut, y, z, y1, z1);
  addCrossing(cut, y, above0 < 0 ? 1 : -1);
}

function addTriangle(cut: SectionBelowWaterline, y0: number, z0: number, y1: number, z1: number): void {
  const k = y0 * z1 - y1 * z0;
  cut.area += k / 2;
  cut.momentY += ((y0 + y1) * k) / 6;
  cut.momentZ += ((z0 + z1) * k) / 6;
}

function addCrossing(cut: SectionBelowWaterline, y: number, sign: 1 | -1): void {
  cut.breadth += sign * y;
  cut.breadthMoment += (sign * y * y) / 2;
  cut.breadthSecondMoment += (sign * y * y * y) / 3;
}
