import { describe, expect, it } from "vitest";
import { gaussLegendre } from "@/lib/numerics/gauss";

describe("Gauss–Legendre rule", () => {
  // Source: Abramowitz & Stegun, Handbook of Mathematical Functions, table 25.4 (from memory), on −1 to 1
  it("has the tabled nodes and weights of four points", () => {
    const { nodes, weights } = gaussLegendre(4);
    expect(2 * (nodes[3] as number) - 1).toBeCloseTo(0.8611363115940526, 15);
    expect(2 * (nodes[2] as number) - 1).toBeCloseTo(0.3399810435848563, 15);
    expect(2 * (weights[3] as number)).toBeCloseTo(0.3478548451374538, 15);
    expect(2 * (weights[2] as number)).toBeCloseTo(0.6521451548625461, 15);
  });

  it.each([1, 2, 3, 4, 5, 8, 16])("of %i points is exact up to its degree", (count) => {
    const { nodes, weights } = gaussLegendre(count);
    for (let degree = 0; degree < 2 * count; degree++) {
      const integral = nodes.reduce((total, node, i) => total + (weights[i] as number) * node ** degree, 0);
      expect(integral).toBeCloseTo(1 / (degree + 1), 14);
    }
  });

  it("takes a rule of no points for a broken promise", () => {
    expect(() => gaussLegendre(0)).toThrow(RangeError);
  });
});
