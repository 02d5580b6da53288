import { type Compared, type Finding, metOrNot } from "@/lib/inclining/checks/finding";
import type { Lightship } from "./lightship";

/** The lightship of an earlier test of the same ship, or of a sister. */
export type PreviousShip = {
  readonly kind: "earlier" | "sister";
  readonly displacement: number;
  readonly vcg: number;
  readonly lcg: number;
};

/**
 * How far a lightship deviates from an earlier test's or a sister's.
 *
 *     earlier: displacement 2 %, LCG 1 % of L
 *     sister: displacement 2 % for L ≤ 50 m, 1 % for L ≥ 160 m, linear between; LCG 0.5 % of L
 *     VCG 1 %
 *
 * L: length between perpendiculars [m]. Beyond these a ship is to be inclined again, or may not go by her sister's test.
 * Source: SOLAS II-1/5.5 with the explanatory notes to 5.4; sister ships MSC/Circ.1158.
 */
export function comparedWithPrevious(lightship: Lightship, previous: PreviousShip, lbp: number): readonly Finding[] {
  const { kind } = previous;
  const displacement = (lightship.displacement - previous.displacement) / previous.displacement;
  const lcg = (lightship.lcg - previous.lcg) / lbp;
  const vcg = (lightship.vcg - previous.vcg) / Math.abs(previous.vcg);
  const ofDisplacement = kind === "earlier" ? 0.02 : sisterDisplacementLimit(lbp);
  return [
    compared("previous-displacement", { kind, deviation: displacement, other: previous.displacement }, ofDisplacement),
    compared("previous-lcg", { kind, deviation: lcg, other: previous.lcg }, kind === "earlier" ? 0.01 : 0.005),
    ...(previous.vcg === 0 ? [] : [compared("previous-vcg", { kind, deviation: vcg, other: previous.vcg }, 0.01)]),
  ];
}

/** How far a sister's displacement may deviate, as a share: 2 % to 50 m, 1 % from 160 m, linear between. See `comparedWithPrevious`. */
export function sisterDisplacementLimit(lbp: number): number {
  const along = Math.min(1, Math.max(0, (lbp - 50) / 110));
  return 0.02 - 0.01 * along;
}

function compared(id: "previous-displacement" | "previous-lcg" | "previous-vcg", found: Compared["found"], share: number): Finding {
  // a deviation of exactly the limit must not fail by rounding
  const isMet = Math.abs(found.deviation) <= share + 1e-12;
  return { id, verdict: metOrNot(isMet), found, limit: { share } };
}
