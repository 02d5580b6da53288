import type { TestRecord } from "@/lib/record/test-record";

type Tank = TestRecord["tanks"][number];

/** A tank with upright walls: from and to along the ship, athwart and up [m]. */
export type Box = {
  readonly x: readonly [number, number];
  readonly y: readonly [number, number];
  readonly z: readonly [number, number];
};

/**
 * The table of a box at equal steps of its sounding.
 *
 *     volume = length·breadth·level,   i = length·breadth³/12,   i_L = breadth·length³/12
 *
 * By definition of the box; no free surface where it is exactly empty or full.
 */
export function boxTankTable({ x, y, z }: Box, steps = 10): Tank["table"] {
  const [length, breadth, height] = [x[1] - x[0], y[1] - y[0], z[1] - z[0]];
  return Array.from({ length: steps + 1 }, (_, i) => {
    const level = (height * i) / steps;
    const isSlack = i > 0 && i < steps;
    return {
      level: toMillimetre(level),
      volume: length * breadth * toMillimetre(level),
      lcg: (x[0] + x[1]) / 2,
      tcg: (y[0] + y[1]) / 2,
      vcg: z[0] + toMillimetre(level) / 2,
      inertia: isSlack ? (length * breadth ** 3) / 12 : 0,
      inertiaLongitudinal: isSlack ? (breadth * length ** 3) / 12 : 0,
    };
  });
}

// levels such as 0.30000000000000004 are no sounding
function toMillimetre(value: number): number {
  return Math.round(value * 1000) / 1000;
}
