import { describe, expect, it } from "vitest";
import { type Tank, type TankContents, tankContents } from "@/lib/hydrostatics/tank";
import { type Point, polygonMoments } from "@/lib/numerics/polygon";
import { promised } from "@/lib/result";

const upright = { trim: 0, tanHeel: 0, lbp: 100 };

describe("free surface of published tanks", () => {
  /** Source: GATE (India), questions.collegedunia.com: displacement 5000 t, tank 6 × 10 m, relative density 0.8: 8 cm. */
  it("6 × 10 m of oil in 5000 t lose 8 cm of GM", () => {
    expect(lossOfGm(halfFull({ length: 6, breadth: 10, depth: 2, density: 0.8 }), 0.8, 5000)).toBeCloseTo(0.08, 12);
  });

  /** Source: GATE 2025 (India), questions.collegedunia.com: tanks 12 × 16 m and 16 × 12 m: 4096 and 2304 m⁴. */
  it.each([
    [12, 16, 4096],
    [16, 12, 2304],
  ])("%d m long and %d m broad: %d m⁴, the breadth counts", (length, breadth, inertia) => {
    expect(halfFull({ length, breadth, depth: 2, density: 1 }).freeSurfaceInertia).toBeCloseTo(inertia, 9);
    expect(polygonMoments(rectangle(length, breadth)).second[1]).toBeCloseTo(inertia, 9);
  });

  /** Source: marinegyaan.com/stability-i-chapter-10/: 242 m⁴ in 5000 t; 0.0426 m and 0.0496 m printed truncated. */
  it.each([
    [0.88, 0.042],
    [1.025, 0.049],
  ])("242 m⁴ of relative density %d in 5000 t: %d m", (density, expected) => {
    const breadth = ((12 * 242) / 10) ** (1 / 3);
    expect(Math.abs(lossOfGm(halfFull({ length: 10, breadth, depth: 2, density }), density, 5000) - expected)).toBeLessThan(0.0007);
  });

  /** Source: United States deck examination, question 0449: two tanks 40 × 30 ft, 0.86, in 9000 long tons of 35 ft³: 0.48 ft. */
  it("two tanks of 40 × 30 ft in 9000 long tons: 0.48 ft", () => {
    const each = halfFull({ length: 40, breadth: 30, depth: 10, density: 0.86 }).freeSurfaceInertia;
    expect(Math.abs((2 * each * (0.86 / 1.025)) / (35 * 9000) - 0.48)).toBeLessThan(0.005);
  });

  /** Source: Derrett, Ship Stability for Masters and Mates, 5th ed., p. 195, inputs; the answer from memory. KM taken as constant. */
  it("a double bottom 15 × 10 × 2 m pumped half out leaves GM 0.225 m", () => {
    const tank = boxTank({ length: 15, breadth: 10, depth: 2, density: 1.025 });
    const [full, half] = [promised(tankContents(tank, 2, upright)), promised(tankContents(tank, 1, upright))];
    const displacement = 8153.75 - full.mass + half.mass;
    const vcg = (8153.75 * 7.5 - full.mass * full.vcg + half.mass * half.vcg) / displacement;
    expect(displacement).toBeCloseTo(8000, 9);
    expect(Math.abs(8 - vcg - lossOfGm(half, 1.025, displacement) - 0.225)).toBeLessThan(0.001);
    expect(full.freeSurfaceInertia).toBe(0);
  });
});

type Box = { readonly length: number; readonly breadth: number; readonly depth: number; readonly density: number };

function halfFull(box: Box): TankContents {
  return promised(tankContents(boxTank(box), box.depth / 2, upright));
}

function boxTank({ length, breadth, depth, density }: Box): Tank {
  const inertia = polygonMoments(rectangle(length, breadth)).second[1];
  const table = [0, 0.25, 0.75, 1].map((share) => {
    const level = share * depth;
    const slack = share > 0 && share < 1;
    return { level, volume: length * breadth * level, lcg: 50, tcg: 0, vcg: level / 2, inertia: slack ? inertia : 0 };
  });
  return { id: "T", density, measure: "sounding", table };
}

// about its own fore-and-aft axis
function rectangle(length: number, breadth: number): readonly Point[] {
  const [u, v] = [length / 2, breadth / 2];
  return [
    [-u, -v],
    [u, -v],
    [u, v],
    [-u, v],
  ];
}

function lossOfGm(contents: TankContents, density: number, displacement: number): number {
  return (density * contents.freeSurfaceInertia) / displacement;
}
