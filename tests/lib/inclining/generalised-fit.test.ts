import { describe, expect, test } from "vitest";
import type { BuoyancyArm } from "@/lib/hydrostatics/buoyancy-arm";
import { generalisedVcg, heelAtRest } from "@/lib/inclining/generalised-fit";
import { promised } from "@/lib/result";

/** Upright sides: f = (BM + z₀)·c + ½·BM·c³ exactly. */
const bm = 5.8;
const z0 = 1;
const wallSided: BuoyancyArm = {
  from: -0.2,
  to: 0.2,
  nodes: [],
  at: (tanHeel) => ({ tanHeel, arm: (bm + z0) * tanHeel + (bm / 2) * tanHeel ** 3, slope: bm + z0 + 1.5 * bm * tanHeel ** 2 }),
};
const moments = [0, 48, 96, 48, 0, -48, -96, -48, 0];
const vcg = 3.7;
const displacement = 1500;

function heels(tanHeelAtZero: number): number[] {
  const tcg = wallSided.at(tanHeelAtZero).arm - vcg * tanHeelAtZero;
  return moments.map((moment) => heelAtRest(wallSided, vcg, tcg + moment / displacement, tanHeelAtZero) ?? Number.NaN);
}

describe.each([0, 0.02, -0.03])("at a list of %f", (tanHeelAtZero) => {
  const ship = { arm: wallSided, displacement, tanHeelAtZero };
  const series = (zero: number, factor = 1) =>
    heels(tanHeelAtZero).map((tan, k) => ({ moment: moments[k] ?? 0, tan: factor * tan + zero }));

  test("the heels come from the cubic that upright sides give", () => {
    for (const [k, tan] of heels(tanHeelAtZero).entries()) {
      const left = wallSided.at(tan).arm - wallSided.at(tanHeelAtZero).arm - vcg * (tan - tanHeelAtZero);
      expect(left).toBeCloseTo((moments[k] ?? 0) / displacement, 13);
    }
  });

  test("KG is found to a micrometre, whatever the zeros of the battens and wherever the search begins", () => {
    for (const start of [3.5, 3.7, 3.95]) {
      expect(promised(generalisedVcg(ship, [series(0.3), series(-0.1)], start))).toBeCloseTo(vcg, 6);
    }
  });

  test("a ship that heels more for the same moments has a higher KG", () => {
    expect(promised(generalisedVcg(ship, [series(0, 1.01)], vcg))).toBeGreaterThan(vcg + 0.02);
  });
});

test("refuses a KG above the metacentre", () => {
  const ship = { arm: wallSided, displacement, tanHeelAtZero: 0 };
  const steep = moments.map((moment) => ({ moment, tan: 0.01 * moment }));
  expect(generalisedVcg(ship, [steep], 6.9)).toMatchObject({ ok: false, refusal: { type: "NoRestAtMove" } });
});
