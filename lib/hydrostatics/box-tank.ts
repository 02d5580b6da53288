import type { TankBox } from "./box-liquid";
import type { LevelRow } from "./tank-level";

/**
 * The sounding table of a tank that is a box, at equal steps to the millimetre: for tanks known by their dimensions only.
 *
 *     volume = length·breadth·level,   i = length·breadth³/12,   i_L = breadth·length³/12
 *
 * Exact at any level, since all three are linear in it or constant; no free surface where it is exactly empty or full.
 * Metres; broken promise: walls from a lower to a higher number, two steps or more.
 * Source: definition of the box.
 */
export function boxTankTable({ x, y, z }: TankBox, steps = 10): LevelRow[] {
  const [length, breadth, height] = [x[1] - x[0], y[1] - y[0], z[1] - z[0]];
  return Array.from({ length: steps + 1 }, (_, i) => {
    const level = toMillimetre((height * i) / steps);
    const isSlack = i > 0 && i < steps;
    return {
      level,
      volume: length * breadth * level,
      lcg: (x[0] + x[1]) / 2,
      tcg: (y[0] + y[1]) / 2,
      vcg: z[0] + level / 2,
      inertia: isSlack ? (length * breadth ** 3) / 12 : 0,
      inertiaLongitudinal: isSlack ? (breadth * length ** 3) / 12 : 0,
    };
  });
}

// levels such as 0.30000000000000004 are no sounding
function toMillimetre(value: number): number {
  return Math.round(value * 1000) / 1000;
}
