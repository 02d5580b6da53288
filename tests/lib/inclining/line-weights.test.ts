import { describe, expect, it } from "vitest";
import { commonLine } from "@/lib/inclining/common-line";
import { incliningTest } from "@/lib/inclining/inclining-test";
import { weighingUncertainty } from "@/lib/inclining/line-weights";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { mean, standardDeviation } from "@/lib/numerics/sum";
import { promised } from "@/lib/result";
import { sampleDocument } from "../record/sample-document";

const moments = [0, 50, 100, -50, -100].map((moment, no) => ({ no, session: 1, moment }));
const series = (id: string, tangents: readonly number[], uncertainty: number, scatter?: number) => ({
  id,
  series: 1,
  session: 1,
  tangents: tangents.map((tan, move) => ({ move, tan, uncertainty, ...(scatter === undefined ? {} : { scatter }) })),
});
const straight = [0, 0.01, 0.02, -0.01, -0.02];
const steep = straight.map((tan) => 1.1 * tan);

describe("a line whose readings are weighed", () => {
  it("is the line of equal weights where every reading is known alike", () => {
    const both = [series("A", straight, 1e-4), series("B", steep, 1e-4)];
    const weighed = promised(commonLine(both, moments, "readings"));
    const plain = promised(commonLine(both, moments));
    expect(weighed.slope).toBeCloseTo(plain.slope, 16);
    expect(weighed.spread?.slopeUncertainty).toBeCloseTo(plain.spread?.slopeUncertainty ?? 0, 16);
    expect(weighed.spread?.byScatter).toBeCloseTo(plain.spread?.byScatter ?? 0, 16);
  });

  it("lies four times as near to the station that reads twice as well: (4·2.0 + 2.2)/5 · 10⁻⁴", () => {
    const line = promised(commonLine([series("A", straight, 1e-4), series("B", steep, 2e-4)], moments, "readings"));
    expect(line.slope).toBeCloseTo(2.04e-4, 15);
  });

  it("weighs by the scatter of a reading's own marks, and not by less than what is stated", () => {
    expect(weighingUncertainty("readings", { uncertainty: 1e-4, scatter: 3e-4 })).toBe(3e-4);
    expect(weighingUncertainty("readings", { uncertainty: 1e-4, scatter: 0 })).toBe(1e-4);
    expect(weighingUncertainty("equal", { uncertainty: 1e-4, scatter: 3e-4 })).toBeNull();
    const line = promised(commonLine([series("A", straight, 1e-4), series("B", steep, 1e-4, 2e-4)], moments, "readings"));
    expect(line.slope).toBeCloseTo(2.04e-4, 15);
  });

  it("refuses a reading that is said to be exact", () => {
    expect(commonLine([series("A", straight, 0)], moments, "readings")).toEqual({
      ok: false,
      refusal: { type: "UncertaintyNotPositive", uncertainty: 0 },
    });
  });

  it("tells its own uncertainty as it is, in a thousand tests whose stations read unlike well", () => {
    const noise = seededNoise(11);
    const own = [1e-5, 2e-4];
    const lines = Array.from({ length: 1000 }, () =>
      promised(
        commonLine(
          own.map((uncertainty, j) =>
            series(
              "AB"[j] ?? "",
              straight.map((tan) => tan + noise.normal(uncertainty)),
              uncertainty,
            ),
          ),
          moments,
          "readings",
        ),
      ),
    );
    const seen = standardDeviation(lines.map(({ slope }) => slope));
    const told = Math.sqrt(mean(lines.map(({ spread }) => (spread?.byScatter ?? 0) ** 2)));
    // each of the two is known to about 3 %
    expect(told / seen).toBeGreaterThan(0.9);
    expect(told / seen).toBeLessThan(1.1);
    const equal = promised(commonLine([series("A", straight, own[0] ?? 0), series("B", straight, own[1] ?? 0)], moments));
    expect(seen).toBeLessThan((equal.spread?.slopeUncertainty ?? 0) / 5);
  });
});

it("a test that asks for it is reduced by both methods with its readings weighed", () => {
  const record = sampleDocument();
  const weighed = { ...record, settings: { ...record.settings, weights: "readings" as const } };
  const [plain, by] = [promised(incliningTest(record)), promised(incliningTest(weighed))];
  expect(by.line.slope).not.toBe(plain.line.slope);
  expect(Math.abs(by.line.slope / plain.line.slope - 1)).toBeLessThan(3 * (plain.line.spread.slopeUncertainty / plain.line.slope));
  expect(by.generalised?.vcg).not.toBe(plain.generalised?.vcg);
  expect(promised(incliningResult(weighed)).fit.slope).toBe(by.line.slope);
});
