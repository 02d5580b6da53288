import { describe, expect, it } from "vitest";
import { resampledPair } from "@/lib/hydrostatics/half-section";

const square: readonly (readonly [number, number])[] = [
  [0, 0],
  [2, 0],
  [2, 2],
];

describe("two neighbouring half-sections", () => {
  it("stay as they are with equal numbers of points", () => {
    const [aft, forward] = resampledPair(square, [
      [0, 0],
      [1, 1],
      [1, 3],
    ]);
    expect(aft).toEqual({ halfBreadths: [0, 2, 2, 0], heights: [0, 0, 2, 2] });
    expect(forward).toEqual({ halfBreadths: [0, 1, 1, 0], heights: [0, 1, 3, 3] });
  });

  it("are resampled at the union of their girth fractions otherwise", () => {
    // the square's corner lies at half its girth; the straight one has points at a quarter and at its ends
    const [aft, forward] = resampledPair(square, [
      [0, 0],
      [0, 1],
      [0, 2.5],
      [0, 4],
    ]);
    expect(aft).toEqual({ halfBreadths: [0, 1, 2, 2, 2, 0], heights: [0, 0, 0, 0.5, 2, 2] });
    expect(forward).toEqual({ halfBreadths: [0, 0, 0, 0, 0, 0], heights: [0, 1, 2, 2.5, 4, 4] });
  });

  it("let a single point meet every point of its neighbour", () => {
    const [, forward] = resampledPair(square, [[0, 7]]);
    expect(forward).toEqual({ halfBreadths: [0, 0, 0, 0], heights: [7, 7, 7, 7] });
  });

  it("pass over a point given twice", () => {
    const [aft] = resampledPair([...square.slice(0, 2), [2, 0], [2, 2]], square);
    expect(aft).toEqual({ halfBreadths: [0, 2, 2, 0], heights: [0, 0, 2, 2] });
  });
});
