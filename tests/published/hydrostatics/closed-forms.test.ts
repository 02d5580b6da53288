import { describe, expect, it } from "vitest";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { promised } from "@/lib/result";
import { boxOffsets, halfCylinderOffsets, hullOf, prismOffsets, wigleyOffsets } from "../../lib/hydrostatics/sample-hulls";
import { planeAt } from "../../lib/hydrostatics/sample-planes";

/** Source: standard theory, from memory; each checked once by independent quadrature. */
describe("closed forms of simple hulls", () => {
  // straight sides are integrated exactly: only rounding is left
  it("box of 100 × 16 m at 6 m", () => {
    const found = promised(hydrostaticsAt(hullOf(boxOffsets(100, 16, 9)), planeAt(6, 100)));
    expect(found.volume).toBeCloseTo(9600, 9);
    expect(found.vcb).toBeCloseTo(3, 12);
    expect(found.bmt).toBeCloseTo(3.5555555555555554, 12);
    expect(found.bml).toBeCloseTo(138.88888888888889, 10);
  });

  it("prism with its edge down, 100 × 16 m at 6 m", () => {
    const wedge = prismOffsets(100, [
      [0, 0],
      [12, 9],
    ]);
    const found = promised(hydrostaticsAt(hullOf(wedge), planeAt(6, 100)));
    expect(found.volume).toBeCloseTo(4800, 9);
    expect(found.vcb).toBeCloseTo(4, 12);
    expect(found.bmt).toBeCloseTo(7.111111111111111, 12);
    expect(found.bml).toBeCloseTo(277.77777777777777, 10);
  });

  it("half cylinder of radius 4 m, 30 m long: its metacentre stands on the axis at any heel", () => {
    const hull = hullOf(halfCylinderOffsets(30, 4, 7, 720));
    const found = promised(hydrostaticsAt(hull, planeAt(4, 30)));
    // 720 chords in a quarter of a circle lose (π/1440)²/6 = 8e-7 of its area
    expect(found.volume / 753.9822368615503).toBeCloseTo(1, 5);
    expect(found.vcb).toBeCloseTo(2.3023472736864496, 5);
    expect(found.bmt).toBeCloseTo(1.6976527263135504, 5);
    expect(found.kmt).toBeCloseTo(4, 5);
  });

  it("Wigley's hull of 100 × 10 m at 6.25 m, from dense offsets", () => {
    const found = promised(hydrostaticsAt(hullOf(wigleyOffsets(100, 10, 6.25, 8, 240, 120)), planeAt(6.25, 100)));
    // parabolas by chords: 240 sections lose 1.7e-5 of the waterplane, 120 points as much of each section
    expect(found.volume / 2777.777777777778).toBeCloseTo(1, 4);
    expect(found.vcb).toBeCloseTo(3.90625, 3);
    expect(found.inertiaTransverse / 3809.5238095238096).toBeCloseTo(1, 4);
    expect(found.inertiaLongitudinal / 333333.3333333334).toBeCloseTo(1, 4);
    expect(found.waterplaneArea / (100 * 10 * 0.6666666666666666)).toBeCloseTo(1, 4);
    expect(found.bmt).toBeCloseTo(1.3714285714285714, 3);
    expect(found.bml).toBeCloseTo(120, 2);
  });

  it("Wigley's hull: the error of chords falls fourfold when offsets are twice as dense", () => {
    const exact = 2777.777777777778;
    const missing = (dense: number) =>
      exact - promised(hydrostaticsAt(hullOf(wigleyOffsets(100, 10, 6.25, 8, dense, dense)), planeAt(6.25, 100))).volume;
    expect(missing(20) / missing(40)).toBeCloseTo(4, 1);
    expect(missing(40) / missing(80)).toBeCloseTo(4, 1);
  });
});
