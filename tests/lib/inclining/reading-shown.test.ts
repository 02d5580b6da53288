import { describe, expect, it } from "vitest";
import { readingShown } from "@/lib/inclining/reading-shown";

describe("what an instrument showed", () => {
  const pendulum = { id: "A", instrument: "pendulum", length: 4 } as const;
  const tube = { id: "U", instrument: "u-tube", span: 9 } as const;
  const inclinometer = { id: "I", instrument: "inclinometer" } as const;

  it("is the resting point of a pendulum, an inclinometer, and the legs' difference of a U-tube", () => {
    expect(readingShown(pendulum, { mode: "turning-points", valuesMm: [110, 92, 106] })).toEqual({ ok: true, value: 100 });
    expect(readingShown(inclinometer, { mode: "settled", valuesDegrees: [0.5, 0.7] })).toEqual({ ok: true, value: 0.6 });
    expect(readingShown(tube, { mode: "settled", portMm: [210, 212], starboardMm: [261] })).toEqual({ ok: true, value: 50 });
  });

  it("changes sign where the station is mounted the other way", () => {
    expect(readingShown({ ...pendulum, reversed: true }, { mode: "settled", valuesMm: [12] })).toEqual({ ok: true, value: -12 });
  });

  it("refuses a value of another instrument", () => {
    expect(readingShown(pendulum, { mode: "settled", valuesDegrees: [1] })).toEqual({
      ok: false,
      refusal: { type: "WrongKindOfValue", instrument: "pendulum", needed: "valuesMm" },
    });
  });

  it("refuses too few turning points and says in which leg", () => {
    expect(readingShown(tube, { mode: "turning-points", portMm: [1, 2, 1], starboardMm: [5, 6] })).toEqual({
      ok: false,
      refusal: { type: "TooFewTurningPoints", got: 2, needed: 3, path: "starboardMm" },
    });
  });
});
