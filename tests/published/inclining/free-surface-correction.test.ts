import { describe, expect, it } from "vitest";
import { freeSurfaceCorrection } from "@/lib/inclining/as-inclined";

describe("published losses of GM by free surface", () => {
  it("5000 t, oil of 0.8 t/m³ in a tank of 6 × 10 m: 8 cm", () => {
    // Source: GATE examination, collegedunia.com; the answer is right, the derivation printed with it is not
    const inertia = (6 * 10 ** 3) / 12;
    expect(freeSurfaceCorrection([{ density: 0.8, freeSurfaceInertia: inertia }], 5000)).toBeCloseTo(0.08, 12);
  });

  it.each([
    // Source: marinegyaan.com, chapter 10; both printed values are truncated, not rounded
    { density: 0.88, published: 0.042 },
    { density: 1.025, published: 0.049 },
  ])("5000 t, 242 m⁴, liquid of $density t/m³: $published m", ({ density, published }) => {
    const correction = freeSurfaceCorrection([{ density, freeSurfaceInertia: 242 }], 5000);
    expect(Math.floor(correction * 1000) / 1000).toBe(published);
  });

  it("9000 tons, two tanks of 40 × 30 ft, specific gravity 0.86 in sea water: 0.48 ft", () => {
    // Source: deck examination of the United States, question 0449; 35 ft³ of sea water to the ton
    const tank = { density: 0.86 / 1.025 / 35, freeSurfaceInertia: (40 * 30 ** 3) / 12 };
    expect(Math.abs(freeSurfaceCorrection([tank, tank], 9000) - 0.48)).toBeLessThanOrEqual(0.005);
  });
});
