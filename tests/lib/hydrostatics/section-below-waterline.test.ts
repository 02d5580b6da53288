import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Strip } from "@/lib/hydrostatics/hull";
import { sectionBelowWaterline } from "@/lib/hydrostatics/section-below-waterline";
import { type Point, polygonBelowLine, polygonMoments } from "@/lib/numerics/polygon";
import { boxOffsets, hullOf, workboat } from "./sample-hulls";

const [box] = hullOf(boxOffsets(10, 8, 5)).strips;
const strips = hullOf(workboat).strips;

describe("section below the waterline", () => {
  it("is a rectangle in an upright box", () => {
    expect(sectionBelowWaterline(box as Strip, 0.3, 2, 0)).toEqual({
      area: 8,
      momentY: 16,
      momentZ: 8,
      breadth: 4,
      breadthMoment: 8,
      breadthSecondMoment: 64 / 3,
    });
  });

  it("has no waterline when it is dry or wholly under water", () => {
    expect(sectionBelowWaterline(box as Strip, 0, -1, 0)).toMatchObject({ area: 0, breadth: 0 });
    const sunken = sectionBelowWaterline(box as Strip, 0, 6, 0);
    expect(sunken.area).toBeCloseTo(20, 13);
    expect(sunken.breadth).toBe(0);
    expect(sunken.momentZ).toBeCloseTo(50, 13);
  });

  it("still has its waterline when the deck is just awash", () => {
    expect(sectionBelowWaterline(box as Strip, 0, 5, 0)).toMatchObject({ area: 20, breadth: 4 });
  });

  it("keeps both sides of a tunnel out of the water between them", () => {
    // bottom from the tunnel's crown (0, 1) down to (1, 0), out to (3, 0), up to the deck: at 0.5 m the tunnel is half full
    const tunnel = hullOf({
      sections: [0, 1].map((x) => ({ x, points: [[0, 1] as const, [1, 0] as const, [3, 0] as const, [3, 4] as const] })),
    }).strips[0] as Strip;
    const cut = sectionBelowWaterline(tunnel, 0.5, 0.5, 0);
    expect(cut.breadth).toBeCloseTo(2.5, 14);
    // 2 × 0.5 outside the corner, and the triangle inside it
    expect(cut.area).toBeCloseTo(1 + 0.125, 14);
  });

  it("agrees with clipping the closed polygon", () => {
    const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(fc.nat(strips.length - 1), number(0, 1), number(0.1, 6), number(-0.5, 0.5), (i, t, height, slope) => {
        const strip = strips[i] as Strip;
        const cut = sectionBelowWaterline(strip, t, height, slope);
        const clipped = polygonMoments(polygonBelowLine(halfSectionAt(strip, t), height, slope));
        expect(cut.area).toBeCloseTo(clipped.area, 12);
        expect(cut.momentY).toBeCloseTo(clipped.first[0], 12);
        expect(cut.momentZ).toBeCloseTo(clipped.first[1], 11);
      }),
    );
  });
});

function halfSectionAt({ aft, forward }: Strip, t: number): Point[] {
  const mixed = (a: readonly number[], b: readonly number[], i: number) => (1 - t) * (a[i] as number) + t * (b[i] as number);
  return aft.heights.map((_, i): Point => [mixed(aft.halfBreadths, forward.halfBreadths, i), mixed(aft.heights, forward.heights, i)]);
}
