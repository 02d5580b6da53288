import { describe, expect, it } from "vitest";
import { seawaterDensity } from "@/lib/hydrostatics/seawater-density";
import { densityInVacuum } from "@/lib/hydrostatics/water-density";

/** Temperatures of today's scale for those of the scale of 1968, on which the check values stand. */
const ofScale68 = (celsius: number) => celsius / 1.00024;

describe("density of water", () => {
  /** Source: Fofonoff & Millard, UNESCO Technical Papers in Marine Science 44 (1983); Gill, Atmosphere–Ocean Dynamics (1982), table A3. */
  it.each([
    [0, 5, 999.96675],
    [0, 25, 997.04796],
    [35, 5, 1027.67547],
    [35, 25, 1023.34306],
  ])("salinity %d at %d °C: %d kg/m³ by EOS-80", (salinity, celsius, expected) => {
    // printed to five decimals
    expect(Math.abs(1000 * seawaterDensity(ofScale68(celsius), salinity) - expected)).toBeLessThan(1e-5);
  });

  /** Source: tables of pure water, thoughtco.com/what-is-the-density-of-water-609413 and experts123.com/q/what-is-the-density-of-pure-water.html. */
  it.each([
    [0, 999.8395],
    [4, 999.972],
    [10, 999.7026],
    [15, 999.1026],
    [20, 998.2071],
    [22, 997.7735],
    [25, 997.0479],
    [30, 995.6502],
  ])("fresh water at %d °C: %d kg/m³", (celsius, expected) => {
    // editions of the table differ by up to 0.006 kg/m³ with the temperature scale
    expect(Math.abs(1000 * seawaterDensity(celsius, 0) - expected)).toBeLessThan(0.006);
  });

  /** Source: Masui et al., Determination of the absolute density of water at 16 °C, abstract; formula of the standard 0.0015 kg/m³ apart at most. */
  it("fresh water at 16 °C: 998.9468 kg/m³ as measured", () => {
    // EOS-80 rests on older water of 999.975 kg/m³ at its greatest and on the older scale: a few g/m³ apart
    expect(Math.abs(1000 * seawaterDensity(16, 0) - 998.9468)).toBeLessThan(0.006);
  });

  /** Source: myseatime.com/discussion/load-line-hydrometer-vs-draught-survey-hydrometer. */
  it("a load line hydrometer at 1.025 and a draft survey hydrometer at 1.023 mean the same water", () => {
    const loadLine = densityInVacuum(1.025, { id: "load line", scale: "specific-gravity" });
    const survey = densityInVacuum(1.023, { id: "draft survey", scale: "density-air" });
    expect(Math.abs(loadLine - survey)).toBeLessThan(0.0005);
    expect(loadLine - 0.0011).toBeCloseTo(1.025 * 0.9991 - 0.0011, 5);
  });
});
