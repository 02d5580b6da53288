import { describe, expect, it } from "vitest";
import { draftAtApFor } from "@/lib/hydrostatics/draft-for-volume";
import { promised } from "@/lib/result";
import { boxOffsets, hullOf } from "./sample-hulls";
import { planeAt } from "./sample-planes";

const box = hullOf(boxOffsets(60, 12, 5));

describe("draft for a volume", () => {
  it("is that of the box, within the millimetre it promises", () => {
    expect(promised(draftAtApFor(box, 1440, planeAt(0, 60)))).toBeCloseTo(2, 2);
    expect(promised(draftAtApFor(box, 1440, planeAt(0, 60, { slopeAlong: -0.02, tanHeel: 0.1 })))).toBeCloseTo(2.6, 2);
  });

  it("refuses more than the hull holds, with what is missing", () => {
    expect(draftAtApFor(box, 3700, planeAt(0, 60))).toMatchObject({
      ok: false,
      refusal: { type: "NoSignChange", atLow: -3700, atHigh: expect.closeTo(-100, 9) },
    });
  });
});
