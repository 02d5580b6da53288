import { describe, expect, it } from "vitest";
import { commonLine } from "@/lib/inclining/common-line";
import { lackOfFit } from "@/lib/inclining/lack-of-fit";
import { withoutEachMove } from "@/lib/inclining/line-diagnostics";
import { plotHints } from "@/lib/inclining/plot-hints";
import { standardisedResiduals } from "@/lib/inclining/standardised-residuals";
import { promised } from "@/lib/result";

/**
 * Eight conditions, three pendulums; moments in ft·long tons, as tabulated.
 * Source: Hansen, Naval Engineers Journal 97(4), May 1985, 97–115, data as tabulated in the companion file for Example 7.1
 * of Biran, Ship Hydrostatics and Stability (2003). Only the data are published; the figures compared with were computed from
 * them in exact fractions, each move against the line refitted to the other seven.
 */
const conditions = [
  { moment: 3853.7, tan: [0.01869, 0.01854, 0.01788], standardised: -1.2013973467494368, slopeChange: 0.0045874290376967525 },
  { moment: 2570.1, tan: [0.01259, 0.01255, 0.01214], standardised: 0.45528880561426877, slopeChange: -0.0011166700160554028 },
  { moment: 1286.8, tan: [0.00648, 0.00641, 0.00615], standardised: 0.9380237462488586, slopeChange: -0.001004911138904173 },
  { moment: 3.8, tan: [0.00042, 0.00047, 0.0], standardised: 1.9134244036990458, slopeChange: 1.8020969411095556e-5 },
  { moment: -3785.8, tan: [-0.01791, -0.01802, -0.0185], standardised: -0.11480280609931913, slopeChange: -0.000490306742578773 },
  { moment: -2523.3, tan: [-0.01194, -0.01203, -0.01235], standardised: -0.22016557937952097, slopeChange: -0.0005454553135747484 },
  { moment: -1263.7, tan: [-0.00574, -0.00599, -0.00646], standardised: -0.19393392187908745, slopeChange: -0.00022670142835698443 },
  { moment: -0.6, tan: [0.0, 0.0, -0.00063], standardised: -1.77064317473515, slopeChange: -2.2683308804041524e-5 },
];

const series = [0, 1, 2].map((j) => ({
  id: `pendulum ${j + 1}`,
  series: 1,
  session: 1,
  tangents: conditions.map(({ tan }, move) => ({ move, tan: tan[j] ?? 0, uncertainty: 0 })),
}));
const line = promised(
  commonLine(
    series,
    conditions.map(({ moment }, no) => ({ no, session: 1, moment })),
  ),
);

describe("Hansen's test with three pendulums", () => {
  it("has each move as many standard deviations off the line through the others as refitting finds", () => {
    const { points, limit } = standardisedResiduals(line.moves);
    points.forEach(({ standardised }, k) => {
      expect(standardised).toBeCloseTo(conditions[k]?.standardised as number, 10);
    });
    expect(Math.max(...points.map(({ standardised }) => Math.abs(standardised ?? 0)))).toBeLessThan(limit ?? 0);
  });

  it("changes its slope by as much without each move", () => {
    withoutEachMove(line, { displacement: 1, gmFluid: 1 }).forEach(({ slopeChange }, k) => {
      expect(slopeChange).toBeCloseTo(conditions[k]?.slopeChange as number, 12);
    });
  });

  it("fits as well as its two readings near zero repeat each other, and gives no hint", () => {
    const lack = lackOfFit(line.moves);
    expect(lack?.degreesOfFreedom).toEqual([5, 1]);
    expect(lack?.ratio).toBeCloseTo(0.08300416795333612, 10);
    expect(plotHints(line)).toEqual([]);
  });
});
