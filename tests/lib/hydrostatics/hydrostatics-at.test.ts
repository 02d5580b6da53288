import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Waterplane } from "@/lib/frame";
import type { Hull, Offsets } from "@/lib/hydrostatics/hull";
import { type Hydrostatics, hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { promised } from "@/lib/result";
import { boxOffsets, hullOf, scaledOffsets, wigleyOffsets, workboat } from "./sample-hulls";
import { planeAt, workboatPlanes } from "./sample-planes";

const box = hullOf(boxOffsets(60, 12, 5));
const boat = hullOf(workboat);

describe("hydrostatics under a waterplane", () => {
  it("are the closed forms of a box with trim and list", () => {
    const [b, c] = [-0.01, 0.02];
    const found = at(box, planeAt(2.3, 60, { slopeAlong: b, tanHeel: c }));
    // prismatic: 1e-9 and better; V = LBT, x_B = L/2 + bL²/12T, y_B = cB²/12T, z_B = T/2 + (b²L² + c²B²)/24T, T = 2 amidships
    expect(found.volume).toBeCloseTo(1440, 10);
    expect(found.lcb).toBeCloseTo(30 + (b * 3600) / 24, 12);
    expect(found.tcb).toBeCloseTo((c * 144) / 24, 13);
    expect(found.vcb).toBeCloseTo(1 + (b * b * 3600 + c * c * 144) / 48, 13);
    expect(found.waterplaneArea).toBeCloseTo(720, 11);
    expect(found.bmt).toBeCloseTo(6, 12);
    expect(found.bml).toBeCloseTo(150, 10);
    expect(found.kmt).toBeCloseTo(found.vcb + 6 * (1 + c * c), 12);
    expect(found.kml).toBeCloseTo(found.vcb + 150 * (1 + b * b), 10);
    expect([found.lcf, found.tcf, found.deckEdgeImmersed]).toEqual([expect.closeTo(30, 12), expect.closeTo(0, 13), false]);
  });

  it("take sag as two thirds of itself on a box", () => {
    const found = at(box, planeAt(2, 60, { sag: 0.06 }));
    expect(found.volume).toBeCloseTo(720 * 2.04, 10);
    // KB is half the mean square of the draft over its mean: mean of (2 + 0.06·4u(1−u))² = 4 + 0.16 + 0.0036·8/15
    expect(found.vcb).toBeCloseTo((4 + 0.16 + (0.0036 * 8) / 15) / (2 * 2.04), 12);
  });

  it("mirror to the last digit", () => {
    fc.assert(
      fc.property(workboatPlanes, (plane) => {
        const here = at(boat, plane);
        const mirrored = at(boat, { ...plane, tanHeel: -plane.tanHeel });
        expect(mirrored).toEqual({
          ...here,
          tcb: opposite(here.tcb),
          tcf: opposite(here.tcf),
          inertiaProduct: opposite(here.inertiaProduct),
        });
      }),
    );
  });

  it("scale with the ship", () => {
    fc.assert(
      fc.property(workboatPlanes, (plane) => {
        const here = at(boat, plane);
        const double = at(hullOf(scaledOffsets(workboat, 2)), { ...plane, draftAtAp: 2 * plane.draftAtAp, sag: 2 * plane.sag, lbp: 56 });
        // a power of two scales without rounding
        expect(double.volume).toBe(8 * here.volume);
        expect(double.kmt).toBe(2 * here.kmt);
        expect(double.inertiaTransverse).toBe(16 * here.inertiaTransverse);
      }),
    );
  });

  it("do not change when a section is written in between", () => {
    const denser = hullOf(withSectionsBetween(wigleyOffsets(100, 10, 6.25, 9, 12, 8)));
    const hull = hullOf(wigleyOffsets(100, 10, 6.25, 9, 12, 8));
    fc.assert(
      fc.property(
        fc.double({ min: -0.02, max: 0.02, noNaN: true }),
        fc.double({ min: -0.15, max: 0.15, noNaN: true }),
        (slopeAlong, tanHeel) => {
          const plane = planeAt(6, 100, { slopeAlong, tanHeel });
          const [one, other] = [at(hull, plane), at(denser, plane)];
          // each strip is integrated to about 1e-10
          expect(other.volume / one.volume).toBeCloseTo(1, 9);
          expect(other.kmt / one.kmt).toBeCloseTo(1, 9);
          expect(other.lcf / one.lcf).toBeCloseTo(1, 9);
        },
      ),
      { numRuns: 30 },
    );
  });

  it("grow with draft and heel as the waterplane says", () => {
    const step = 1e-4;
    fc.assert(
      fc.property(workboatPlanes, (plane) => {
        const here = at(boat, plane);
        const [up, down] = [
          at(boat, { ...plane, draftAtAp: plane.draftAtAp + step }),
          at(boat, { ...plane, draftAtAp: plane.draftAtAp - step }),
        ];
        const [more, less] = [at(boat, { ...plane, tanHeel: plane.tanHeel + step }), at(boat, { ...plane, tanHeel: plane.tanHeel - step })];
        const secondMoment = here.inertiaTransverse + here.waterplaneArea * here.tcf ** 2;
        // a corner of the section within the step bends the curve: differences are good to about a hundredth of the step
        expect((up.volume - down.volume) / (2 * step) / here.waterplaneArea).toBeCloseTo(1, 4);
        expect((more.volume * more.tcb - less.volume * less.tcb) / (2 * step) / secondMoment).toBeCloseTo(1, 3);
      }),
    );
  });

  it("report an immersed deck edge, also between sections and on either side", () => {
    const plane = planeAt(4.5, 60);
    expect(at(box, { ...plane, tanHeel: 0.08 }).deckEdgeImmersed).toBe(false);
    expect(at(box, { ...plane, tanHeel: 0.09 }).deckEdgeImmersed).toBe(true);
    expect(at(box, { ...plane, tanHeel: -0.09 }).deckEdgeImmersed).toBe(true);
    expect(at(box, { ...plane, sag: 0.6 }).deckEdgeImmersed).toBe(true);
  });

  it("do not take a bulb that closes under water for a deck", () => {
    const bulb = {
      x: 64,
      points: [
        [0, 0.5],
        [0.8, 1],
        [0, 1.5],
      ] as const,
    };
    const hull = hullOf({
      sections: [
        {
          x: 0,
          points: [
            [0, 0],
            [6, 0],
            [6, 5],
          ],
        },
        {
          x: 60,
          points: [
            [0, 0],
            [2, 0],
            [0, 5],
          ],
        },
        bulb,
      ],
    });
    expect(at(hull, planeAt(2, 60)).deckEdgeImmersed).toBe(false);
  });

  it("refuse a hull that the water does not reach", () => {
    const plane = planeAt(-0.2, 60, { slopeAlong: 0.001 });
    expect(hydrostaticsAt(box, plane)).toEqual({
      ok: false,
      refusal: { type: "NoWaterInHull", keel: 0, draftAtAp: -0.2, slopeAlong: 0.001 },
    });
  });

  it("refuse a hull under water", () => {
    expect(hydrostaticsAt(box, planeAt(5.5, 60))).toMatchObject({ ok: false, refusal: { type: "HullUnderWater", top: 5 } });
  });
});

function at(hull: Hull, plane: Waterplane): Hydrostatics {
  return promised(hydrostaticsAt(hull, plane));
}

function opposite(value: number): number {
  return value === 0 ? 0 : -value;
}

function withSectionsBetween({ sections }: Offsets): Offsets {
  const between = sections.slice(1).map((forward, i) => {
    const aft = sections[i] as (typeof sections)[number];
    const mixed = (a: number, b: number) => 0.7 * a + 0.3 * b;
    const points = aft.points.map(([y, z], j) => {
      const [y1, z1] = forward.points[j] as readonly [number, number];
      return [mixed(y, y1), mixed(z, z1)] as const;
    });
    return { x: mixed(aft.x, forward.x), points };
  });
  return { sections: [...sections, ...between] };
}
