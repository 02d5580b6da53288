import { markRow, type Waterline } from "@/lib/hydrostatics/waterline";
import type { MomentTangentLine } from "@/lib/inclining/inclined-ship";
import { readingsThatCount } from "@/lib/inclining/readings-that-count";
import type { ShipAfloat } from "@/lib/inclining/ship-afloat";
import type { IncliningTestData } from "@/lib/inclining/test-data";
import { type StatedUncertainty, statedUncertainty } from "./stated-uncertainty";

/** Standard uncertainties of the ship as inclined [t, m]. */
export type InclinedUncertainty = Readonly<Record<"displacement" | "gm" | "vcg" | "lcg" | "tcg", number>>;

type Inclining = Omit<IncliningTestData, "uncertainty"> & { readonly uncertainty?: Partial<StatedUncertainty> };

/**
 * How well the ship as inclined is known, in closed form and at once: enough to say which digits deserve to be shown, while
 * the intervals of the lightship are drawn from the whole reduction. T: draft at the centre of flotation, b: slope along, c: tan(heel).
 *
 *     u(Δ)/Δ:  A_w·u(T)/V ⊕ volume ⊕ density,   u(GM)/GM:  line ⊕ Δ ⊕ weights ⊕ places ⊕ lengths
 *     u(KG):  GM without its share of T ⊕ KM ⊕ (½ − BM/T + GM·A_w/V)·u(T)
 *     u(LCG):  (KM_L − KG)·u(b) ⊕ (LCF − LCB)·A_w/V·u(T),   u(TCG):  GM·u(c)
 *
 * u(T), u(b), u(c) follow from the marks' arrangement, sides taken as upright about the waterline. Persons, tanks and items
 * have no part: they are small against these.
 * Source: law of propagation, JCGM 100:2008, 5.1.2 *from memory*.
 */
export function inclinedUncertainty(test: Inclining, afloat: ShipAfloat, line: MomentTangentLine, gmFluid: number): InclinedUncertainty {
  const { hydrostatics, water, waterline } = afloat;
  const { volume, displacement, waterplaneArea, lcf, lcb, vcb, kmt, kml } = hydrostatics;
  const stated = statedUncertainty(test.uncertainty);
  const marks = uncertaintyOfPlane(waterline, lcf, Math.hypot(stated.draft, stated.markZero));
  const sinking = waterplaneArea / volume;
  const constant = Math.hypot(stated.volumeRelative, stated.density / water.density / Math.sqrt(samplesOf(test)));
  const ofLine = Math.hypot(
    line.spread ? line.spread.slopeUncertainty / line.slope : 0,
    ofMoments(test, line, stated),
    ofLengths(test, stated),
  );
  const byDraft = 0.5 - (kmt - vcb) / waterline.draftMidships + gmFluid * sinking;
  return {
    displacement: displacement * Math.hypot(sinking * marks.draft, constant),
    gm: gmFluid * Math.hypot(ofLine, constant, sinking * marks.draft),
    vcg: Math.hypot(gmFluid * Math.hypot(ofLine, constant), stated.kmt, byDraft * marks.draft),
    lcg: Math.hypot((kml - kmt + gmFluid) * marks.slopeAlong, (lcf - lcb) * sinking * marks.draft),
    tcg: gmFluid * marks.tanHeel,
  };
}

function samplesOf(test: Inclining): number {
  return readingsThatCount(test).water.length;
}

function uncertaintyOfPlane({ plane, covariance }: Waterline, x: number, ofMark: number) {
  const [one, along, athwart] = markRow(plane.lbp, x, 0);
  const row = [one, along, athwart, meanOfSag];
  const variance = row.reduce(
    (sum, left, i) => sum + row.reduce((inner, right, j) => inner + left * right * (covariance[i]?.[j] ?? 0), 0),
    0,
  );
  const own = (i: number) => ofMark * Math.sqrt(covariance[i]?.[i] ?? 0);
  return { draft: ofMark * Math.sqrt(variance), slopeAlong: own(1), tanHeel: own(2) };
}

/** Of a parabola of sag, what a waterplane of one breadth feels: exact for a rectangle. */
const meanOfSag = 2 / 3;

/** Relative: each weight and each of its places has an error of its own. */
function ofMoments({ weights }: Inclining, { moves }: MomentTangentLine, { weightRelative, distance }: StatedUncertainty): number {
  const mass = weights.reduce((sum, weight) => sum + weight.mass, 0);
  const reach = Math.max(0, ...moves.map(({ moment }) => Math.abs(moment))) / mass;
  if (!(reach > 0)) return 0;
  return Math.hypot(weightRelative, distance / reach) / Math.sqrt(weights.length);
}

function ofLengths({ stations }: Inclining, { length }: StatedUncertainty): number {
  const relative = stations.flatMap((station) => {
    if (station.instrument === "inclinometer") return [];
    return [length / (station.instrument === "pendulum" ? station.length : station.span)];
  });
  return Math.hypot(...relative) / Math.max(1, stations.length);
}
