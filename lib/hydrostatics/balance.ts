import type { Waterplane } from "@/lib/frame";
import { leastSquares } from "@/lib/numerics/least-squares";
import { answer, type Result, refuse } from "@/lib/result";
import type { Hull } from "./hull";
import { type ImmersedBody, immersedBody } from "./immersed-body";

/** What has to balance: a volume, a centre of gravity, and the heel where it is free. */
export type Balance = {
  readonly volume: number;
  readonly lcg: number;
  readonly tcg: number;
  readonly vcg: number;
  readonly heelIsFree: boolean;
};

/** The search stopped this far [m] from balance. */
export type NoBalance = { readonly type: "NoBalance"; readonly draftGap: number; readonly trimArm: number; readonly heelArm: number };

/** Missing sinkage, trimming arm and heeling arm [m]. */
type Gaps = readonly [number, number, number];

/**
 * The waterplane near a first one at which volume, trimming and heeling moments balance.
 *
 * Newton's method: a change of the waterplane by (da, db, dc) changes volume and moments by the waterplane's own area, first
 * and second moments. Steps are halved until the gaps shrink. Refuses gaps that do not close to a nanometre.
 */
export function balanced(hull: Hull, balance: Balance, first: Waterplane): Result<Waterplane, NoBalance> {
  let plane = first;
  let body = immersedBody(hull, plane);
  let gaps = gapsOf(body, plane, balance);
  for (let step = 0; step < 60 && sizeOf(gaps) > closed; step++) {
    const change = newtonChange(body, plane, balance);
    const nearer = change && nearerPlane(hull, balance, plane, change, sizeOf(gaps));
    if (!nearer) break;
    ({ plane, body, gaps } = nearer);
  }
  const [draftGap, trimArm, heelArm] = gaps;
  return sizeOf(gaps) <= tolerated ? answer(plane) : refuse({ type: "NoBalance", draftGap, trimArm, heelArm });
}

/** Where the search ends, and what it may leave where rounding forbids that [m]. */
const closed = 1e-12;
const tolerated = 1e-9;

function gapsOf(body: ImmersedBody, plane: Waterplane, { volume, lcg, tcg, vcg, heelIsFree }: Balance): Gaps {
  const { slopeAlong: b, tanHeel: c } = plane;
  if (!(body.volume > 0 && body.area > 0)) return [Infinity, Infinity, Infinity];
  const zB = body.momentZ / body.volume;
  const trimArm = body.momentX / body.volume + b * zB - lcg - b * vcg;
  const heelArm = body.momentY / body.volume + c * zB - tcg - c * vcg;
  return [(body.volume - volume) / body.area, trimArm, heelIsFree ? heelArm : 0];
}

function sizeOf(gaps: Gaps): number {
  return Math.hypot(...gaps);
}

// derivatives of volume and of the two moments about G, by the waterplane under the change
function newtonChange(body: ImmersedBody, plane: Waterplane, balance: Balance): readonly number[] | null {
  const { draftAtAp, slopeAlong: b, tanHeel: c, sag } = plane;
  const [gX, gY] = [balance.lcg + b * balance.vcg, balance.tcg + c * balance.vcg];
  const dV = [body.area, body.areaX, body.areaY];
  const dMx = [body.areaX, body.areaXX, body.areaXY];
  const dMy = [body.areaY, body.areaXY, body.areaYY];
  const dMz = dV.map((v, i) => (draftAtAp + sag) * v + b * (dMx[i] as number) + c * (dMy[i] as number));
  const lift = body.momentZ - body.volume * balance.vcg;
  const trimRow = dMx.map((v, i) => v + b * (dMz[i] as number) - gX * (dV[i] as number) + (i === 1 ? lift : 0));
  const heelRow = dMy.map((v, i) => v + c * (dMz[i] as number) - gY * (dV[i] as number) + (i === 2 ? lift : 0));
  const gap = [
    balance.volume - body.volume,
    gX * body.volume - body.momentX - b * body.momentZ,
    gY * body.volume - body.momentY - c * body.momentZ,
  ];
  const free = balance.heelIsFree ? 3 : 2;
  const solved = leastSquares(
    [dV, trimRow, heelRow].slice(0, free).map((row) => row.slice(0, free)),
    gap.slice(0, free),
  );
  return solved.ok ? solved.value.coefficients : null;
}

type Found = { readonly plane: Waterplane; readonly body: ImmersedBody; readonly gaps: Gaps };

function nearerPlane(hull: Hull, balance: Balance, from: Waterplane, change: readonly number[], size: number): Found | null {
  const [da = 0, db = 0, dc = 0] = change;
  for (let share = 1; share > 1e-4; share /= 2) {
    const plane = {
      ...from,
      draftAtAp: from.draftAtAp + share * da,
      slopeAlong: from.slopeAlong + share * db,
      tanHeel: from.tanHeel + share * dc,
    };
    const body = immersedBody(hull, plane);
    const gaps = gapsOf(body, plane, balance);
    if (sizeOf(gaps) < size) return { plane, body, gaps };
  }
  return null;
}
