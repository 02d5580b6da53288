export type Point = readonly [number, number];

/** Area and moments of a closed polygon about the axes through the origin; counter-clockwise is positive. */
export type PolygonMoments = {
  readonly area: number;
  /** ∫u dA and ∫v dA */
  readonly first: Point;
  /** ∫u² dA and ∫v² dA */
  readonly second: Point;
};

/**
 * Area, first and second moments of a closed polygon, the last point joined to the first.
 *
 *     A = ½Σk,  ∫u = ⅙Σ(u₀+u₁)k,  ∫u² = ¹⁄₁₂Σ(u₀²+u₀u₁+u₁²)k   with k = u₀v₁ − u₁v₀ on each edge
 *
 * Holds for any simple polygon; fewer than three points enclose nothing.
 *
 * Source: Green's theorem.
 */
export function polygonMoments(points: readonly Point[]): PolygonMoments {
  let [area, u, v, uu, vv] = [0, 0, 0, 0, 0];
  points.forEach(([u0, v0], i) => {
    const [u1, v1] = points[(i + 1) % points.length] as Point;
    const k = u0 * v1 - u1 * v0;
    area += k / 2;
    u += ((u0 + u1) * k) / 6;
    v += ((v0 + v1) * k) / 6;
    uu += ((u0 * u0 + u0 * u1 + u1 * u1) * k) / 12;
    vv += ((v0 * v0 + v0 * v1 + v1 * v1) * k) / 12;
  });
  return { area, first: [u, v], second: [uu, vv] };
}

/** Centroid of a polygon that encloses an area; null where it encloses none. */
export function polygonCentroid(points: readonly Point[]): Point | null {
  const { area, first } = polygonMoments(points);
  return area === 0 ? null : [first[0] / area, first[1] / area];
}

/**
 * The part of a polygon that lies below the line v = height + slope·u.
 * Parts of a hollow polygon stay joined along the line; area and moments are right all the same.
 *
 * Source: Sutherland & Hodgman, Reentrant polygon clipping, Comm. ACM 17 (1974) 32–42 (from memory).
 */
export function polygonBelowLine(points: readonly Point[], height: number, slope: number): Point[] {
  const above = ([u, v]: Point) => v - height - slope * u;
  return points.flatMap((p, i) => {
    const q = points[(i + 1) % points.length] as Point;
    const [atP, atQ] = [above(p), above(q)];
    const kept = atP < 0 ? [p] : [];
    return atP < 0 === atQ < 0 ? kept : [...kept, along(p, q, atP / (atP - atQ))];
  });
}

function along(p: Point, q: Point, fraction: number): Point {
  return [p[0] + fraction * (q[0] - p[0]), p[1] + fraction * (q[1] - p[1])];
}
