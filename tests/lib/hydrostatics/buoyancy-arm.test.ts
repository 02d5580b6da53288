import { expect, test } from "vitest";
import { buoyancyArm } from "@/lib/hydrostatics/buoyancy-arm";
import { atDisplacementAndHeel } from "@/lib/hydrostatics/equilibrium";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { promised } from "@/lib/result";

const box = promised(
  hullFromOffsets({
    sections: [0, 60].map((x) => ({
      x,
      points: [
        [6, 0],
        [6, 5],
      ] as const,
    })),
  }),
);
/** Draft 2 m on even keel: BM = 12²/(12·2) = 6 m, z_B = 1 m. */
const held = { lbp: 60, volume: 60 * 12 * 2, lcg: 30, vcg: 3 };

test("is the wall-sided cubic on a box, to a micrometre between its nodes", () => {
  const arm = promised(buoyancyArm(box, held, -0.06, 0.06, 9));
  for (const c of [-0.055, -0.02, 0, 0.013, 0.049]) {
    expect(arm.at(c).arm).toBeCloseTo(7 * c + 3 * c ** 3, 6);
    expect(arm.at(c).slope).toBeCloseTo(7 + 9 * c ** 2, 4);
  }
});

test("goes on straight outside its range", () => {
  const arm = promised(buoyancyArm(box, held, -0.02, 0.02, 3));
  const end = arm.at(0.02);
  expect(arm.at(0.03).arm).toBeCloseTo(end.arm + 0.01 * end.slope, 12);
});

test("holds what the equilibrium gives between its nodes where a chine meets the water", () => {
  const chine = promised(
    hullFromOffsets({
      sections: [0, 60].map((x) => ({
        x,
        points: [
          [3, 0],
          [5, 2.1],
          [6, 5],
        ] as const,
      })),
    }),
  );
  const volume = 60 * 2 * 7.9;
  const arm = promised(buoyancyArm(chine, { ...held, volume }, -0.06, 0.06, 9));
  for (const c of [-0.051, -0.037, 0.021, 0.0283, 0.044]) {
    const { tcb, vcb } = promised(atDisplacementAndHeel(chine, { ...held, volume, tanHeel: c })).hydrostatics;
    expect(Math.abs(arm.at(c).arm - (tcb + c * vcb))).toBeLessThan(1e-4);
  }
});

test("refuses what the hull can't carry", () => {
  expect(buoyancyArm(box, { ...held, volume: 1e5 }, -0.05, 0.05, 3).ok).toBe(false);
});
