import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { decimalsFor, figure, figureWithin, shortFigure, signedFigure } from "@/lib/report/rounding";

describe("figures", () => {
  it("have their decimals and a real minus sign", () => {
    expect(figure(1.005, 2)).toBe("1.00");
    expect(figure(-2.5, 1)).toBe("−2.5");
    expect(figure(12345.6, 0)).toBe("12346");
  });

  it("are never a negative zero", () => {
    expect(figure(-0.0004, 3)).toBe("0.000");
    expect(figure(-0, 1)).toBe("0.0");
  });

  it("show their sign where it matters, but not that of zero", () => {
    expect([signedFigure(0.12, 2), signedFigure(-0.12, 2), signedFigure(0.001, 2)]).toEqual(["+0.12", "−0.12", "0.00"]);
  });

  it("in sentences have no trailing zeros", () => {
    expect([shortFigure(2.5), shortFigure(-0.1234567), shortFigure(720), shortFigure(0)]).toEqual(["2.5", "−0.123457", "720", "0"]);
  });
});

describe("digits that follow the uncertainty", () => {
  it("leave two significant digits of it", () => {
    // JCGM 100:2008, 7.2.6 (from memory): 10.057 62 Ω with 27 mΩ is given as 10.058 Ω
    expect(decimalsFor(0.027)).toBe(3);
    expect(figureWithin(10.05762, 0.027)).toBe("10.058");
    expect([decimalsFor(0.3), decimalsFor(4), decimalsFor(12), decimalsFor(250)]).toEqual([2, 1, 0, 0]);
  });

  it("are counted after the uncertainty itself is rounded", () => {
    expect(decimalsFor(0.0996)).toBe(2);
    expect(decimalsFor(0.0994)).toBe(3);
  });

  it("are as many as the machine has where nothing is uncertain", () => {
    expect([decimalsFor(0), decimalsFor(Number.NaN)]).toEqual([12, 12]);
  });

  it("never hide more than half of the last digit shown", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e4, max: 1e4, noNaN: true }),
        fc.double({ min: 1e-6, max: 100, noNaN: true }),
        (value, uncertainty) => {
          const shown = Number(figureWithin(value, uncertainty).replace("−", "-"));
          // two digits of the uncertainty: rounding is at most a twentieth of it, or half a unit where units are the last digit
          expect(Math.abs(shown - value)).toBeLessThanOrEqual(Math.max(uncertainty / 19, uncertainty >= 10 ? 0.5 : 0) + 1e-9);
        },
      ),
    );
  });
});
