import { describe, expect, it } from "vitest";
import { comparedWithPrevious, sisterDisplacementLimit } from "@/lib/lightship/previous-ship";

const before = { displacement: 1000, lcg: 30, vcg: 5 };
const now = (change: object) => ({ ...before, tcg: 0, ...change });

describe("a lightship against an earlier test", () => {
  it.each([
    [{ displacement: 1020 }, ["met", "met", "met"]],
    [{ displacement: 979 }, ["not-met", "met", "met"]],
    [{ lcg: 31 }, ["met", "met", "met"]],
    [{ lcg: 28.99 }, ["met", "not-met", "met"]],
    [{ vcg: 5.06 }, ["met", "met", "not-met"]],
  ])("%j on 100 m", (change, verdicts) => {
    const findings = comparedWithPrevious(now(change), { ...before, kind: "earlier" }, 100);
    expect(findings.map(({ verdict }) => verdict)).toEqual(verdicts);
    expect(findings.map(({ limit }) => limit)).toEqual([{ share: 0.02 }, { share: 0.01 }, { share: 0.01 }]);
  });

  it("shows each deviation with its sign, LCG relative to length", () => {
    const found = comparedWithPrevious(now({ displacement: 990, lcg: 30.5, vcg: 4.9 }), { ...before, kind: "earlier" }, 100);
    expect(found.map((each) => each.found)).toEqual(
      [
        [-0.01, before.displacement],
        [0.005, before.lcg],
        [-0.02, before.vcg],
      ].map(([deviation = 0, other]) => ({ kind: "earlier", deviation: expect.closeTo(deviation, 12), other })),
    );
  });

  it("has no VCG to compare with where that is given as zero", () => {
    expect(comparedWithPrevious(now({}), { ...before, vcg: 0, kind: "earlier" }, 100)).toHaveLength(2);
  });
});

describe("a lightship against a sister's", () => {
  // Source: MSC/Circ.1158: L ≤ 50 m 2 %, L ≥ 160 m 1 %, linear between
  it.each([
    [30, 0.02],
    [50, 0.02],
    [105, 0.015],
    [160, 0.01],
    [300, 0.01],
  ])("of %i m may deviate by %f in displacement", (lbp, share) => {
    expect(sisterDisplacementLimit(lbp)).toBeCloseTo(share, 12);
  });

  it("may deviate by half a hundredth of length in LCG", () => {
    const at = (lcg: number) => comparedWithPrevious(now({ lcg }), { ...before, kind: "sister" }, 100)[1];
    expect(at(30.5)).toMatchObject({ id: "previous-lcg", verdict: "met", limit: { share: 0.005 } });
    expect(at(30.51)?.verdict).toBe("not-met");
  });
});
