import { type Waterplane, waterplaneHeight } from "@/lib/frame";
import type { Offsets } from "./hull";

/** An edge of the hull that the water reaches or leaves as the ship heels. */
export type EdgeCrossing = {
  readonly kind: "knuckle" | "deck-edge";
  readonly x: number;
  readonly side: "port" | "starboard";
  /** at which it meets the water */
  readonly tanHeel: number;
};

/** Below this bend two straight lines of a section are one curve drawn with few points [tangent of about 15°]. */
const knuckleBend = 0.27;

/**
 * Knuckles and deck edges that cross the water while a ship heels over a range: there her waterplane changes at once, and a
 * straight line of tangent on moment can't hold.
 *
 *     the water stands at z = a + b·x + s·4x(L−x)/L² + c·y;   an edge at (x, ±y, z) meets it at c = ±(z − z₀(x))/y
 *
 * The sinkage with heel is left out: it moves a crossing by the square of the heel. An edge is a knuckle where a section
 * bends by more than 15°. Source: geometry of the waterplane, `lib/frame.ts`.
 */
export function edgesInTheWater(
  { sections }: Pick<Offsets, "sections">,
  plane: Waterplane,
  [from, to]: readonly [number, number],
): readonly EdgeCrossing[] {
  const upright = { ...plane, tanHeel: 0 };
  return sections.flatMap(({ x, points }) =>
    points.flatMap(([y, z], i): EdgeCrossing[] => {
      const kind = i === points.length - 1 ? "deck-edge" : isKnuckle(points, i) ? "knuckle" : null;
      if (kind === null || y <= 0) return [];
      const starboard = (z - waterplaneHeight(upright, x, 0)) / y;
      const crossings: EdgeCrossing[] = [
        { kind, x, side: "starboard", tanHeel: starboard },
        { kind, x, side: "port", tanHeel: -starboard },
      ];
      return crossings.filter(({ tanHeel }) => tanHeel > from && tanHeel < to);
    }),
  );
}

function isKnuckle(points: readonly (readonly [number, number])[], i: number): boolean {
  const [before, here, after] = [points[i - 1], points[i], points[i + 1]];
  if (!before || !here || !after) return false;
  const [ay, az] = [here[0] - before[0], here[1] - before[1]];
  const [by, bz] = [after[0] - here[0], after[1] - here[1]];
  const along = ay * by + az * bz;
  return Math.abs(ay * bz - az * by) > knuckleBend * along || along <= 0;
}
