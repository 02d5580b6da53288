import { describe, expect, it } from "vitest";
import { densityInVacuum, waterDensity } from "@/lib/hydrostatics/water-density";
import { promised } from "@/lib/result";

describe("water density", () => {
  it("averages over the depths of each place, then over the places", () => {
    const found = promised(
      waterDensity([
        { place: "aft", depth: 1, density: 1.01 },
        { place: "aft", depth: 3, density: 1.014 },
        { place: "forward", depth: 1, density: 1.02 },
      ]),
    );
    expect(found.density).toBeCloseTo((1.012 + 1.02) / 2, 15);
    expect(found.places).toEqual([
      { place: "aft", density: expect.closeTo(1.012, 14), samples: 2 },
      { place: "forward", density: 1.02, samples: 1 },
    ]);
    expect(found.spread).toBeCloseTo(0.01, 14);
    expect(found.scatter).toBeCloseTo(0.004, 14);
    expect(found.samples).toBe(3);
  });

  it("has no scatter with one place", () => {
    expect(promised(waterDensity([{ place: "aft", depth: 1, density: 1.01 }])).scatter).toBeNull();
  });

  it("reads each sample by its own hydrometer", () => {
    const hydrometers = [
      { id: "A", scale: "density-air" as const, correction: -0.0004 },
      { id: "V", scale: "density-vacuum" as const, correction: 0.0002 },
    ];
    const samples = [
      { place: "aft", depth: 1, density: 1.02, hydrometer: "A" },
      { place: "forward", depth: 1, density: 1.02, hydrometer: "V" },
    ];
    const [aft, forward] = promised(waterDensity(samples, hydrometers)).places;
    expect(aft?.density).toBeCloseTo(1.0207, 14);
    expect(forward?.density).toBeCloseTo(1.0202, 14);
  });

  it("takes specific gravity against fresh water at 15 °C", () => {
    expect(densityInVacuum(1, { id: "S", scale: "specific-gravity" })).toBeCloseTo(0.9991, 5);
  });

  it("refuses to guess without a sample", () => {
    expect(waterDensity([])).toEqual({ ok: false, refusal: { type: "NoWaterSamples", got: 0, needed: 1 } });
  });

  it("refuses a hydrometer that is not on the list", () => {
    expect(waterDensity([{ place: "aft", depth: 1, density: 1.02, hydrometer: "H9" }])).toEqual({
      ok: false,
      refusal: { type: "UnknownHydrometer", hydrometer: "H9", place: "aft" },
    });
  });
});
