import { liquidInBox } from "@/lib/hydrostatics/box-liquid";
import { type ArmAt, armThrough, type BuoyancyArm } from "@/lib/hydrostatics/buoyancy-arm";
import type { Liquid } from "./liquids";

/**
 * The hull's arm less what liquids of known shape do beyond their free surface correction, so that with it the fluid KG is the
 * same number at every heel:
 *
 *     f̂(c) = f(c) − Σ [m·(Δy(c) + c·Δz(c)) − ρ·i·c]/Δ,   Δ against the same liquid with the ship upright
 *
 * Only boxes are known by their shape; every other liquid counts by its free surface alone, as before. Where the surface meets
 * upright walls only the sum is ½·FSC·c³, below 0.1 mm in a test; where it meets a tank's top or bottom it is more.
 * Source: equilibrium with each liquid at its own centre, *common practice*.
 */
export function armWithLiquids(arm: BuoyancyArm, liquids: readonly Liquid[], displacement: number): BuoyancyArm {
  const boxed = liquids.filter(({ box, freeSurfaceInertia }) => box !== undefined && freeSurfaceInertia > 0);
  if (boxed.length === 0) return arm;
  const beyond = armThrough(heels(arm).map((tanHeel) => beyondFreeSurface(boxed, displacement, tanHeel)));
  return {
    from: arm.from,
    to: arm.to,
    at: (tanHeel) => {
      const [hull, liquid] = [arm.at(tanHeel), beyond.at(tanHeel)];
      return { tanHeel, arm: hull.arm - liquid.arm, slope: hull.slope - liquid.slope };
    },
  };
}

const nodes = 17;

function heels({ from, to }: BuoyancyArm): number[] {
  return Array.from({ length: nodes }, (_, i) => from + ((to - from) * i) / (nodes - 1));
}

function beyondFreeSurface(liquids: readonly Liquid[], displacement: number, tanHeel: number): ArmAt {
  let [arm, slope] = [0, 0];
  for (const { box, volume, density, freeSurfaceInertia } of liquids) {
    if (box === undefined) continue;
    const [upright, tilted] = [liquidInBox(box, volume, 0), liquidInBox(box, volume, tanHeel)];
    const mass = volume * density;
    const [athwart, up] = [tilted.tcg - upright.tcg, tilted.vcg - upright.vcg];
    arm += mass * (athwart + tanHeel * up) - density * freeSurfaceInertia * tanHeel;
    // d/dc of y + c·z is z + i·(1 + c²)/V for a surface that turns about its own middle
    slope += mass * up + density * (tilted.surfaceInertia * (1 + tanHeel ** 2) - freeSurfaceInertia);
  }
  return { tanHeel, arm: arm / displacement, slope: slope / displacement };
}
