import { describe, expect, test } from "vitest";
import { liquidInBox, type TankBox } from "@/lib/hydrostatics/box-liquid";
import { armThrough } from "@/lib/hydrostatics/buoyancy-arm";
import { armWithLiquids, beyondFreeSurface } from "@/lib/inclining/liquid-arm";
import type { Liquid } from "@/lib/inclining/liquids";

const heels = Array.from({ length: 9 }, (_, i) => -0.08 + 0.02 * i);
const hull = armThrough(heels.map((tanHeel) => ({ tanHeel, arm: 6 * tanHeel, slope: 6 })));
const box: TankBox = { x: [0, 8], y: [-3, 3], z: [0, 1] };
const inertia = (8 * 6 ** 3) / 12;
const displacement = 1500;

describe("the arm with liquids of known shape", () => {
  test("is the hull's own where no tank is a box, or where none is slack", () => {
    const { box: _, ...unknown } = liquid(0.5);
    const none = beyondFreeSurface([unknown, { ...liquid(1), freeSurfaceInertia: 0 }], heels);
    expect(none).toBeNull();
    expect(armWithLiquids(hull, none, displacement)).toBe(hull);
  });

  // closed form: ½·FSC·c³ while the surface meets upright walls only
  test("is less by ½·FSC·c³ on upright walls", () => {
    const arm = armWithLiquids(hull, beyondFreeSurface([liquid(0.5)], heels), displacement);
    const fsc = inertia / displacement;
    for (const c of [-0.07, -0.03, 0, 0.05]) {
      expect(arm.at(c).arm - hull.at(c).arm).toBeCloseTo(-0.5 * fsc * c ** 3, 9);
      expect(arm.at(c).slope - hull.at(c).slope).toBeCloseTo(-1.5 * fsc * c ** 2, 6);
    }
  });

  test("gives back what the free surface correction took too much where the bottom runs dry", () => {
    const arm = armWithLiquids(hull, beyondFreeSurface([liquid(0.1)], heels), displacement);
    const [c, mass] = [0.06, 8 * 6 * 0.1];
    const [upright, tilted] = [liquidInBox(box, mass, 0), liquidInBox(box, mass, c)];
    const moved = mass * (tilted.tcg - upright.tcg + c * (tilted.vcg - upright.vcg));
    expect(moved).toBeLessThan(inertia * c);
    expect(arm.at(c).arm - hull.at(c).arm).toBeCloseTo((inertia * c - moved) / displacement, 6);
  });
});

/** Fresh water standing so high in the box [m]. */
function liquid(level: number): Liquid {
  const volume = 8 * 6 * level;
  return { id: "T", density: 1, volume, mass: volume, lcg: 4, tcg: 0, vcg: level / 2, freeSurfaceInertia: inertia, level, box };
}
