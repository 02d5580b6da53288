import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { leastSquares } from "@/lib/numerics/least-squares";
import { linearFit } from "@/lib/numerics/linear-fit";
import { promised } from "@/lib/result";

describe("least squares", () => {
  it("solves a square system exactly enough", () => {
    const fit = promised(
      leastSquares(
        [
          [2, 1],
          [1, 3],
        ],
        [5, 10],
      ),
    );
    expect(fit.coefficients[0]).toBeCloseTo(1, 14);
    expect(fit.coefficients[1]).toBeCloseTo(3, 14);
    expect(fit.degreesOfFreedom).toBe(0);
  });

  it("gives a straight line's slope and both uncertainties", () => {
    const x = [1, 2, 3, 5, 8];
    const y = [1.1, 1.9, 3.2, 4.8, 8.1];
    const line = promised(linearFit(x, y));
    const fit = promised(
      leastSquares(
        x.map((value) => [1, value]),
        y,
      ),
    );
    const variance = fit.residualSumOfSquares / fit.degreesOfFreedom;
    expect(fit.coefficients[1]).toBeCloseTo(line.slope, 14);
    expect(Math.sqrt(variance * (fit.covarianceFactor[1]?.[1] as number))).toBeCloseTo(line.slopeUncertainty, 14);
    expect(Math.sqrt(variance * (fit.covarianceFactor[0]?.[0] as number))).toBeCloseTo(line.interceptUncertainty, 14);
  });

  it("leaves residuals square on every column", () => {
    // whole numbers: columns that are almost but not quite dependent would ask for coefficients of any size
    const number = fc.integer({ min: -10, max: 10 });
    fc.assert(
      fc.property(fc.array(fc.tuple(number, number, number), { minLength: 5, maxLength: 12 }), (triples) => {
        const rows = triples.map(([a, b]) => [1, a, b]);
        const fit = leastSquares(
          rows,
          triples.map(([, , y]) => y),
        );
        if (!fit.ok) return;
        const { residuals } = fit.value;
        for (const column of [0, 1, 2]) {
          const along = rows.reduce((total, row, i) => total + (row[column] as number) * (residuals[i] as number), 0);
          // products up to 100, a dozen of them
          expect(Math.abs(along)).toBeLessThan(1e-11);
        }
      }),
    );
  });

  it("does not care in which unit a column stands", () => {
    const rows = [1, 2, 3, 4].map((x) => [1, x]);
    const scaled = [1, 2, 3, 4].map((x) => [1, 1e9 * x]);
    const y = [2, 3, 5, 8];
    const fit = promised(leastSquares(rows, y));
    const other = promised(leastSquares(scaled, y));
    expect(1e9 * (other.coefficients[1] as number)).toBeCloseTo(fit.coefficients[1] as number, 13);
  });

  it("refuses fewer rows than columns", () => {
    expect(leastSquares([[1, 2]], [1])).toEqual({ ok: false, refusal: { type: "TooFewRows", got: 1, needed: 2 } });
    expect(leastSquares([], [])).toEqual({ ok: false, refusal: { type: "TooFewRows", got: 0, needed: 1 } });
  });

  it("refuses a column that the others determine, and names it", () => {
    const rows = [1, 2, 3, 4].map((x) => [1, x, 2 * x - 3]);
    const refused = leastSquares(rows, [1, 2, 3, 4]);
    expect(refused).toMatchObject({ ok: false, refusal: { type: "RankDeficient", column: 2, columns: 3 } });
  });

  it("refuses a column of zeros", () => {
    const rows = [1, 2, 3].map((x) => [x, 0]);
    expect(leastSquares(rows, [1, 2, 3])).toMatchObject({ ok: false, refusal: { type: "RankDeficient", column: 1, independentPart: 0 } });
  });
});
