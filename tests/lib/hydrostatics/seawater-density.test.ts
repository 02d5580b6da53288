import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { isWithinSeawaterRange, naturalWaterRange, seawaterDensity } from "@/lib/hydrostatics/seawater-density";

describe("seawater density", () => {
  it("grows with salinity at any temperature", () => {
    fc.assert(
      fc.property(fc.double({ min: -2, max: 40, noNaN: true }), fc.double({ min: 0, max: 41, noNaN: true }), (temperature, salinity) => {
        expect(seawaterDensity(temperature, salinity + 1)).toBeGreaterThan(seawaterDensity(temperature, salinity));
      }),
    );
  });

  it("is greatest in fresh water near 4 °C", () => {
    expect(seawaterDensity(4, 0)).toBeGreaterThan(seawaterDensity(3, 0));
    expect(seawaterDensity(4, 0)).toBeGreaterThan(seawaterDensity(5, 0));
  });

  it("bounds what natural water can be", () => {
    const [fresh, salt] = naturalWaterRange(10);
    expect(fresh).toBeCloseTo(0.9997, 4);
    expect(salt).toBeGreaterThan(1.03);
  });

  it("knows its range, and takes arguments outside it for a broken promise", () => {
    expect([isWithinSeawaterRange(41, 35), isWithinSeawaterRange(10, 43), isWithinSeawaterRange(10, 35)]).toEqual([false, false, true]);
    expect(() => seawaterDensity(60, 35)).toThrow(RangeError);
  });
});
