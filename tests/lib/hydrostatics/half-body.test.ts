import { describe, expect, it } from "vitest";
import { waterplaneHeight } from "@/lib/frame";
import { breaksOf, halfBodyBelow } from "@/lib/hydrostatics/half-body";
import type { Strip } from "@/lib/hydrostatics/hull";
import { sectionBelowWaterline } from "@/lib/hydrostatics/section-below-waterline";
import { boxOffsets, hullOf, workboat } from "./sample-hulls";
import { planeAt } from "./sample-planes";

describe("breaks along a strip", () => {
  const [strip] = hullOf(boxOffsets(60, 12, 5)).strips as readonly [Strip];

  it("stand where a corner passes through the waterplane", () => {
    // bottom corner at z = 0: 1 − x/20 = 0 at a third of the length, and the centreline's at the same place
    expect(breaksOf(strip, planeAt(1, 60, { slopeAlong: -0.05 }), 0)).toEqual([0, 1 / 3, 1]);
  });

  it("stand at both places where a sagging waterplane dips below a corner", () => {
    const hogged = planeAt(0.01, 60, { sag: -0.02 });
    const breaks = breaksOf(strip, hogged, 0);
    expect(breaks).toHaveLength(4);
    for (const t of breaks.slice(1, 3)) expect(waterplaneHeight(hogged, 60 * t, 0)).toBeCloseTo(0, 14);
  });

  it("are only the ends where no corner is cut", () => {
    expect(breaksOf(strip, planeAt(2, 60), 0.01)).toEqual([0, 1]);
  });
});

describe("half body", () => {
  it("is a wedge where the box is dry forward", () => {
    const body = halfBodyBelow(hullOf(boxOffsets(60, 12, 5)), planeAt(1, 60, { slopeAlong: -0.05 }), 0);
    expect(body.volume).toBeCloseTo(6 * 10, 12);
    expect(body.area).toBeCloseTo(6 * 20, 12);
    expect(body.momentX).toBeCloseTo(60 * (20 / 3), 11);
  });

  it("agrees with thin slices of the same surface", () => {
    const hull = hullOf(workboat);
    const plane = planeAt(2.1, 28, { slopeAlong: -0.01, sag: 0.03 });
    const body = halfBodyBelow(hull, plane, 0.08);
    const slices = 20_000;
    let volume = 0;
    let second = 0;
    for (const strip of hull.strips) {
      const thickness = (strip.xForward - strip.xAft) / slices;
      for (let i = 0; i < slices; i++) {
        const t = (i + 0.5) / slices;
        const x = strip.xAft + t * (strip.xForward - strip.xAft);
        const cut = sectionBelowWaterline(strip, t, waterplaneHeight(plane, x, 0), 0.08);
        volume += cut.area * thickness;
        second += cut.breadthSecondMoment * thickness;
      }
    }
    // midpoint slices err as the square of their thickness, and by one slice where a corner is cut
    expect(volume / body.volume).toBeCloseTo(1, 8);
    expect(second / body.areaYY).toBeCloseTo(1, 7);
  });
});
