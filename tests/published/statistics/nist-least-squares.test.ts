import { describe, expect, it } from "vitest";
import { leastSquares } from "@/lib/numerics/least-squares";
import { promised } from "@/lib/result";
import { agreeingDigits } from "./agreeing-digits";

/**
 * Source: National Institute of Standards and Technology, Statistical Reference Datasets, linear regression:
 * Longley, Pontius, Wampler1, Wampler3, data and certified values, itl.nist.gov/div898/strd (public domain).
 * The residual standard deviations of Longley and Pontius are quoted from memory.
 */
type Certified = {
  readonly rows: readonly (readonly number[])[];
  readonly y: readonly number[];
  readonly coefficients: readonly number[];
  readonly uncertainties: readonly number[];
  readonly residualDeviation?: number;
};

const columnsOfLongley = [
  [83.0, 88.5, 88.2, 89.5, 96.2, 98.1, 99.0, 100.0, 101.2, 104.6, 108.4, 110.8, 112.6, 114.2, 115.7, 116.9],
  [
    234289.0, 259426.0, 258054.0, 284599.0, 328975.0, 346999.0, 365385.0, 363112.0, 397469.0, 419180.0, 442769.0, 444546.0, 482704.0,
    502601.0, 518173.0, 554894.0,
  ],
  [2356.0, 2325.0, 3682.0, 3351.0, 2099.0, 1932.0, 1870.0, 3578.0, 2904.0, 2822.0, 2936.0, 4681.0, 3813.0, 3931.0, 4806.0, 4007.0],
  [1590.0, 1456.0, 1616.0, 1650.0, 3099.0, 3594.0, 3547.0, 3350.0, 3048.0, 2857.0, 2798.0, 2637.0, 2552.0, 2514.0, 2572.0, 2827.0],
  [
    107608.0, 108632.0, 109773.0, 110929.0, 112075.0, 113270.0, 115094.0, 116219.0, 117388.0, 118734.0, 120445.0, 121950.0, 123366.0,
    125368.0, 127852.0, 130081.0,
  ],
  [1947.0, 1948.0, 1949.0, 1950.0, 1951.0, 1952.0, 1953.0, 1954.0, 1955.0, 1956.0, 1957.0, 1958.0, 1959.0, 1960.0, 1961.0, 1962.0],
];

const longley: Certified = {
  rows: columnsOfLongley[0]?.map((_, i) => [1, ...columnsOfLongley.map((column) => column[i] as number)]) ?? [],
  y: [60323, 61122, 60171, 61187, 63221, 63639, 64989, 63761, 66019, 67857, 68169, 66513, 68655, 69564, 69331, 70551],
  coefficients: [
    -3482258.63459582, 15.0618722713733, -0.035819179292591, -2.02022980381683, -1.03322686717359, -0.0511041056535807, 1829.15146461355,
  ],
  uncertainties: [
    890420.383607373, 84.9149257747669, 0.0334910077722432, 0.488399681651699, 0.214274163161675, 0.22607320006937, 455.478499142212,
  ],
  residualDeviation: 304.854073561965,
};

const pontius: Certified = {
  rows: polynomialRows([...steps(20, 150_000, 150_000), ...steps(20, 150_000, 150_000)], 2),
  y: [
    0.11019, 0.21956, 0.32949, 0.43899, 0.54803, 0.65694, 0.76562, 0.87487, 0.98292, 1.09146, 1.20001, 1.30822, 1.41599, 1.52399, 1.63194,
    1.73947, 1.84646, 1.95392, 2.06128, 2.16844, 0.11052, 0.22018, 0.32939, 0.43886, 0.54798, 0.65739, 0.76596, 0.87474, 0.983, 1.0915,
    1.20004, 1.30818, 1.41613, 1.52408, 1.63159, 1.73965, 1.84696, 1.95445, 2.06177, 2.16829,
  ],
  coefficients: [0.000673565789473684, 7.32059160401003e-7, -3.16081871345029e-15],
  uncertainties: [0.000107938612033077, 1.57817399981659e-10, 4.86652849992036e-17],
  residualDeviation: 0.000205177424076185,
};

const wampler3: Certified = {
  rows: polynomialRows(steps(21, 0, 1), 5),
  y: [
    760, -2042, 2111, -1684, 3888, 1858, 11379, 17560, 39287, 64382, 113159, 175108, 273291, 400186, 581243, 811568, 1121004, 1506550,
    2002767, 2611612, 3369180,
  ],
  coefficients: [1, 1, 1, 1, 1, 1],
  uncertainties: [2152.3262467817, 2363.55173469681, 779.343524331583, 101.47550755035, 5.64566512170752, 0.112324854679312],
};

const wampler1 = [
  1, 6, 63, 364, 1365, 3906, 9331, 19608, 37449, 66430, 111111, 177156, 271453, 402234, 579195, 813616, 1118481, 1508598, 2000719, 2613660,
  3368421,
];

describe("NIST's certified least squares", () => {
  // columns nearly dependent: after scaling to length 1 the condition is about 4e4, so 16 − 5 digits can be had
  it("Longley: six nearly dependent columns, to 10 digits", () => {
    expect(fewestDigits(longley)).toBeGreaterThan(10);
  });

  // columns up to 9e12, curvature the small difference of large ones
  it("Pontius: a calibration curve with x up to three million, to 10 digits", () => {
    expect(fewestDigits(pontius)).toBeGreaterThan(10);
  });

  // fifth-degree powers of 0 to 20: condition about 1e4 after scaling; the noise is a thousand times the signal's lower terms
  it("Wampler3: a quintic, to 8 digits", () => {
    expect(fewestDigits(wampler3)).toBeGreaterThan(8);
  });

  it("Wampler1: an exact quintic, to 8 digits", () => {
    const fit = promised(leastSquares(wampler3.rows, wampler1));
    for (const coefficient of fit.coefficients) expect(agreeingDigits(coefficient, 1)).toBeGreaterThan(8);
  });
});

function fewestDigits({ rows, y, coefficients, uncertainties, residualDeviation }: Certified): number {
  const fit = promised(leastSquares(rows, y));
  const deviation = Math.sqrt(fit.residualSumOfSquares / fit.degreesOfFreedom);
  return Math.min(
    ...coefficients.map((certified, j) => agreeingDigits(fit.coefficients[j] as number, certified)),
    ...uncertainties.map((certified, j) => agreeingDigits(deviation * Math.sqrt(fit.covarianceFactor[j]?.[j] as number), certified)),
    residualDeviation === undefined ? 16 : agreeingDigits(deviation, residualDeviation),
  );
}

function steps(count: number, first: number, step: number): number[] {
  return Array.from({ length: count }, (_, i) => first + i * step);
}

function polynomialRows(x: readonly number[], degree: number): number[][] {
  return x.map((value) => steps(degree + 1, 0, 1).map((power) => value ** power));
}
