import { describe, expect, it } from "vitest";
import { commonLine } from "@/lib/inclining/common-line";
import { commonSlope } from "@/lib/inclining/common-slope";
import { lineThroughOrigin } from "@/lib/numerics/line-through-origin";
import { linearFit } from "@/lib/numerics/linear-fit";
import { promised } from "@/lib/result";

/**
 * Eight conditions, three pendulums; moments in ft·long tons, as tabulated.
 * Source: Hansen, Naval Engineers Journal 97(4), May 1985, 97–115, data as tabulated in the companion file for Example 7.1
 * of Biran, Ship Hydrostatics and Stability (2003). Only the data are published; the figures compared with were computed from
 * them independently with scipy.
 */
const conditions = [
  { moment: 3853.7, tan: [0.01869, 0.01854, 0.01788] },
  { moment: 2570.1, tan: [0.01259, 0.01255, 0.01214] },
  { moment: 1286.8, tan: [0.00648, 0.00641, 0.00615] },
  { moment: 3.8, tan: [0.00042, 0.00047, 0.0] },
  { moment: -3785.8, tan: [-0.01791, -0.01802, -0.0185] },
  { moment: -2523.3, tan: [-0.01194, -0.01203, -0.01235] },
  { moment: -1263.7, tan: [-0.00574, -0.00599, -0.00646] },
  { moment: -0.6, tan: [0.0, 0.0, -0.00063] },
];

const series = [0, 1, 2].map((j) => ({
  id: `pendulum ${j + 1}`,
  series: 1,
  session: 1,
  tangents: conditions.map(({ tan }, move) => ({ move, tan: tan[j] ?? 0, uncertainty: 0 })),
}));
const moments = conditions.map(({ moment }, no) => ({ no, session: 1, moment }));
const line = promised(commonLine(series, moments));

// scipy's figures are kept to twelve digits
const twelveDigits = 1e-11;

describe("Hansen's test with three pendulums", () => {
  it("gives one common slope, the same as all points pooled, as every pendulum stands at the same moments", () => {
    expect(1 / line.slope / 208494.864654).toBeCloseTo(1, 11);
    expect(Math.abs(line.slope / 4.79628120174e-6 - 1)).toBeLessThan(twelveDigits);
  });

  it.each([
    { j: 0, stiffness: 208415.538188, intercept: 0.000239183368581, deviation: 0.000129858579888 },
    { j: 1, stiffness: 208224.054817, intercept: 0.000156605600891, deviation: 0.000155358787986 },
    { j: 2, stiffness: 208845.973638, intercept: -0.000305642338014, deviation: 0.000251572035634 },
  ])("gives pendulum $j its own line", ({ j, stiffness, intercept, deviation }) => {
    const station = line.stations[j];
    expect(1 / (station?.slope ?? 0) / stiffness).toBeCloseTo(1, 11);
    expect((station?.intercept ?? 0) / intercept).toBeCloseTo(1, 10);
    const squares = station?.residuals.reduce((total, { residual }) => total + residual ** 2, 0) ?? 0;
    expect(Math.sqrt(squares / 6) / deviation).toBeCloseTo(1, 10);
  });

  it("pooled, with one intercept for all, as the trade does", () => {
    const pooled = promised(linearFit(pooledMoments(), pooledTangents()));
    expect(pooled.intercept / 3.00488771527e-5).toBeCloseTo(1, 10);
    expect(pooled.slopeUncertainty / 2.59061109037e-8).toBeCloseTo(1, 10);
    expect(pooled.residualDeviation / 0.000302356824451).toBeCloseTo(1, 10);
  });

  it("differs by 0.06 % with the other direction of regression, and by the origin forced", () => {
    const momentOnTan = promised(linearFit(pooledTangents(), pooledMoments()));
    expect(momentOnTan.slope / 208361.132895).toBeCloseTo(1, 10);
    const forced = promised(lineThroughOrigin(pooledMoments(), pooledTangents()));
    expect(1 / forced.slope / 208490.80871).toBeCloseTo(1, 10);
  });

  it("shows that pendulums with zeros of their own scatter less about their own intercepts", () => {
    const one = promised(commonSlope([pooledMoments().map((moment, i) => ({ moment, tan: pooledTangents()[i] ?? 0 }))]));
    expect(one.slope / line.slope).toBeCloseTo(1, 12);
    const spread = line.stations.flatMap(({ commonResiduals }) => commonResiduals.map(({ residual }) => residual ** 2));
    const deviation = Math.sqrt(spread.reduce((total, each) => total + each, 0) / (24 - 3 - 1));
    // the pooled fit's 3.0e-4 holds the three zeros, which differ by 5.4e-4
    expect(deviation).toBeLessThan(2e-4);
  });

  it("finds the residuals of the pendulums moving together, so that moves count and not readings", () => {
    expect(line.spread?.degreesOfFreedom).toBe(6);
    expect(correlation(0, 1)).toBeGreaterThan(0.6);
    expect(correlation(1, 2)).toBeGreaterThan(0.6);
    expect(correlation(0, 2)).toBeGreaterThan(0.6);
  });
});

function pooledMoments(): number[] {
  return conditions.flatMap(({ moment }) => [moment, moment, moment]);
}

function pooledTangents(): number[] {
  return conditions.flatMap(({ tan }) => tan);
}

function correlation(i: number, j: number): number {
  const [a, b] = [i, j].map((k) => line.stations[k]?.commonResiduals.map(({ residual }) => residual) ?? []);
  const products = (p: number[] = [], q: number[] = []) => p.reduce((total, value, k) => total + value * (q[k] ?? 0), 0);
  return products(a, b) / Math.sqrt(products(a, a) * products(b, b));
}
