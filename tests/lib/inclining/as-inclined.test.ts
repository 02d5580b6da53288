import { describe, expect, it } from "vitest";
import { equilibrium } from "@/lib/hydrostatics/equilibrium";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { freeSurfaceCorrection, gmFluidAt, gmOfMove } from "@/lib/inclining/as-inclined";
import { incliningTest } from "@/lib/inclining/inclining-test";
import type { IncliningTestData } from "@/lib/inclining/test-data";
import { promised } from "@/lib/result";
import { battens, sampleMoments, sampleTest } from "./sample-test";

describe("ship as inclined", () => {
  it("has GM_fluid of 1/(β·Δ), and vcg below KMt by it", () => {
    const { asInclined } = promised(incliningTest(sampleTest()));
    expect(asInclined.displacement).toBeCloseTo(1440, 9);
    expect(asInclined.gmFluid).toBeCloseTo(5000 / 1440, 12);
    expect(asInclined.vcg).toBeCloseTo(7 - 5000 / 1440, 12);
    expect(asInclined.lcg).toBeCloseTo(30, 10);
    expect(asInclined.tcg).toBeCloseTo(0, 12);
  });

  it("adds Σ ρ·i/Δ for free surfaces", () => {
    const table = [0, 1, 2].map((level) => ({ level, volume: 10 * level, lcg: 30, tcg: 0, vcg: 1, inertia: level === 1 ? 144 : 0 }));
    const tanks = [{ id: "FW", density: 1, measure: "sounding" as const, table }];
    const soundings = [{ id: "1", tank: "FW", round: "before" as const, value: 1 }];
    const { asInclined } = promised(incliningTest(sampleTest({ tanks, readings: { ...sampleTest().readings, soundings } })));
    expect(asInclined.freeSurfaceCorrection).toBeCloseTo(0.1, 12);
    expect(asInclined.gmSolid).toBeCloseTo(5000 / 1440 + 0.1, 12);
    expect(asInclined.vcg).toBeCloseTo(7 - 5000 / 1440 - 0.1, 12);
    expect(freeSurfaceCorrection([], 1440)).toBe(0);
  });

  it("has G on the line of buoyancy of a trimmed and listed ship", () => {
    const rest = restOfBox({ displacement: 1440, lcg: 29.7, tcg: 0.05, vcg: 3.5 });
    const drafts = draftsUnder(rest.plane.draftAtAp, rest.plane.slopeAlong, rest.plane.tanHeel);
    const gm = rest.hydrostatics.kmt - 3.5;
    const straight = battens(sampleMoments.map((moment) => moment / (1440 * gm)));
    const { asInclined } = promised(incliningTest(sampleTest({ readings: { ...sampleTest().readings, drafts, battens: straight } })));
    expect(asInclined.vcg).toBeCloseTo(3.5, 9);
    expect(asInclined.lcg).toBeCloseTo(29.7, 8);
    expect(asInclined.tcg).toBeCloseTo(0.05, 8);
  });

  it("has by a table the tcg of c·GM_fluid", () => {
    const row = (draft: number) => ({
      trim: 0,
      draft,
      volume: 720 * draft,
      lcb: 30,
      vcb: draft / 2,
      lcf: 30,
      waterplaneArea: 720,
      kmt: draft / 2 + 12 / draft,
      kml: 151,
    });
    const hydrostatics = { kind: "table" as const, rows: [1.5, 2, 2.5].map(row) };
    const drafts = draftsUnder(2, 0, 0.02);
    const { asInclined } = promised(incliningTest(sampleTest({ hydrostatics, readings: { ...sampleTest().readings, drafts } })));
    expect(asInclined.tcg).toBeCloseTo(0.02 * asInclined.gmFluid, 12);
  });
});

describe("persons who were not aboard all the time", () => {
  const gang = { label: "boat's party", mass: 4, x: 30, y: 0, z: 6 };

  it("leave the ship as inclined at the draft round: she is found the same whether they left before the moves or stayed", () => {
    const ship = { displacement: 1440, lcg: 30, tcg: 0, vcg: 3.5 };
    const stayed = inclined({ aboard: [gang] }, slopeOf(ship));
    const without = { displacement: 1436, lcg: 30, tcg: 0, vcg: (1440 * 3.5 - 4 * 6) / 1436 };
    const left = inclined({ aboard: [{ ...gang, during: "drafts" }] }, slopeOf(without));
    // all that is left is the layer's own half thickness, m²/(2·ρA·Δ): 8 µm
    expect(stayed.vcg - left.vcg).toBeCloseTo(4 ** 2 / (2 * 720 * 1440), 10);
    expect(left.displacement).toBe(stayed.displacement);
  });

  it("and whether they came for the moves only", () => {
    const ship = { displacement: 1440, lcg: 30, tcg: 0, vcg: 3.5 };
    const nobody = inclined({}, slopeOf(ship));
    const withGang = { displacement: 1444, lcg: 30, tcg: 0, vcg: (1440 * 3.5 + 4 * 6) / 1444 };
    const came = inclined({ aboard: [{ ...gang, during: "moves" }] }, slopeOf(withGang));
    expect(nobody.vcg - came.vcg).toBeCloseTo(4 ** 2 / (2 * 720 * 1440), 10);
  });
});

describe("GM of a single move", () => {
  const { afloat, line } = promised(incliningTest(sampleTest()));

  it("is M/(Δ·tan), and left out below a tenth of the largest moment", () => {
    const [zero, first] = line.moves.map((move) => gmOfMove(afloat, line.moves, [], move));
    expect(zero).toBeNull();
    expect(first).toBeCloseTo(5000 / 1440, 12);
  });

  it("is known of the line before the drafts, at a displacement known otherwise", () => {
    expect(promised(gmFluidAt(1000, line))).toBeCloseTo(5, 12);
    expect(gmFluidAt(1000, { ...line, slope: -1 })).toEqual({ ok: false, refusal: { type: "HeelAgainstMoment", slope: -1 } });
  });
});

function inclined(plan: Partial<IncliningTestData>, slope: number) {
  const straight = battens(sampleMoments.map((moment) => moment * slope));
  return promised(incliningTest(sampleTest({ ...plan, readings: { ...sampleTest().readings, battens: straight } }))).asInclined;
}

// upright, a small moment heels by 1/(Δ·GM)
function slopeOf(ship: { displacement: number; lcg: number; tcg: number; vcg: number }): number {
  return 1 / (ship.displacement * (restOfBox(ship).hydrostatics.kmt - ship.vcg));
}

function restOfBox(weight: { displacement: number; lcg: number; tcg: number; vcg: number }) {
  const { hydrostatics } = sampleTest();
  if (hydrostatics.kind !== "offsets") throw new Error("the sample ship has offsets");
  return promised(equilibrium(promised(hullFromOffsets(hydrostatics)), weight, { density: 1, lbp: 60 }));
}

function draftsUnder(draftAtAp: number, slopeAlong: number, tanHeel: number) {
  return sampleTest().draftMarks.map(({ id, x, y }) => ({
    id,
    mark: id,
    round: "before" as const,
    value: draftAtAp + slopeAlong * x + tanHeel * y,
  }));
}
