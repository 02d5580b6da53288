import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Point, polygonBelowLine, polygonCentroid, polygonMoments } from "@/lib/numerics/polygon";

const rectangle: readonly Point[] = [
  [0, 0],
  [4, 0],
  [4, 3],
  [0, 3],
];

describe("polygon", () => {
  it("has a rectangle's area and moments", () => {
    expect(polygonMoments(rectangle)).toEqual({ area: 12, first: [24, 18], second: [64, 36] });
    expect(polygonCentroid(rectangle)).toEqual([2, 1.5]);
  });

  it("counts a clockwise one as negative", () => {
    expect(polygonMoments(rectangle.toReversed()).area).toBe(-12);
  });

  it("encloses nothing with two points", () => {
    expect(polygonCentroid(rectangle.slice(0, 2))).toBeNull();
  });

  it("is cut by a line into parts that make up the whole", () => {
    const number = fc.double({ min: -5, max: 5, noNaN: true });
    fc.assert(
      fc.property(number, number, (height, slope) => {
        const below = polygonMoments(polygonBelowLine(rectangle, height, slope)).area;
        const turned = rectangle.map(([u, v]): Point => [u, -v]).toReversed();
        const above = polygonMoments(polygonBelowLine(turned, -height, -slope)).area;
        expect(below + above).toBeCloseTo(12, 12);
      }),
    );
  });

  it("keeps a triangle under a slanting line", () => {
    expect(polygonMoments(polygonBelowLine(rectangle, 3, -1)).area).toBeCloseTo(4.5, 14);
  });
});
