import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { atDisplacementAndHeel, equilibrium } from "@/lib/hydrostatics/equilibrium";
import { promised } from "@/lib/result";
import { boxOffsets, hullOf, workboat } from "./sample-hulls";

const box = hullOf(boxOffsets(60, 12, 5));
const boat = hullOf(workboat);

describe("equilibrium", () => {
  it("lays a box on the list that its wall-sided formula gives", () => {
    // (GM + ½·BM·c²)·c = TCG on a wall-sided ship: BM = 6, KB = 1, KG = 4, c = 0.03
    const c = 0.03;
    const tcg = c * (1 + 6 - 4 + 3 * c * c);
    const { plane, hydrostatics } = promised(equilibrium(box, { displacement: 1440, lcg: 30, tcg, vcg: 4 }, { density: 1, lbp: 60 }));
    expect(plane.tanHeel).toBeCloseTo(c, 12);
    expect(plane.slopeAlong).toBeCloseTo(0, 12);
    expect(hydrostatics.volume).toBeCloseTo(1440, 8);
  });

  it("lays a box on the trim of the same formula along the ship", () => {
    const b = -0.012;
    const lcg = 30 + b * (1 + 150 - 4 + 75 * b * b);
    const { plane } = promised(equilibrium(box, { displacement: 1440, lcg, tcg: 0, vcg: 4 }, { density: 1, lbp: 60 }));
    expect(plane.slopeAlong).toBeCloseTo(b, 12);
    expect(plane.draftAtAp).toBeCloseTo(2 + 0.36, 10);
  });

  it("puts G on the line of buoyancy of any hull", () => {
    const weight = fc.record({
      displacement: fc.double({ min: 200, max: 330, noNaN: true }),
      lcg: fc.double({ min: 12, max: 14.5, noNaN: true }),
      tcg: fc.double({ min: -0.15, max: 0.15, noNaN: true }),
      vcg: fc.double({ min: 1.5, max: 2.6, noNaN: true }),
    });
    fc.assert(
      fc.property(weight, fc.double({ min: -0.03, max: 0.03, noNaN: true }), (ship, sag) => {
        const { plane, hydrostatics } = promised(equilibrium(boat, ship, { density: 1.025, lbp: 28, sag }));
        const height = ship.vcg - hydrostatics.vcb;
        expect(hydrostatics.volume).toBeCloseTo(ship.displacement / 1.025, 6);
        expect(hydrostatics.lcb).toBeCloseTo(ship.lcg + plane.slopeAlong * height, 8);
        expect(hydrostatics.tcb).toBeCloseTo(ship.tcg + plane.tanHeel * height, 8);
      }),
      { numRuns: 40 },
    );
  });

  it("finds the same rest from a guess", () => {
    const ship = { displacement: 260, lcg: 13, tcg: 0.08, vcg: 2.2 };
    const found = promised(equilibrium(boat, ship, { density: 1.025, lbp: 28 }));
    for (const guess of [found.plane, { ...found.plane, draftAtAp: -9 }]) {
      const again = promised(equilibrium(boat, ship, { density: 1.025, lbp: 28, guess }));
      expect(again.plane.tanHeel).toBeCloseTo(found.plane.tanHeel, 10);
      expect(again.plane.draftAtAp).toBeCloseTo(found.plane.draftAtAp, 10);
    }
  });

  it("refuses to call a top-heavy ship at rest", () => {
    const refused = equilibrium(box, { displacement: 1440, lcg: 30, tcg: 0, vcg: 7.5 }, { density: 1, lbp: 60 });
    expect(refused).toMatchObject({ ok: false, refusal: { type: "UnstableAtRest", gmTransverse: expect.closeTo(-0.5, 9), tanHeel: 0 } });
  });

  it("refuses more weight than the hull carries, with what it can", () => {
    const refused = equilibrium(box, { displacement: 4000, lcg: 30, tcg: 0, vcg: 4 }, { density: 1, lbp: 60 });
    expect(refused).toMatchObject({ ok: false, refusal: { type: "VolumeOutOfReach", volume: 4000, largest: expect.closeTo(3600, 8) } });
  });

  it("refuses a centre that no waterplane balances, with what is left over", () => {
    const refused = equilibrium(box, { displacement: 1440, lcg: 80, tcg: 0, vcg: 4 }, { density: 1, lbp: 60 });
    expect(refused).toMatchObject({ ok: false, refusal: { type: "NoBalance" } });
  });
});

describe("held at a heel", () => {
  it("keeps volume and heel, and frees the trim", () => {
    const held = { volume: 250, tanHeel: 0.06, lcg: 13.2, vcg: 2.1, lbp: 28 };
    const { plane, hydrostatics } = promised(atDisplacementAndHeel(boat, held));
    expect(plane.tanHeel).toBe(0.06);
    expect(hydrostatics.volume).toBeCloseTo(250, 8);
    expect(hydrostatics.lcb).toBeCloseTo(13.2 + plane.slopeAlong * (2.1 - hydrostatics.vcb), 9);
  });

  it("is the rest of a ship whose centre lies on that line of buoyancy", () => {
    const held = { volume: 250, tanHeel: 0.06, lcg: 13.2, vcg: 2.1, lbp: 28 };
    const { plane, hydrostatics } = promised(atDisplacementAndHeel(boat, held));
    const tcg = hydrostatics.tcb + 0.06 * (hydrostatics.vcb - 2.1);
    const rest = promised(equilibrium(boat, { displacement: 250, lcg: 13.2, tcg, vcg: 2.1 }, { density: 1, lbp: 28 }));
    expect(rest.plane.tanHeel).toBeCloseTo(0.06, 10);
    expect(rest.plane.slopeAlong).toBeCloseTo(plane.slopeAlong, 10);
  });

  it("mirrors", () => {
    const held = { volume: 250, lcg: 13.2, vcg: 2.1, lbp: 28 };
    const starboard = promised(atDisplacementAndHeel(boat, { ...held, tanHeel: 0.06 }));
    const port = promised(atDisplacementAndHeel(boat, { ...held, tanHeel: -0.06 }));
    expect(port.plane).toEqual({ ...starboard.plane, tanHeel: -0.06 });
    expect(port.hydrostatics.tcb + starboard.hydrostatics.tcb).toBe(0);
  });
});
