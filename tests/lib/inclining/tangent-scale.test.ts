import { describe, expect, it } from "vitest";
import { tangentScale } from "@/lib/inclining/tangent-scale";
import { promised } from "@/lib/result";

const zero = { shown: 0, tanHeel: 0 };
const read = { readingMm: 0.5, readingDegrees: 0.01 };

describe("scale of a station", () => {
  it("is the pendulum's length, and the length of its series where that has its own", () => {
    const station = { id: "A", instrument: "pendulum", length: 4, series: [{ no: 2, length: 5 }, { no: 3 }] } as const;
    expect(promised(tangentScale(station, 1, zero, read))(100)).toEqual({ tan: 0.025, uncertainty: 0.5 / 4000 });
    expect(promised(tangentScale(station, 2, zero, read))(100)).toEqual({ tan: 0.02, uncertainty: 0.5 / 5000 });
    expect(promised(tangentScale(station, 3, zero, read))(100).tan).toBe(0.025);
  });

  it("is the U-tube's span, both legs read", () => {
    const station = { id: "U", instrument: "u-tube", span: 10, series: [{ no: 2, span: 8 }] } as const;
    expect(promised(tangentScale(station, 1, zero, read))(100).tan).toBeCloseTo(0.01, 15);
    expect(promised(tangentScale(station, 1, zero, read))(100).uncertainty).toBeCloseTo((Math.SQRT2 * 0.5) / 10000, 15);
    expect(promised(tangentScale(station, 2, zero, read))(80).tan).toBeCloseTo(0.01, 15);
  });

  it("is the angle from the inclinometer's zero, added to the heel at zero", () => {
    const scale = promised(tangentScale({ id: "I", instrument: "inclinometer" }, 1, { shown: 0.3, tanHeel: Math.tan(0.02) }, read));
    expect(scale(0.3 + 180 / Math.PI / 100).tan).toBeCloseTo(Math.tan(0.03), 14);
    expect(scale(0.3).uncertainty).toBeCloseTo(((0.01 * Math.PI) / 180) * (1 + Math.tan(0.02) ** 2), 12);
  });

  it("refuses a length of zero with its place under the station", () => {
    const station = { id: "A", instrument: "pendulum", length: 0, series: [{ no: 2, length: 0 }] } as const;
    expect(tangentScale(station, 1, zero, read)).toEqual({ ok: false, refusal: { type: "ZeroLength", length: 0, path: "length" } });
    expect(tangentScale(station, 2, zero, read)).toEqual({
      ok: false,
      refusal: { type: "ZeroLength", length: 0, path: "series[0].length" },
    });
    const tube = { id: "U", instrument: "u-tube", span: 0 } as const;
    expect(tangentScale(tube, 1, zero, read)).toEqual({ ok: false, refusal: { type: "ZeroLength", length: 0, path: "span" } });
  });
});
