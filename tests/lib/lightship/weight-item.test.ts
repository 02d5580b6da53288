import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { centreOf, minus, momentsOf, nothing, plus, total } from "@/lib/lightship/weight-item";

const number = fc.double({ min: -100, max: 100, noNaN: true });
const item = fc.record({ mass: fc.double({ min: 0.1, max: 1000, noNaN: true }), x: number, y: number, z: number });

describe("weights", () => {
  it("have their mass and three moments", () => {
    expect(momentsOf({ mass: 2, x: 10, y: -3, z: 4 })).toEqual({ mass: 2, along: 20, athwart: -6, upward: 8 });
    expect(total([])).toEqual(nothing);
  });

  it("together have their common centre", () => {
    const both = total([
      { mass: 1, x: 0, y: 0, z: 1 },
      { mass: 3, x: 4, y: -4, z: 5 },
    ]);
    expect(centreOf(both)).toEqual({ mass: 4, lcg: 3, tcg: -3, vcg: 4 });
  });

  it("of any kind come back from their centre", () => {
    fc.assert(
      fc.property(item, ({ mass, x, y, z }) => {
        const centre = centreOf(momentsOf({ mass, x, y, z }));
        expect(centre.lcg).toBeCloseTo(x, 9);
        expect(centre.tcg).toBeCloseTo(y, 9);
        expect(centre.vcg).toBeCloseTo(z, 9);
      }),
    );
  });

  it("taken off again leave what was there", () => {
    fc.assert(
      fc.property(item, item, (ship, load) => {
        const left = minus(plus(momentsOf(ship), momentsOf(load)), momentsOf(load));
        expect(left.mass).toBeCloseTo(ship.mass, 9);
        expect(left.upward).toBeCloseTo(ship.mass * ship.z, 7);
      }),
    );
  });
});
