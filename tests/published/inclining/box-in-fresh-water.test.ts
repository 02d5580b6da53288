import { expect, it } from "vitest";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { classicalTerm } from "@/lib/inclining/classical-relation";
import { promised } from "@/lib/result";

/** Source: Derrett, Ship Stability for Masters and Mates, exercise 7 of the chapter on the inclining experiment; from memory. */
it("box of 60 × 10 × 3 m at 2 m in fresh water, 15 t over 6 m, 0.2 m on 6 m: vcg 2.92 m", () => {
  const points: [number, number][] = [
    [5, 0],
    [5, 3],
  ];
  const hull = promised(
    hullFromOffsets({
      sections: [
        { x: 0, points },
        { x: 60, points },
      ],
    }),
  );
  const afloat = promised(hydrostaticsAt(hull, { draftAtAp: 2, slopeAlong: 0, tanHeel: 0, sag: 0, lbp: 60 }));
  const shift = { displacement: afloat.volume, weight: 15, distance: 6, deflection: 0.2, length: 6 };
  const vcg = afloat.kmt - promised(classicalTerm("gmFluid", shift));
  // printed to the centimetre
  expect(Math.abs(vcg - 2.92)).toBeLessThanOrEqual(0.005);
});
