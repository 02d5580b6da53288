import { polygonMoments } from "@/lib/numerics/polygon";
import { answer, type Result, refuse } from "@/lib/result";
import { type HalfSection, resampledPair } from "./half-section";

/** A section as measured: [half-breadth, z] from the keel to the deck edge. */
export type OffsetSection = { readonly x: number; readonly points: readonly (readonly [number, number])[] };

/** What the moulded surface leaves out: rudder, bilge keel, tunnel; negative where water stands inside it. Taken as wholly under water. */
export type Appendage = { readonly label: string; readonly volume: number; readonly x: number; readonly y: number; readonly z: number };

export type Offsets = {
  readonly sections: readonly OffsetSection[];
  readonly shellFactor?: number;
  readonly appendages?: readonly Appendage[];
};

/** The ruled surface between two neighbouring sections: point joined to point by index. */
export type Strip = {
  readonly xAft: number;
  readonly xForward: number;
  readonly aft: HalfSection;
  readonly forward: HalfSection;
};

export type Hull = {
  readonly strips: readonly Strip[];
  readonly shellFactor: number;
  readonly appendages: readonly Appendage[];
  readonly xAft: number;
  readonly xForward: number;
  /** lowest and highest point of the moulded surface */
  readonly keel: number;
  readonly top: number;
  readonly greatestHalfBreadth: number;
};

export type HullRefusal =
  | { readonly type: "TooFewSections"; readonly got: number; readonly needed: number }
  | { readonly type: "SectionsAtOnePlace"; readonly x: number }
  | { readonly type: "EmptySection"; readonly x: number }
  | { readonly type: "NegativeHalfBreadth"; readonly x: number; readonly halfBreadth: number; readonly z: number }
  | { readonly type: "SectionFromDeckToKeel"; readonly x: number; readonly area: number }
  | { readonly type: "HullWithoutVolume"; readonly sections: number };

/**
 * The hull that a table of offsets describes: symmetric about the centreline, flat at both ends, decked from edge to edge.
 *
 * A section that starts off the centreline gets a flat bottom; points are joined by straight lines; between neighbouring
 * sections the surface is ruled point to point, after both are resampled at the union of their girth fractions where they
 * have different numbers of points. Sections may come in any order. One hull only.
 *
 * Refuses fewer than two sections, two at one x, an empty one, a negative half-breadth, a section that runs from deck to
 * keel, and sections that enclose nothing.
 */
export function hullFromOffsets(offsets: Offsets): Result<Hull, HullRefusal> {
  const sections = [...offsets.sections].sort((a, b) => a.x - b.x);
  const fault = faultOf(sections);
  if (fault) return refuse(fault);
  const closed = sections.map((section) => ({ x: section.x, points: fromCentreline(section.points) }));
  const points = closed.flatMap((section) => section.points);
  const heights = points.map(([, z]) => z);
  return answer({
    strips: closed.slice(1).map((forward, i) => stripBetween(closed[i] as OffsetSection, forward)),
    shellFactor: offsets.shellFactor ?? 1,
    appendages: offsets.appendages ?? [],
    xAft: (closed[0] as OffsetSection).x,
    xForward: (closed.at(-1) as OffsetSection).x,
    keel: Math.min(...heights),
    top: Math.max(...heights),
    greatestHalfBreadth: Math.max(...points.map(([halfBreadth]) => halfBreadth)),
  });
}

function faultOf(sections: readonly OffsetSection[]): HullRefusal | null {
  if (sections.length < 2) return { type: "TooFewSections", got: sections.length, needed: 2 };
  const twice = sections.find((section, i) => section.x === sections[i + 1]?.x);
  if (twice) return { type: "SectionsAtOnePlace", x: twice.x };
  for (const section of sections) {
    const fault = faultOfSection(section);
    if (fault) return fault;
  }
  return sections.every((section) => halfAreaOf(section) === 0) ? { type: "HullWithoutVolume", sections: sections.length } : null;
}

function faultOfSection(section: OffsetSection): HullRefusal | null {
  if (section.points.length === 0) return { type: "EmptySection", x: section.x };
  const inside = section.points.find(([halfBreadth]) => halfBreadth < 0);
  if (inside) return { type: "NegativeHalfBreadth", x: section.x, halfBreadth: inside[0], z: inside[1] };
  const area = halfAreaOf(section);
  return area < 0 ? { type: "SectionFromDeckToKeel", x: section.x, area } : null;
}

function halfAreaOf({ points }: OffsetSection): number {
  const from = fromCentreline(points);
  const deck = (from.at(-1) as readonly [number, number])[1];
  return polygonMoments([...from, [0, deck]]).area;
}

function fromCentreline(points: OffsetSection["points"]): OffsetSection["points"] {
  const [halfBreadth, z] = points[0] as readonly [number, number];
  return halfBreadth > 0 ? [[0, z], ...points] : points;
}

function stripBetween(aft: OffsetSection, forward: OffsetSection): Strip {
  const [aftHalf, forwardHalf] = resampledPair(aft.points, forward.points);
  return { xAft: aft.x, xForward: forward.x, aft: aftHalf, forward: forwardHalf };
}
