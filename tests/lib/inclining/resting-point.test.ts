import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { restingPoint, turningPointsAlternate } from "@/lib/inclining/resting-point";
import { promised } from "@/lib/result";

describe("resting point", () => {
  it("is the mean of settled marks", () => {
    expect(promised(restingPoint("settled", [101, 103]))).toEqual({ value: 102, scatter: Math.SQRT2 });
    expect(promised(restingPoint("settled", [101]))).toEqual({ value: 101, scatter: null });
  });

  it("is exact for a swing that decays evenly, even and odd counts alike", () => {
    expect(promised(restingPoint("turning-points", [110, 92, 106, 96, 102])).value).toBe(100);
    expect(promised(restingPoint("turning-points", [110, 92, 106, 96])).value).toBe(100);
    expect(promised(restingPoint("turning-points", [110, 92, 106])).value).toBe(100);
  });

  it("follows the worked example of three turning points: (101 + 2·97 + 100.5)/4", () => {
    expect(promised(restingPoint("turning-points", [101, 97, 100.5])).value).toBeCloseTo(98.875, 12);
  });

  it("for any even decay about any rest", () => {
    const swing = fc.record({
      rest: fc.double({ min: -500, max: 500, noNaN: true }),
      first: fc.double({ min: 1, max: 50, noNaN: true }),
      count: fc.integer({ min: 3, max: 12 }),
    });
    fc.assert(
      fc.property(swing, ({ rest, first, count }) => {
        const values = Array.from({ length: count }, (_, i) => rest + (i % 2 === 0 ? 1 : -1) * first * (1 - i / 20));
        expect(promised(restingPoint("turning-points", values)).value).toBeCloseTo(rest, 9);
      }),
    );
  });

  it("moves with the batten's zero and mirrors with its sign", () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: -300, max: 300 }), { minLength: 3, maxLength: 9 }),
        fc.integer({ min: -50, max: 50 }),
        (v, d) => {
          const rest = promised(restingPoint("turning-points", v)).value;
          expect(
            promised(
              restingPoint(
                "turning-points",
                v.map((each) => each + d),
              ),
            ).value,
          ).toBeCloseTo(rest + d, 9);
          expect(
            promised(
              restingPoint(
                "turning-points",
                v.map((each) => -each),
              ),
            ).value,
          ).toBeCloseTo(-rest, 9);
        },
      ),
    );
  });

  it("refuses fewer than three turning points, and no marks at all", () => {
    expect(restingPoint("turning-points", [101, 97])).toEqual({ ok: false, refusal: { type: "TooFewTurningPoints", got: 2, needed: 3 } });
    expect(restingPoint("settled", [])).toEqual({ ok: false, refusal: { type: "NoMarks" } });
  });
});

describe("turning points", () => {
  it("alternate as a free bob's do, also when it comes to rest", () => {
    expect(turningPointsAlternate([101, 97, 100, 98])).toBe(true);
    expect(turningPointsAlternate([101, 97, 99, 99, 99])).toBe(true);
    expect(turningPointsAlternate([101])).toBe(true);
  });

  it("do not alternate where one was missed", () => {
    expect(turningPointsAlternate([101, 97, 96, 100])).toBe(false);
  });
});
