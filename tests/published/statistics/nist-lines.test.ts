import { describe, expect, it } from "vitest";
import { lineThroughOrigin } from "@/lib/numerics/line-through-origin";
import { linearFit } from "@/lib/numerics/linear-fit";
import { promised } from "@/lib/result";
import { agreeingDigits } from "./agreeing-digits";

/**
 * Source: National Institute of Standards and Technology, Statistical Reference Datasets, linear regression:
 * Norris, NoInt1, NoInt2, data and certified values, itl.nist.gov/div898/strd (public domain).
 * The residual standard deviation of NoInt2 is quoted from memory.
 */
const norris = {
  x: [
    0.2, 337.4, 118.2, 884.6, 10.1, 226.5, 666.3, 996.3, 448.6, 777.0, 558.2, 0.4, 0.6, 775.5, 666.9, 338.0, 447.5, 11.6, 556.0, 228.1,
    995.8, 887.6, 120.2, 0.3, 0.3, 556.8, 339.1, 887.2, 999.0, 779.0, 11.1, 118.3, 229.2, 669.1, 448.9, 0.5,
  ],
  y: [
    0.1, 338.8, 118.1, 888.0, 9.2, 228.1, 668.5, 998.5, 449.1, 778.9, 559.2, 0.3, 0.1, 778.1, 668.8, 339.3, 448.9, 10.8, 557.7, 228.3,
    998.0, 888.8, 119.6, 0.3, 0.6, 557.6, 339.3, 888.0, 998.5, 778.9, 10.2, 117.6, 228.9, 668.4, 449.2, 0.2,
  ],
};

describe("NIST's certified straight lines", () => {
  // certified to 15 digits; 12 leaves three for the rounding of 36 data with three digits before the point
  it("Norris: an intercept that nearly cancels, to 12 digits", () => {
    const fit = promised(linearFit(norris.x, norris.y));
    expect(agreeingDigits(fit.slope, 1.00211681802045)).toBeGreaterThan(12);
    expect(agreeingDigits(fit.intercept, -0.262323073774029)).toBeGreaterThan(12);
    expect(agreeingDigits(fit.slopeUncertainty, 0.000429796848199937)).toBeGreaterThan(12);
    expect(agreeingDigits(fit.interceptUncertainty, 0.232818234301152)).toBeGreaterThan(12);
    expect(agreeingDigits(fit.residualDeviation, 0.884796396144373)).toBeGreaterThan(12);
    expect(fit.degreesOfFreedom).toBe(34);
  });

  it("NoInt1: a line through the origin far from it, to 12 digits", () => {
    const x = Array.from({ length: 11 }, (_, i) => 60 + i);
    const fit = promised(
      lineThroughOrigin(
        x,
        x.map((value) => value + 70),
      ),
    );
    expect(agreeingDigits(fit.slope, 2.07438016528926)).toBeGreaterThan(12);
    expect(agreeingDigits(fit.slopeUncertainty, 0.0165289256198347)).toBeGreaterThan(12);
    expect(agreeingDigits(fit.residualDeviation, 3.56753034006338)).toBeGreaterThan(12);
    expect(fit.degreesOfFreedom).toBe(10);
  });

  it("NoInt2: three points through the origin, to 12 digits", () => {
    const fit = promised(lineThroughOrigin([4, 5, 6], [3, 4, 4]));
    expect(agreeingDigits(fit.slope, 0.727272727272727)).toBeGreaterThan(12);
    expect(agreeingDigits(fit.slopeUncertainty, 0.0420827318078432)).toBeGreaterThan(12);
    expect(agreeingDigits(fit.residualDeviation, 0.369274472937998)).toBeGreaterThan(12);
  });
});
