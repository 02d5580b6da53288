import { describe, expect, it } from "vitest";
import { lineThroughOrigin } from "@/lib/numerics/line-through-origin";
import { promised } from "@/lib/result";

describe("line through the origin", () => {
  it("finds an exact one", () => {
    expect(promised(lineThroughOrigin([1, 2, 4], [3, 6, 12]))).toMatchObject({ slope: 3, residuals: [0, 0, 0], degreesOfFreedom: 2 });
  });

  it("refuses one point", () => {
    expect(lineThroughOrigin([1], [3])).toEqual({ ok: false, refusal: { type: "TooFewPoints", got: 1, needed: 2 } });
  });

  it("refuses points that all stand at the origin", () => {
    expect(lineThroughOrigin([0, 0], [3, 4])).toMatchObject({ ok: false, refusal: { type: "NoSpread" } });
  });
});
