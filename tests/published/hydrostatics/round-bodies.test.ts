import { describe, expect, test } from "vitest";
import { hullFromOffsets, type Offsets } from "@/lib/hydrostatics/hull";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { promised } from "@/lib/result";
import { planeAt } from "../../lib/hydrostatics/sample-planes";

/** Source: volumes and centroids of solids of revolution and of the ellipsoid, standard theory, from memory. */

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** The lower half of an ellipsoid of half axes a, b, c with its keel at z = 0, carried up by a wall of the same waterline. */
function halfEllipsoid(a: number, b: number, c: number, dense: number): Offsets {
  const stations = Array.from({ length: 2 * dense + 1 }, (_, k) => a - a * Math.cos((k * Math.PI) / (2 * dense)));
  const sections = stations.map((x) => {
    const share = Math.sqrt(Math.max(0, 1 - ((x - a) / a) ** 2));
    const points = Array.from({ length: dense + 1 }, (_, i): [number, number] => {
      const angle = radians((90 * i) / dense);
      return [b * share * Math.sin(angle), c - c * share * Math.cos(angle)];
    });
    return { x, points: [...points, [b * share, 1.5 * c] as [number, number]] };
  });
  return { sections };
}

/** A cone with its apex down, radius and height 1 : 1, cut by planes across: each section is half a hyperbola. */
function coneApexDown(height: number, dense: number): Offsets {
  const stations = Array.from({ length: 2 * dense + 1 }, (_, k) => height - height * Math.cos((k * Math.PI) / (2 * dense)));
  const sections = stations.map((x) => {
    const off = Math.abs(x - height);
    const points = Array.from({ length: dense + 1 }, (_, i): [number, number] => {
      const z = off + ((height - off) * i) / dense;
      return [Math.sqrt(Math.max(0, z * z - off * off)), z];
    });
    return { x, points };
  });
  return { sections };
}

const at = (offsets: Offsets, draft: number, lbp: number) =>
  promised(hydrostaticsAt(promised(hullFromOffsets(offsets)), planeAt(draft, lbp)));

describe("half an ellipsoid, 40 × 12 × 4 m below its waterline", () => {
  const found = at(halfEllipsoid(20, 6, 4, 120), 4, 40);

  test("volume ⅔·π·a·b·c, its centroid ⅜·c below the waterline", () => {
    expect(found.volume / ((2 / 3) * Math.PI * 20 * 6 * 4)).toBeCloseTo(1, 3);
    expect(found.vcb).toBeCloseTo(4 - (3 / 8) * 4, 3);
  });

  test("waterplane π·a·b, I_T = π·a·b³/4, I_L = π·a³·b/4", () => {
    expect(found.waterplaneArea / (Math.PI * 20 * 6)).toBeCloseTo(1, 3);
    expect(found.inertiaTransverse / ((Math.PI * 20 * 6 ** 3) / 4)).toBeCloseTo(1, 3);
    expect(found.inertiaLongitudinal / ((Math.PI * 20 ** 3 * 6) / 4)).toBeCloseTo(1, 3);
  });

  test("the error of chords falls fourfold when sections and points are twice as dense", () => {
    const exact = (2 / 3) * Math.PI * 20 * 6 * 4;
    const missing = (dense: number) => exact - at(halfEllipsoid(20, 6, 4, dense), 4, 40).volume;
    expect(missing(20) / missing(40)).toBeGreaterThan(3.5);
    expect(missing(20) / missing(40)).toBeLessThan(4.5);
  });
});

describe("a cone with its apex down, at a draft of 6 m of 8", () => {
  const found = at(coneApexDown(8, 160), 6, 16);

  test("volume π·T³/3, its centroid at ¾·T", () => {
    expect(found.volume / ((Math.PI * 6 ** 3) / 3)).toBeCloseTo(1, 2);
    expect(found.vcb).toBeCloseTo(4.5, 2);
  });

  test("BM = ¾·T, so that KM = 1½·T", () => {
    expect(found.bmt).toBeCloseTo(4.5, 1);
    expect(found.kmt / 9).toBeCloseTo(1, 2);
  });
});
