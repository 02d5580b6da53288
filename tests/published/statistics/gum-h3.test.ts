import { expect, test } from "vitest";
import { linearFit } from "@/lib/numerics/linear-fit";
import { sum } from "@/lib/numerics/sum";
import { promised } from "@/lib/result";

/** Source: JCGM 100:2008 (GUM), annex H.3, calibration of a thermometer: corrections b by reading t, fitted about t₀ = 20 °C. */
const t = [21.521, 22.012, 22.512, 23.003, 23.507, 23.999, 24.513, 25.002, 25.503, 26.01, 26.511];
const b = [-0.171, -0.169, -0.166, -0.159, -0.164, -0.165, -0.156, -0.157, -0.159, -0.161, -0.16];
const about20 = t.map((value) => value - 20);

test("intercept −0.1712(29) °C and slope 0.002 18(67), nine degrees of freedom", () => {
  const fit = promised(linearFit(about20, b));
  expect(fit.intercept).toBeCloseTo(-0.17120379013135, 12);
  expect(fit.slope).toBeCloseTo(0.0021826977398872894, 14);
  expect(fit.interceptUncertainty).toBeCloseTo(0.0029, 4);
  expect(fit.slopeUncertainty).toBeCloseTo(0.0006679387732278323, 14);
  expect(fit.degreesOfFreedom).toBe(9);
  expect(sum(fit.residuals.map((residual) => residual ** 2))).toBeCloseTo(0.000110096583109, 14);
});

test("the correction at 30 °C is −0.1494(41) °C, the covariance of intercept and slope counted", () => {
  const fit = promised(linearFit(about20, b));
  const mean = sum(about20) / t.length;
  const variance = fit.residualDeviation ** 2 / t.length + fit.slopeUncertainty ** 2 * (10 - mean) ** 2;
  expect(fit.intercept + 10 * fit.slope).toBeCloseTo(-0.1494, 4);
  expect(Math.sqrt(variance)).toBeCloseTo(0.0041, 4);
});
