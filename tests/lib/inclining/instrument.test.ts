import { describe, expect, it } from "vitest";
import { inclinometerTangent, pendulumTangent, uTubeTangent } from "@/lib/inclining/instrument";

const degrees = (value: number) => Math.tan((value * Math.PI) / 180);

describe("instruments", () => {
  it("pendulum: 100 mm on 4 m is 0.025", () => {
    expect(pendulumTangent(100, 4)).toEqual({ ok: true, value: 0.025 });
    expect(pendulumTangent(-100, 4)).toEqual({ ok: true, value: -0.025 });
  });

  it("U-tube: the starboard leg 90 mm higher over 9 m is 0.01", () => {
    expect(uTubeTangent(210, 300, 9)).toEqual({ ok: true, value: 0.01 });
  });

  it("inclinometer: its zero adds in the angle", () => {
    expect(inclinometerTangent(3, 1, 0)).toBeCloseTo(degrees(2), 15);
    // an angle of 2° from a list of 1.5° is a heel of 3.5°, 0.7 % more in the tangent than from upright
    expect(inclinometerTangent(2, 0, degrees(1.5))).toBeCloseTo(degrees(3.5), 15);
  });

  it("refuses a length of zero and below", () => {
    expect(pendulumTangent(100, 0)).toEqual({ ok: false, refusal: { type: "ZeroLength", length: 0 } });
    expect(uTubeTangent(1, 2, -9)).toEqual({ ok: false, refusal: { type: "ZeroLength", length: -9 } });
    expect(pendulumTangent(100, Number.NaN).ok).toBe(false);
  });
});
