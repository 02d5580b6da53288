import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type ClassicalTerm, classicalTerm } from "@/lib/inclining/classical-relation";
import { promised } from "@/lib/result";

describe("classical relation", () => {
  const whole = { gmFluid: 1, displacement: 1000, weight: 5, distance: 8, tanHeel: 0.04, deflection: 0.16, length: 4 };

  it.each(Object.keys(whole) as ClassicalTerm[])("gives the %s of a shift of 40 t·m on 1000 t with GM 1 m", (wanted) => {
    expect(promised(classicalTerm(wanted, { ...whole, [wanted]: undefined }))).toBeCloseTo(whole[wanted], 12);
  });

  it.each(["gmFluid", "displacement", "weight", "distance"] as const)("gives the %s from deflection and length too", (wanted) => {
    expect(promised(classicalTerm(wanted, { ...whole, tanHeel: undefined, [wanted]: undefined }))).toBeCloseTo(whole[wanted], 12);
  });

  it("predicts a deflection before anybody steps aboard", () => {
    expect(promised(classicalTerm("deflection", { gmFluid: 1, displacement: 1000, weight: 5, distance: 8, length: 4 }))).toBeCloseTo(
      0.16,
      12,
    );
    expect(promised(classicalTerm("length", { gmFluid: 1, displacement: 1000, weight: 5, distance: 8, deflection: 0.16 }))).toBeCloseTo(
      4,
      12,
    );
  });

  it("closes for any terms", () => {
    const term = fc.double({ min: 0.01, max: 1e4, noNaN: true });
    fc.assert(
      fc.property(term, term, term, term, (displacement, weight, distance, tanHeel) => {
        const gmFluid = promised(classicalTerm("gmFluid", { displacement, weight, distance, tanHeel }));
        const back = promised(classicalTerm("distance", { displacement, weight, gmFluid, tanHeel }));
        expect(back / distance).toBeCloseTo(1, 12);
      }),
    );
  });

  it("refuses what is missing and what would divide by zero, by name", () => {
    expect(classicalTerm("gmFluid", { weight: 5, distance: 8, tanHeel: 0.04 })).toEqual({
      ok: false,
      refusal: { type: "TermsMissing", wanted: "gmFluid", missing: ["displacement"] },
    });
    expect(classicalTerm("gmFluid", { displacement: 1000, weight: 5, distance: 8, deflection: 0, length: 4 })).toEqual({
      ok: false,
      refusal: { type: "TermIsZero", wanted: "gmFluid", zero: ["deflection"] },
    });
    expect(classicalTerm("tanHeel", { deflection: 0.1, length: 0 })).toMatchObject({ ok: false, refusal: { zero: ["length"] } });
  });
});
