import { type Hull, hullFromOffsets, type OffsetSection, type Offsets } from "@/lib/hydrostatics/hull";
import { promised } from "@/lib/result";

type Point = readonly [number, number];

/** A barge with flat bottom and upright sides. */
export function boxOffsets(length: number, breadth: number, depth: number): Offsets {
  const points: readonly Point[] = [
    [breadth / 2, 0],
    [breadth / 2, depth],
  ];
  return prismOffsets(length, points);
}

/** One section all along. */
export function prismOffsets(length: number, points: readonly Point[]): Offsets {
  return {
    sections: [
      { x: 0, points },
      { x: length, points },
    ],
  };
}

/** Half a circular cylinder below its axis at height R, upright sides above. */
export function halfCylinderOffsets(length: number, radius: number, depth: number, points: number): Offsets {
  const arc = Array.from({ length: points + 1 }, (_, i): Point => {
    const angle = (i * Math.PI) / (2 * points);
    return [radius * Math.sin(angle), radius * (1 - Math.cos(angle))];
  });
  return prismOffsets(length, [...arc, [radius, depth]]);
}

/** Wigley's hull y = ½B(1−ξ²)(1−ζ²), its sides carried straight up above the design draft. */
export function wigleyOffsets(length: number, breadth: number, draft: number, depth: number, sections: number, points: number): Offsets {
  return {
    sections: Array.from({ length: sections + 1 }, (_, i): OffsetSection => {
      const along = (2 * i) / sections - 1;
      const heights = [...Array.from({ length: points + 1 }, (__, j) => (draft * j) / points), depth];
      return { x: (length * i) / sections, points: heights.map((z): Point => [wigleyHalfBreadth(along, 1 - z / draft, breadth), z]) };
    }),
  };
}

/** A small vessel in six sections of different shape: flat bottom, knuckle, flare, a raked stem. */
export const workboat: Offsets = {
  sections: [
    {
      x: -1,
      points: [
        [2.2, 1.1],
        [2.9, 1.6],
        [3.1, 4],
      ],
    },
    {
      x: 4,
      points: [
        [0, 0.2],
        [2, 0.5],
        [3.4, 1.5],
        [3.6, 4],
      ],
    },
    {
      x: 12,
      points: [
        [1.5, 0],
        [3.3, 0.4],
        [3.8, 1.4],
        [3.9, 4.1],
      ],
    },
    {
      x: 20,
      points: [
        [1, 0],
        [2.6, 0.6],
        [3.5, 1.9],
        [3.8, 4.4],
      ],
    },
    {
      x: 27,
      points: [
        [0, 0],
        [0.9, 1],
        [1.6, 2],
        [2.9, 4.9],
      ],
    },
    {
      x: 30,
      points: [
        [0, 2.2],
        [0.3, 5.2],
      ],
    },
  ],
};

export function hullOf(offsets: Offsets): Hull {
  return promised(hullFromOffsets(offsets));
}

/** The same ship written in another unit of length. */
export function scaledOffsets(offsets: Offsets, factor: number): Offsets {
  return {
    ...offsets,
    sections: offsets.sections.map(({ x, points }) => ({ x: x * factor, points: points.map(([y, z]): Point => [y * factor, z * factor]) })),
  };
}

function wigleyHalfBreadth(along: number, down: number, breadth: number): number {
  return (breadth / 2) * (1 - along ** 2) * (1 - Math.max(0, down) ** 2);
}
