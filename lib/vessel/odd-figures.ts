import type { OffsetSection } from "@/lib/hydrostatics/hull";
import { type HydrostaticRow, tablesByTrim } from "@/lib/hydrostatics/hydrostatic-row";
import { between } from "@/lib/numerics/interpolation";
import { oddOnes } from "@/lib/numerics/odd-ones";

export type OddFigure =
  | {
      readonly type: "OddOffset";
      readonly x: number;
      readonly z: number;
      readonly halfBreadth: number;
      readonly expected: number;
    }
  | {
      readonly type: "OddInTable";
      readonly column: Exclude<keyof HydrostaticRow, "trim" | "draft">;
      readonly draft: number;
      readonly trim: number;
      readonly value: number;
      readonly expected: number;
    };

/** what a transom or a knuckle that meets the water may do to a column, and no wrong figure [m, m², m³]; or this share of its range */
const columns = { volume: 0, lcb: 0.05, vcb: 0.02, lcf: 0.1, waterplaneArea: 0, kmt: 0.05, kml: 0 } as const;
const shareOfRange = 0.02;
/** a fifth of a metre, or a twentieth of the half-breadth where that is more [m] */
const leastOff = 0.2;
const shareOfBreadth = 0.05;

/** Figures of a hydrostatic table that stand off the curve of their column: findings to look at, not faults. */
export function oddInTable(rows: readonly HydrostaticRow[]): readonly OddFigure[] {
  return tablesByTrim(rows).flatMap(({ trim, rows: own }) => {
    const drafts = own.map(({ draft }) => draft);
    return (Object.keys(columns) as (keyof typeof columns)[]).flatMap((column) => {
      const values = own.map((row) => row[column]);
      const least = Math.max(columns[column], shareOfRange * (Math.max(...values) - Math.min(...values)));
      return oddOnes(drafts, values, least).map(({ index, value, expected }) => ({
        type: "OddInTable" as const,
        column,
        draft: drafts[index] as number,
        trim,
        value,
        expected,
      }));
    });
  });
}

/**
 * Half-breadths that stand off both the waterline through the neighbouring sections and the section through the neighbouring
 * points: findings to look at, not faults. A knuckle, a skeg or a bilge stands off one of the two; a wrong figure off both.
 */
export function oddOffsets(sections: readonly OffsetSection[]): readonly OddFigure[] {
  const along = [...sections].sort((a, b) => a.x - b.x);
  const breadth = Math.max(...sections.flatMap(({ points }) => points.map(([halfBreadth]) => halfBreadth)), 0);
  const least = Math.max(leastOff, shareOfBreadth * breadth);
  return along.flatMap((section) =>
    section.points.flatMap(([halfBreadth, z], i) => {
      const bySection = betweenNeighbours(section, i);
      if (bySection === null || Math.abs(halfBreadth - bySection) <= least) return [];
      const expected = onWaterline(along, section, z);
      if (expected === null || Math.abs(halfBreadth - expected) <= least) return [];
      return [{ type: "OddOffset" as const, x: section.x, z, halfBreadth, expected }];
    }),
  );
}

function betweenNeighbours({ points }: OffsetSection, i: number): number | null {
  const [before, at, after] = [points[i - 1], points[i], points[i + 1]];
  if (!before || !at || !after) return null;
  const fraction = after[1] === before[1] ? 0.5 : (at[1] - before[1]) / (after[1] - before[1]);
  return between(before[0], after[0], fraction);
}

function onWaterline(along: readonly OffsetSection[], section: OffsetSection, z: number): number | null {
  const met = along.flatMap((each) => {
    const halfBreadth = each === section ? 0 : halfBreadthAt(each, z);
    return halfBreadth === null ? [] : [{ x: each.x, halfBreadth }];
  });
  const own = met.findIndex(({ x }) => x === section.x);
  const [before, after] = [met[own - 1], met[own + 1]];
  if (!before || !after) return null;
  return between(before.halfBreadth, after.halfBreadth, (section.x - before.x) / (after.x - before.x));
}

/** Half-breadth of a section at a height, by the straight line between its points; null above and below it. */
export function halfBreadthAt({ points }: OffsetSection, z: number): number | null {
  const above = points.findIndex((point, i) => i > 0 && point[1] >= z && (points[i - 1] as readonly [number, number])[1] < z);
  const exact = points.find(([, height]) => height === z);
  if (exact) return exact[0];
  if (above < 0) return null;
  const [y0, z0] = points[above - 1] as readonly [number, number];
  const [y1, z1] = points[above] as readonly [number, number];
  return between(y0, y1, (z - z0) / (z1 - z0));
}
