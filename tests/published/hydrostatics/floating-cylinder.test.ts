import { expect, it } from "vitest";
import { equilibrium } from "@/lib/hydrostatics/equilibrium";
import type { OffsetSection } from "@/lib/hydrostatics/hull";
import { promised } from "@/lib/result";
import { hullOf } from "../../lib/hydrostatics/sample-hulls";

/** Source: civinnovate.com/2025/02/06/a-solid-cylinder-of-diameter-3m-3mn/; draft 1.4 m, GM 0.1017 m printed, truncated from 0.101786. */
it("an upright cylinder 3 m across and 2 m high, of specific gravity 0.7, floats at 1.4 m with a GM of 0.1018 m", () => {
  const hull = hullOf({ sections: Array.from({ length: 401 }, (_, i) => sectionOfCylinder((Math.PI * i) / 400)) });
  const displacement = 0.7 * 2 * Math.PI * 1.5 ** 2;
  const rest = promised(equilibrium(hull, { displacement, lcg: 1.5, tcg: 0, vcg: 1 }, { density: 1, lbp: 3 }));
  // the 800-sided prism has 1e-5 less area than the circle
  expect(rest.plane.draftAtAp).toBeCloseTo(1.4, 4);
  expect(rest.hydrostatics.kmt - 1).toBeCloseTo(0.101786, 4);
  expect(Math.abs(rest.hydrostatics.kmt - 1 - 0.1017)).toBeLessThan(0.00015);
});

function sectionOfCylinder(angle: number): OffsetSection {
  const halfBreadth = Math.max(0, 1.5 * Math.sin(angle));
  return {
    x: 1.5 - 1.5 * Math.cos(angle),
    points: [
      [0, 0],
      [halfBreadth, 0],
      [halfBreadth, 2],
    ],
  };
}
