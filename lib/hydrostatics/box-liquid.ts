import { type Point, polygonBelowLine, polygonCentroid, polygonMoments } from "@/lib/numerics/polygon";
import { rootBetween } from "@/lib/numerics/root";

/** A tank with six walls square to the ship: from and to along her, athwart and up [m]. */
export type TankBox = {
  readonly x: readonly [number, number];
  readonly y: readonly [number, number];
  readonly z: readonly [number, number];
};

/** Centre of a liquid athwart and up [m], and the second moment of its surface about its own fore-and-aft axis [m⁴]. */
export type TiltedLiquid = { readonly tcg: number; readonly vcg: number; readonly surfaceInertia: number };

/**
 * Where a given volume stands in a box whose surface lies at tan(heel) = c: the rectangle below the line z = a + c·y with the
 * area volume/length, clipped by walls, bottom and top; i = length·b³/12 with b the breadth of the surface between the walls.
 *
 * Exact at any heel; the tank's trim is left out (its own length is short against the ship's). A box that is empty or full
 * has no surface; a volume outside the box is taken as empty or full.
 * Source: centroid of the clipped rectangle, Green's theorem.
 */
export function liquidInBox({ x, y, z }: TankBox, volume: number, tanHeel: number): TiltedLiquid {
  const length = x[1] - x[0];
  const walls: readonly Point[] = [
    [y[0], z[0]],
    [y[1], z[0]],
    [y[1], z[1]],
    [y[0], z[1]],
  ];
  const whole = (y[1] - y[0]) * (z[1] - z[0]);
  const area = volume / length;
  const middle = (y[0] + y[1]) / 2;
  if (area <= 0) return { tcg: middle, vcg: z[0], surfaceInertia: 0 };
  if (area >= whole) return { tcg: middle, vcg: (z[0] + z[1]) / 2, surfaceInertia: 0 };
  const tilt = (Math.abs(tanHeel) * (y[1] - y[0])) / 2;
  const below = (height: number) => polygonBelowLine(walls, height - tanHeel * middle, tanHeel);
  const height = rootBetween((each) => polygonMoments(below(each)).area - area, z[0] - tilt, z[1] + tilt, 1e-12);
  if (!height.ok) return { tcg: middle, vcg: z[0], surfaceInertia: 0 };
  const [tcg, vcg] = polygonCentroid(below(height.value)) ?? [middle, z[0]];
  const breadth = surfaceBreadth(y, z, height.value - tanHeel * middle, tanHeel);
  return { tcg, vcg, surfaceInertia: (length * breadth ** 3) / 12 };
}

// the part of the line that lies between bottom and top
function surfaceBreadth(y: TankBox["y"], z: TankBox["z"], height: number, slope: number): number {
  if (slope === 0) return y[1] - y[0];
  const [a, b] = [(z[0] - height) / slope, (z[1] - height) / slope];
  return Math.max(0, Math.min(y[1], Math.max(a, b)) - Math.max(y[0], Math.min(a, b)));
}
