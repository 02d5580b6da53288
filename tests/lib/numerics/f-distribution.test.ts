import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fCritical, fTail } from "@/lib/numerics/f-distribution";
import { studentTTail } from "@/lib/numerics/student-t";

const dofs = fc.integer({ min: 1, max: 60 });

describe("F", () => {
  it("of two degrees of freedom above has a closed form", () => {
    for (const f of [0.3, 1, 4.7, 30]) expect(fTail(f, 2, 8)).toBeCloseTo((1 + f / 4) ** -4, 13);
  });

  it("of one degree of freedom above is Student's t squared", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 40, noNaN: true }), dofs, (t, dof) => {
        expect(fTail(t * t, 1, dof)).toBeCloseTo(2 * studentTTail(t, dof), 12);
      }),
    );
  });

  it("turned over changes its degrees of freedom", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 50, noNaN: true }), dofs, dofs, (f, above, below) => {
        expect(fTail(f, above, below) + fTail(1 / f, below, above)).toBeCloseTo(1, 12);
      }),
    );
  });

  it("gives its probability back", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.001, max: 0.999, noNaN: true }), dofs, dofs, (tail, above, below) => {
        expect(fTail(fCritical(tail, above, below), above, below)).toBeCloseTo(tail, 9);
      }),
    );
  });

  it("takes what can't be for a broken promise", () => {
    expect(() => fTail(-1, 2, 3)).toThrow(RangeError);
    expect(() => fTail(1, 0, 3)).toThrow(RangeError);
    expect(() => fCritical(0, 2, 3)).toThrow(RangeError);
  });
});
