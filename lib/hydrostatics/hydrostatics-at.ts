import { type Waterplane, waterplaneHeight } from "@/lib/frame";
import { between } from "@/lib/numerics/interpolation";
import { answer, type Result, refuse } from "@/lib/result";
import { breaksOf } from "./half-body";
import type { Hull } from "./hull";
import { type ImmersedBody, immersedBody } from "./immersed-body";

/** Volume and centres under one waterplane; metres in the ship's frame, waterplane projected on the base plane. */
export type Hydrostatics = {
  readonly volume: number;
  readonly lcb: number;
  readonly tcb: number;
  /** height of the centre of buoyancy above the baseline, z_B */
  readonly vcb: number;
  readonly waterplaneArea: number;
  readonly lcf: number;
  readonly tcf: number;
  /** second moments about the waterplane's own centroid [m⁴] */
  readonly inertiaTransverse: number;
  readonly inertiaLongitudinal: number;
  readonly inertiaProduct: number;
  readonly bmt: number;
  readonly bml: number;
  /** local metacentres at this very waterplane */
  readonly kmt: number;
  readonly kml: number;
  /** water stands above the deck edge somewhere */
  readonly deckEdgeImmersed: boolean;
};

export type AfloatRefusal =
  | { readonly type: "NoWaterInHull"; readonly keel: number; readonly draftAtAp: number; readonly slopeAlong: number }
  | { readonly type: "HullUnderWater"; readonly top: number; readonly draftAtAp: number; readonly slopeAlong: number };

/**
 * Hydrostatics of a hull under any waterplane: trim, heel and sag as they are; nothing is assumed about wall sides.
 *
 *     BM_T = I_T/V,  KM_T = z_B + BM_T·(1 + c²)   c = tan(heel)
 *     BM_L = I_L/V,  KM_L = z_B + BM_L·(1 + b²)   b = −trim/L
 *
 * Shell factor and appendages are in it as `immersedBody` says.
 * Mirrored heel gives mirrored results to the last digit. Relative error of the ruled surface's integrals about 1e-10.
 * Refuses a hull that the water does not reach, and one wholly below it.
 *
 * Source: buoyancy's moments under an inclined plane, common practice; KM at a heel from dy_B/dc = BM and dz_B/dc = c·BM.
 */
export function hydrostaticsAt(hull: Hull, plane: Waterplane): Result<Hydrostatics, AfloatRefusal> {
  const body = immersedBody(hull, plane);
  const { draftAtAp, slopeAlong } = plane;
  if (!(body.volume > 0)) return refuse({ type: "NoWaterInHull", keel: hull.keel, draftAtAp, slopeAlong });
  if (!(body.area > 0)) return refuse({ type: "HullUnderWater", top: hull.top, draftAtAp, slopeAlong });
  return answer({ ...centresOf(body, plane), deckEdgeImmersed: isDeckEdgeImmersed(hull, plane) });
}

function centresOf(body: ImmersedBody, plane: Waterplane): Omit<Hydrostatics, "deckEdgeImmersed"> {
  const vcb = body.momentZ / body.volume;
  const lcf = body.areaX / body.area;
  const tcf = body.areaY / body.area;
  const inertiaTransverse = body.areaYY - body.area * tcf * tcf;
  const inertiaLongitudinal = body.areaXX - body.area * lcf * lcf;
  const bmt = inertiaTransverse / body.volume;
  const bml = inertiaLongitudinal / body.volume;
  return {
    volume: body.volume,
    lcb: body.momentX / body.volume,
    tcb: body.momentY / body.volume,
    vcb,
    waterplaneArea: body.area,
    lcf,
    tcf,
    inertiaTransverse,
    inertiaLongitudinal,
    inertiaProduct: body.areaXY - body.area * lcf * tcf,
    bmt,
    bml,
    kmt: vcb + bmt * (1 + plane.tanHeel ** 2),
    kml: vcb + bml * (1 + plane.slopeAlong ** 2),
  };
}

// a section that closes on the centreline has no deck edge
function isDeckEdgeImmersed(hull: Hull, plane: Waterplane): boolean {
  return hull.strips.some((strip) => {
    const edge = strip.aft.heights.length - 2;
    const breaks = breaksOf(strip, plane, Math.abs(plane.tanHeel));
    return breaks.slice(1).some((t, i) => {
      const middle = (t + (breaks[i] as number)) / 2;
      const halfBreadth = between(strip.aft.halfBreadths[edge] as number, strip.forward.halfBreadths[edge] as number, middle);
      const height = between(strip.aft.heights[edge] as number, strip.forward.heights[edge] as number, middle);
      const x = strip.xAft + middle * (strip.xForward - strip.xAft);
      return halfBreadth > 0 && height < waterplaneHeight({ ...plane, tanHeel: Math.abs(plane.tanHeel) }, x, halfBreadth);
    });
  });
}
