import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { studentT, studentTTail, studentTTwoSided95 } from "@/lib/numerics/student-t";

describe("Student's t", () => {
  it("of one degree of freedom is the tangent", () => {
    for (const p of [0.6, 0.9, 0.975, 0.9995]) expect(studentT(p, 1) / Math.tan(Math.PI * (p - 0.5))).toBeCloseTo(1, 11);
  });

  it("of two degrees of freedom has a closed form", () => {
    const p = 0.975;
    expect(studentT(p, 2)).toBeCloseTo((2 * p - 1) / Math.sqrt(2 * p * (1 - p)), 11);
  });

  it("becomes the normal distribution", () => {
    // 1.959964 is the normal's; the next term of the expansion is (z³ + z)/(4·dof)
    expect(studentTTwoSided95(1e7)).toBeCloseTo(1.959963985, 6);
  });

  it("gives its probability back, with opposite signs on both sides of the middle", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.001, max: 0.999, noNaN: true }), fc.double({ min: 0.5, max: 300, noNaN: true }), (p, dof) => {
        expect(1 - studentTTail(studentT(p, dof), dof)).toBeCloseTo(p, 10);
        expect(studentT(p, dof) + studentT(1 - p, dof)).toBeCloseTo(0, 7);
      }),
    );
    expect(studentT(0.5, 3)).toBe(0);
  });

  it("takes a probability or degrees of freedom that can't be for a broken promise", () => {
    expect(() => studentT(1, 4)).toThrow(RangeError);
    expect(() => studentT(0.9, 0)).toThrow(RangeError);
  });
});
