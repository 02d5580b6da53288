import { describe, expect, it } from "vitest";
import { atDisplacementAndHeel } from "@/lib/hydrostatics/equilibrium";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { promised } from "@/lib/result";
import { boxOffsets, hullOf } from "../../lib/hydrostatics/sample-hulls";
import { planeAt } from "../../lib/hydrostatics/sample-planes";

const radians = (degrees: number) => (degrees * Math.PI) / 180;

describe("box barges of the textbooks", () => {
  /** Source: Nicholls's Seamanship and Nautical Knowledge, p. 536, archive.org/download/NichollssSeamanshipAndNauticalKnowledge; feet. */
  it("200 × 40 ft at 10 ft has its metacentre at 18.33 ft", () => {
    const found = promised(hydrostaticsAt(hullOf(boxOffsets(200, 40, 18)), planeAt(10, 200)));
    expect(Math.abs(found.kmt - 18.33)).toBeLessThan(0.005);
  });

  /** Source: Nicholls's Seamanship and Nautical Knowledge, p. 527; feet. */
  it("36 ft broad at 18 ft has BM 6 ft and KM 15 ft", () => {
    const found = promised(hydrostaticsAt(hullOf(boxOffsets(150, 36, 24)), planeAt(18, 150)));
    expect(found.bmt).toBeCloseTo(6, 9);
    expect(found.kmt).toBeCloseTo(15, 9);
  });

  /** Source: Derrett, Ship Stability for Masters and Mates, 5th ed., p. 111: least KM at a draft of B/√6; beam 10 m inferred from 4.08·√6. */
  it("10 m broad has its least KM, 4.08 m, at a draft of 4.08 m", () => {
    const hull = hullOf(boxOffsets(60, 10, 8));
    const kmtAt = (draft: number) => promised(hydrostaticsAt(hull, planeAt(draft, 60))).kmt;
    const least = 10 / Math.sqrt(6);
    expect(Math.abs(kmtAt(least) - 4.08)).toBeLessThan(0.005);
    expect(kmtAt(least)).toBeCloseTo(least, 12);
    expect(kmtAt(least - 0.1)).toBeGreaterThan(kmtAt(least));
    expect(kmtAt(least + 0.1)).toBeGreaterThan(kmtAt(least));
    expect(Math.abs(promised(hydrostaticsAt(hull, planeAt(3.5, 60))).bmt - 2.38)).toBeLessThan(0.005);
  });
});

describe("righting levers of wall-sided ships", () => {
  /** Source: wall-sided formula GZ = (GM + ½·BM·tan²φ)·sin φ, standard theory (from memory). */
  it("box 12 m broad at 4 m, KG 4 m, heeled 10°", () => {
    expect(rightingLever({ breadth: 12, draft: 4, vcg: 4, degrees: 10 })).toBeCloseTo(0.18174657407379435, 9);
  });

  /**
   * Source: Derrett, Ship Stability for Masters and Mates, 5th ed., p. 130: KB 3, KM 6, KG 5.5 m, heeled 25°. The book prints
   * GZ 0.35 m and a moment of 2100 t·m from it; the exact values are 0.349152 m and 2094.9 t·m.
   */
  it("KB 3 m and KM 6 m, KG 5.5 m, heeled 25°: the exact lever, not the rounded one", () => {
    const lever = rightingLever({ breadth: Math.sqrt(3 * 12 * 6), draft: 6, vcg: 5.5, degrees: 25 });
    expect(lever).toBeCloseTo(0.349152098436, 9);
    expect(6000 * lever).toBeCloseTo(2094.91259062, 5);
  });
});

function rightingLever(ship: { breadth: number; draft: number; vcg: number; degrees: number }): number {
  const length = 60;
  const tanHeel = Math.tan(radians(ship.degrees));
  const hull = hullOf(boxOffsets(length, ship.breadth, 3 * ship.draft));
  const volume = length * ship.breadth * ship.draft;
  const { hydrostatics } = promised(atDisplacementAndHeel(hull, { volume, tanHeel, lcg: length / 2, vcg: ship.vcg, lbp: length }));
  return (hydrostatics.tcb + tanHeel * (hydrostatics.vcb - ship.vcg)) * Math.cos(radians(ship.degrees));
}
