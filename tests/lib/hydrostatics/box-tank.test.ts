import { describe, expect, it } from "vitest";
import { boxTankTable } from "@/lib/hydrostatics/box-tank";
import { tankContents } from "@/lib/hydrostatics/tank";
import { promised } from "@/lib/result";

const table = boxTankTable({ x: [10, 16], y: [1, 5], z: [0.5, 2.5] });
const contents = (level: number) =>
  promised(tankContents({ id: "T", density: 0.9, measure: "sounding", table }, level, { trim: 0, tanHeel: 0, lbp: 60 }));

describe("table of a box tank", () => {
  it("is exact at any level: 6 × 4 × 0.9 m", () => {
    const half = contents(0.9);
    expect(half.volume).toBeCloseTo(21.6, 9);
    expect([half.lcg, half.tcg]).toEqual([13, 3]);
    expect(half.vcg).toBeCloseTo(0.95, 9);
    expect(half.freeSurfaceInertia).toBeCloseTo(32, 9);
    expect(half.inertiaLongitudinal).toBeCloseTo(72, 9);
  });

  it("has no free surface when exactly empty or full", () => {
    expect(contents(0)).toMatchObject({ volume: 0, freeSurfaceInertia: 0 });
    expect(contents(2)).toMatchObject({ volume: 48, freeSurfaceInertia: 0 });
    expect(contents(1.99).freeSurfaceInertia).toBeCloseTo(32, 9);
  });
});
