import { describe, expect, it } from "vitest";
import { readingsThatCount } from "@/lib/inclining/readings-that-count";
import { attitudeUnder, shipAfloat, uprightOnEvenKeel, waterAtFlotation, waterlineAtZero } from "@/lib/inclining/ship-afloat";
import type { IncliningTestData } from "@/lib/inclining/test-data";
import type { TestReadings } from "@/lib/inclining/test-readings";
import { promised } from "@/lib/result";
import { sampleTest } from "./sample-test";

const withReadings = (changes: Partial<TestReadings>, plan: Partial<IncliningTestData> = {}) =>
  sampleTest({ readings: { ...sampleTest().readings, ...changes }, ...plan });
const afloatOf = (test: IncliningTestData) => shipAfloat(test, readingsThatCount(test));
const draft = (mark: string, value: number, id = mark) => ({ id, mark, round: "before" as const, value });

describe("ship afloat", () => {
  it("displaces volume times density: a box of 60 × 12 m at 2 m", () => {
    const { hydrostatics, waterline } = promised(afloatOf(sampleTest()));
    expect(hydrostatics).toMatchObject({ source: "offsets", lcb: expect.closeTo(30, 10), tcb: expect.closeTo(0, 12) });
    expect(hydrostatics.displacement).toBeCloseTo(1440, 9);
    expect(hydrostatics.kmt).toBeCloseTo(7, 12);
    expect(waterline.trim).toBeCloseTo(0, 12);
  });

  it("lies as the marks say", () => {
    const drafts = [draft("AP", 2.2), draft("AS", 2.44), draft("FP", 1.9), draft("FS", 2.14)];
    const afloat = promised(afloatOf(withReadings({ drafts })));
    expect(attitudeUnder(afloat.waterline)).toEqual({ trim: expect.closeTo(0.3, 12), tanHeel: expect.closeTo(0.02, 12), lbp: 60 });
    // on the centreline at the centre of flotation
    expect(waterAtFlotation(afloat)).toBeCloseTo(2.17, 9);
    expect(uprightOnEvenKeel(sampleTest())).toEqual({ trim: 0, tanHeel: 0, lbp: 60 });
  });

  it("takes several looks at one mark as their mean", () => {
    const drafts = [draft("AP", 2), draft("AS", 1.98, "1"), draft("AS", 2.02, "2"), draft("FP", 2), draft("FS", 2)];
    const test = withReadings({ drafts });
    const waterline = promised(waterlineAtZero(test, readingsThatCount(test)));
    expect(waterline.draftAft).toBeCloseTo(2, 12);
    expect(waterline.points.find(({ mark }) => mark === "AS")?.scatter).toBeCloseTo(0.02, 12);
  });

  it("lets a place that was sampled twice at one depth weigh no more", () => {
    const sample = (id: string, place: string, depth: number, density: number) => ({ id, place, depth, density });
    const water = [
      sample("1", "aft", 1, 1.02),
      sample("2", "aft", 1, 1.022),
      sample("3", "aft", 4, 1.025),
      sample("4", "forward", 1, 1.02),
    ];
    expect(promised(afloatOf(withReadings({ water }))).water.density).toBeCloseTo((1.023 + 1.02) / 2, 12);
  });

  it("goes by a table where there is one, which does not know the centre across", () => {
    const row = (draft: number) => ({
      trim: 0,
      draft,
      volume: 720 * draft,
      lcb: 30,
      vcb: draft / 2,
      lcf: 30,
      waterplaneArea: 720,
      kmt: draft / 2 + 12 / draft,
      kml: draft / 2 + 300 / draft,
    });
    const hydrostatics = { kind: "table" as const, rows: [row(1.5), row(2), row(2.5)] };
    const { hydrostatics: found } = promised(afloatOf(sampleTest({ hydrostatics })));
    expect(found).toMatchObject({ source: "table", tcb: null });
    expect(found.displacement).toBeCloseTo(1440, 9);
    expect(found.kmt).toBeCloseTo(7, 12);
  });

  it("refuses missing marks and missing water at once, each with its place", () => {
    const refused = afloatOf(withReadings({ drafts: [draft("AP", 2)], water: [] }));
    expect(refused).toMatchObject({
      ok: false,
      refusal: {
        faults: [
          { type: "TooFewMarks", got: 1, path: "readings.drafts" },
          { type: "NoWaterSamples", path: "readings.water" },
        ],
      },
    });
  });

  it("refuses a mark or a hydrometer that the plan does not know, at the reading's place", () => {
    const drafts = [...sampleTest().readings.drafts, draft("ZZ", 2)];
    const water = [{ id: "1", place: "aft", depth: 1, density: 1, hydrometer: "H9" }];
    expect(afloatOf(withReadings({ drafts, water }))).toMatchObject({
      ok: false,
      refusal: {
        faults: [
          { type: "UnknownMark", mark: "ZZ", path: "readings.drafts[4]" },
          { type: "UnknownHydrometer", hydrometer: "H9", path: "readings.water[0]" },
        ],
      },
    });
  });

  it("refuses a waterline above the hydrostatics, and names them", () => {
    const row = (draft: number) => ({
      trim: 0,
      draft,
      volume: 720 * draft,
      lcb: 30,
      vcb: 1,
      lcf: 30,
      waterplaneArea: 720,
      kmt: 7,
      kml: 150,
    });
    const hydrostatics = { kind: "table" as const, rows: [row(1), row(1.5)] };
    expect(afloatOf(sampleTest({ hydrostatics }))).toMatchObject({
      ok: false,
      refusal: { faults: [{ type: "OutsideHydrostaticTable", value: expect.closeTo(2, 9), highest: 1.5, path: "hydrostatics" }] },
    });
  });
});
