import { liquidInBox } from "@/lib/hydrostatics/box-liquid";
import { type ArmAt, armThrough, type BuoyancyArm } from "@/lib/hydrostatics/buoyancy-arm";
import type { Liquid } from "./liquids";

/** Moments of liquids at heels [t·m], and how they change with tan(heel). */
export type LiquidMoments = readonly ArmAt[];

/**
 * What liquids of known shape do beyond their free surface correction, at each of some heels; null where none is known.
 *
 *     Σ [m·(Δy(c) + c·Δz(c)) − ρ·i·c],   Δ against the same liquid with the ship upright
 *
 * Only boxes are known by their shape; every other liquid counts by its free surface alone. Where the surface meets upright
 * walls only the sum is ½·Σρ·i·c³, below 0.1 mm of KG in a test; where it meets a tank's top or bottom it is more.
 * Source: equilibrium with each liquid at its own centre, *common practice*.
 */
export function beyondFreeSurface(liquids: readonly Liquid[], heels: readonly number[]): LiquidMoments | null {
  const boxed = liquids.filter(({ box, freeSurfaceInertia }) => box !== undefined && freeSurfaceInertia > 0);
  if (boxed.length === 0) return null;
  const moments = boxed.map(momentOf);
  return heels.map((tanHeel) => added(moments.map((at) => at(tanHeel))));
}

/** The hull's arm less those moments at its nodes, f̂(c) = f(c) − moment(c)/Δ: with it the fluid KG is the same number at every heel. */
export function armWithLiquids(arm: BuoyancyArm, moments: LiquidMoments | null, displacement: number): BuoyancyArm {
  if (moments === null) return arm;
  return armThrough(
    arm.nodes.map((hull, i) => {
      const { arm: moment, slope } = moments[i] as ArmAt;
      return { tanHeel: hull.tanHeel, arm: hull.arm - moment / displacement, slope: hull.slope - slope / displacement };
    }),
  );
}

function momentOf({ box, volume, density, freeSurfaceInertia }: Liquid): (tanHeel: number) => ArmAt {
  if (box === undefined) return (tanHeel) => ({ tanHeel, arm: 0, slope: 0 });
  const mass = volume * density;
  const upright = liquidInBox(box, volume, 0);
  return (tanHeel) => {
    const tilted = liquidInBox(box, volume, tanHeel);
    const [athwart, up] = [tilted.tcg - upright.tcg, tilted.vcg - upright.vcg];
    return {
      tanHeel,
      arm: mass * (athwart + tanHeel * up) - density * freeSurfaceInertia * tanHeel,
      // d/dc of y + c·z is z + i·(1 + c²)/V for a surface that turns about its own middle
      slope: mass * up + density * (tilted.surfaceInertia * (1 + tanHeel ** 2) - freeSurfaceInertia),
    };
  };
}

function added(moments: readonly ArmAt[]): ArmAt {
  return moments.reduce((sum, { tanHeel, arm, slope }) => ({ tanHeel, arm: sum.arm + arm, slope: sum.slope + slope }));
}
