import { describe, expect, it } from "vitest";
import { commonLine } from "@/lib/inclining/common-line";
import { withoutEachMove } from "@/lib/inclining/line-diagnostics";
import { standardisedResiduals } from "@/lib/inclining/standardised-residuals";
import { linearFit } from "@/lib/numerics/linear-fit";
import { promised } from "@/lib/result";

/**
 * Third of four sets: ten points on a line and one off it.
 * Source: F. J. Anscombe, Graphs in Statistical Analysis, The American Statistician 27 (1973) 17–21, from memory.
 */
const x = [10, 8, 13, 9, 11, 14, 6, 4, 12, 7, 5];
const y = [7.46, 6.77, 12.74, 7.11, 7.81, 8.84, 6.08, 5.39, 8.15, 6.42, 5.73];
const pointOff = 2;

describe("Anscombe's third set", () => {
  it("has the line y = 3.0025 + 0.4997 x through all its points", () => {
    const { slope, intercept } = promised(linearFit(x, y));
    expect(slope).toBeCloseTo(0.4997, 4);
    expect(intercept).toBeCloseTo(3.0025, 4);
  });

  // the line through the other ten, y = 4 + 0.346 x in the paper, is 0.3454 from the data as printed
  it("read as moves of one station: the point off stands out, and without it the slope is 0.345", () => {
    const tangents = y.map((tan, move) => ({ move, tan, uncertainty: 0 }));
    const moves = x.map((moment, no) => ({ no, session: 1, moment }));
    const line = promised(commonLine([{ id: "A", series: 1, session: 1, tangents }], moves));
    const { points, limit } = standardisedResiduals(line.moves);
    const beyond = points.filter(({ standardised }) => Math.abs(standardised ?? 0) > (limit ?? Number.POSITIVE_INFINITY));
    expect(beyond.map(({ no }) => no)).toEqual([pointOff]);
    const without = withoutEachMove(line, { displacement: 1, gmFluid: 1 })[pointOff];
    expect(line.slope * (1 + (without?.slopeChange ?? 0))).toBeCloseTo(0.3454, 4);
  });
});
