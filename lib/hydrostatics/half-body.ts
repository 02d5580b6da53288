import { sagShape, type Waterplane } from "@/lib/frame";
import { gaussLegendre } from "@/lib/numerics/gauss";
import type { Hull, Strip } from "./hull";
import { sectionBelowWaterline } from "./section-below-waterline";

/** Integrals over one half of the immersed moulded body and of its waterplane (projected on the base plane); y outward. */
export type HalfBody = {
  readonly volume: number;
  readonly momentX: number;
  readonly momentY: number;
  readonly momentZ: number;
  readonly area: number;
  readonly areaX: number;
  readonly areaY: number;
  readonly areaXX: number;
  readonly areaXY: number;
  readonly areaYY: number;
};

/**
 * The half of the hull on the side where y grows outward, below a waterplane that rises outward with `slope`.
 *
 * Each strip is cut along x where a corner of the section passes through the waterplane; between those places the
 * integrand is smooth and taken by Gauss's rule of four points, halved until both halves agree with the whole to 1e-10.
 */
export function halfBodyBelow(hull: Hull, plane: Waterplane, slope: number): HalfBody {
  let total = nothing;
  for (const strip of hull.strips) {
    const breaks = breaksOf(strip, plane, slope);
    for (let i = 1; i < breaks.length; i++) total = added(total, spanOf(strip, plane, slope, breaks[i - 1] as number, breaks[i] as number));
  }
  return total;
}

/** Fractions of a strip, 0 and 1 included, between which no corner of its section passes through the waterplane. */
export function breaksOf(strip: Strip, plane: Waterplane, slope: number): number[] {
  const [h0, h1, h2] = heightAlong(strip, plane);
  const breaks = [0, 1];
  strip.aft.heights.forEach((zAft, i) => {
    const yAft = strip.aft.halfBreadths[i] as number;
    const zChange = (strip.forward.heights[i] as number) - zAft;
    const yChange = (strip.forward.halfBreadths[i] as number) - yAft;
    for (const t of rootsOf(zAft - slope * yAft - h0, zChange - slope * yChange - h1, -h2)) {
      if (t > 0 && t < 1) breaks.push(t);
    }
  });
  return breaks.sort((a, b) => a - b).filter((t, i, all) => i === 0 || t > (all[i - 1] as number));
}

const rule = gaussLegendre(4);
const agreement = 1e-10;
const deepest = 12;

const nothing: HalfBody = {
  volume: 0,
  momentX: 0,
  momentY: 0,
  momentZ: 0,
  area: 0,
  areaX: 0,
  areaY: 0,
  areaXX: 0,
  areaXY: 0,
  areaYY: 0,
};

// height of the waterplane on the centreline as h₀ + h₁t + h₂t²
function heightAlong({ xAft, xForward }: Strip, plane: Waterplane): readonly [number, number, number] {
  const length = xForward - xAft;
  const h0 = plane.draftAtAp + plane.slopeAlong * xAft + plane.sag * sagShape(plane.lbp, xAft);
  const h2 = (-4 * plane.sag * length ** 2) / plane.lbp ** 2;
  const h1 = plane.slopeAlong * length + plane.sag * (sagShape(plane.lbp, xForward) - sagShape(plane.lbp, xAft)) - h2;
  return [h0, h1, h2];
}

function rootsOf(q0: number, q1: number, q2: number): number[] {
  if (q2 === 0) return q1 === 0 ? [] : [-q0 / q1];
  const discriminant = q1 * q1 - 4 * q2 * q0;
  if (discriminant < 0) return [];
  const far = -(q1 + (q1 < 0 ? -1 : 1) * Math.sqrt(discriminant)) / 2;
  return far === 0 ? [0] : [far / q2, q0 / far];
}

function spanOf(strip: Strip, plane: Waterplane, slope: number, from: number, to: number): HalfBody {
  return refined(strip, plane, slope, from, to, byRule(strip, plane, slope, from, to), deepest);
}

function refined(strip: Strip, plane: Waterplane, slope: number, from: number, to: number, whole: HalfBody, depth: number): HalfBody {
  if (whole.area === 0 || depth === 0) return whole;
  const middle = (from + to) / 2;
  const aft = byRule(strip, plane, slope, from, middle);
  const forward = byRule(strip, plane, slope, middle, to);
  const halves = added(aft, forward);
  if (agree(whole, halves)) return halves;
  return added(refined(strip, plane, slope, from, middle, aft, depth - 1), refined(strip, plane, slope, middle, to, forward, depth - 1));
}

function agree(a: HalfBody, b: HalfBody): boolean {
  return near(a.volume, b.volume) && near(a.area, b.area) && near(a.areaYY, b.areaYY);
}

function near(a: number, b: number): boolean {
  return Math.abs(a - b) <= agreement * Math.abs(b);
}

function byRule(strip: Strip, plane: Waterplane, slope: number, from: number, to: number): HalfBody {
  const length = strip.xForward - strip.xAft;
  let total = nothing;
  for (let i = 0; i < rule.nodes.length; i++) {
    const t = from + (to - from) * (rule.nodes[i] as number);
    const weight = (to - from) * length * (rule.weights[i] as number);
    total = added(total, sliceOf(strip, plane, slope, t, weight));
  }
  return total;
}

function sliceOf(strip: Strip, plane: Waterplane, slope: number, t: number, thickness: number): HalfBody {
  const x = strip.xAft + t * (strip.xForward - strip.xAft);
  const height = plane.draftAtAp + plane.slopeAlong * x + plane.sag * sagShape(plane.lbp, x);
  const cut = sectionBelowWaterline(strip, t, height, slope);
  const area = cut.breadth * thickness;
  return {
    volume: cut.area * thickness,
    momentX: cut.area * thickness * x,
    momentY: cut.momentY * thickness,
    momentZ: cut.momentZ * thickness,
    area,
    areaX: area * x,
    areaY: cut.breadthMoment * thickness,
    areaXX: area * x * x,
    areaXY: cut.breadthMoment * thickness * x,
    areaYY: cut.breadthSecondMoment * thickness,
  };
}

function added(a: HalfBody, b: HalfBody): HalfBody {
  return {
    volume: a.volume + b.volume,
    momentX: a.momentX + b.momentX,
    momentY: a.momentY + b.momentY,
    momentZ: a.momentZ + b.momentZ,
    area: a.area + b.area,
    areaX: a.areaX + b.areaX,
    areaY: a.areaY + b.areaY,
    areaXX: a.areaXX + b.areaXX,
    areaXY: a.areaXY + b.areaXY,
    areaYY: a.areaYY + b.areaYY,
  };
}
