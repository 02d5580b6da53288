import { describe, expect, test } from "vitest";
import { liquidInBox, type TankBox } from "@/lib/hydrostatics/box-liquid";

const box: TankBox = { x: [10, 16], y: [-2, 4], z: [1, 2.5] };
const volume = 6 * 6 * 0.7;
const inertia = (6 * 6 ** 3) / 12;

describe("a liquid in a box", () => {
  test("stands level where the ship is upright", () => {
    expect(liquidInBox(box, volume, 0)).toEqual({ tcg: 1, vcg: expect.closeTo(1.35, 12), surfaceInertia: inertia });
  });

  // closed form: Δy = c·i/V, Δz = ½·c²·i/V while the surface meets the upright walls only
  test.each([0.01, -0.05, 0.2])("moves by its second moment while its surface meets walls only, tan(heel) %d", (tanHeel) => {
    const { tcg, vcg, surfaceInertia } = liquidInBox(box, volume, tanHeel);
    expect(tcg).toBeCloseTo(1 + (tanHeel * inertia) / volume, 11);
    expect(vcg).toBeCloseTo(1.35 + (tanHeel ** 2 * inertia) / volume / 2, 11);
    expect(surfaceInertia).toBeCloseTo(inertia, 9);
  });

  // closed form: a triangle in the corner, legs b and b·c with b²·c/2 = area, its centroid a third of each from the corner
  test("fills a corner as a triangle where the bottom runs dry", () => {
    const tanHeel = 0.5;
    const area = 0.6;
    const b = Math.sqrt((2 * area) / tanHeel);
    const { tcg, vcg, surfaceInertia } = liquidInBox(box, 6 * area, tanHeel);
    expect(tcg).toBeCloseTo(4 - b / 3, 11);
    expect(vcg).toBeCloseTo(1 + (b * tanHeel) / 3, 11);
    expect(surfaceInertia).toBeCloseTo((6 * b ** 3) / 12, 9);
  });

  test("the slope of its lever is what its surface's second moment gives, also where top and bottom clip it", () => {
    for (const [filled, tanHeel] of [
      [0.1, 0.09],
      [0.7, 0.4],
      [1.45, 0.05],
    ] as const) {
      const lever = (c: number) => {
        const { tcg, vcg } = liquidInBox(box, 36 * filled, c);
        return tcg + c * vcg;
      };
      const slope = (lever(tanHeel + 1e-5) - lever(tanHeel - 1e-5)) / 2e-5;
      const { vcg, surfaceInertia } = liquidInBox(box, 36 * filled, tanHeel);
      expect(slope).toBeCloseTo(vcg + (surfaceInertia * (1 + tanHeel ** 2)) / (36 * filled), 5);
    }
  });

  test("mirrors, and has no surface where it is empty or full", () => {
    const even: TankBox = { ...box, y: [-3, 3] };
    const [here, there] = [liquidInBox(even, volume, 0.1), liquidInBox(even, volume, -0.1)];
    expect(there.tcg).toBeCloseTo(-here.tcg, 12);
    expect(there.vcg).toBeCloseTo(here.vcg, 12);
    expect(liquidInBox(box, 0, 0.1)).toEqual({ tcg: 1, vcg: 1, surfaceInertia: 0 });
    expect(liquidInBox(box, 6 * 6 * 1.5, 0.1)).toEqual({ tcg: 1, vcg: 1.75, surfaceInertia: 0 });
  });
});
