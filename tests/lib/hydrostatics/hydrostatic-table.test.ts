import { describe, expect, it, test } from "vitest";
import { skerryTern } from "@/db/seed/skerry-tern";
import type { Waterplane } from "@/lib/frame";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { type HydrostaticTable, tableHydrostatics } from "@/lib/hydrostatics/hydrostatic-table";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { type Waterline, waterlineFromMarks } from "@/lib/hydrostatics/waterline";
import { promised } from "@/lib/result";
import { boxOffsets, hullOf, wigleyOffsets } from "./sample-hulls";
import { readingsAt, sixMarks } from "./sample-marks";
import { planeAt } from "./sample-planes";
import { tableOf } from "./sample-tables";

const lbp = 60;
const box = hullOf(boxOffsets(lbp, 12, 5));
const fineDrafts = Array.from({ length: 61 }, (_, i) => 1 + i * 0.05);
const boxTable = tableOf(box, lbp, fineDrafts);

describe("hydrostatics from a table", () => {
  it("are a row's own at its draft, upright and level", () => {
    const found = promised(tableHydrostatics(boxTable, at(planeAt(2, lbp))));
    expect(found).toMatchObject({ draft: expect.closeTo(2, 12), volume: expect.closeTo(1440, 9), trimVolume: expect.closeTo(0, 12) });
    expect(found.kmt).toBeCloseTo(7, 9);
    expect(found.bml).toBeCloseTo(150, 8);
  });

  it("agree with the hull itself at trim and list, on a box", () => {
    const plane = planeAt(2.2, lbp, { slopeAlong: -0.005, tanHeel: 0.025 });
    const found = promised(tableHydrostatics(boxTable, at(plane)));
    const hull = promised(hydrostaticsAt(box, plane));
    expect(found.volume).toBeCloseTo(hull.volume, 6);
    // kmt is curved in draft: rows 5 cm apart leave half a millimetre between them
    expect(found.kmt).toBeCloseTo(hull.kmt, 3);
    expect(found.vcb).toBeCloseTo(hull.vcb, 5);
    expect(found.lcb).toBeCloseTo(hull.lcb, 3);
  });

  it("agree with the hull itself at trim, on a fine form, by the corrections of one trim", () => {
    const hull = hullOf(wigleyOffsets(lbp, 9, 4, 6, 24, 16));
    const plane = planeAt(2.8, lbp, { slopeAlong: -0.008 });
    const found = promised(tableHydrostatics(tableOf(hull, lbp, fineDrafts), at(plane)));
    const exact = promised(hydrostaticsAt(hull, plane));
    // trim of 0.48 m: without the second correction volume would be 4e-4 off, what is left is of fourth order
    expect(found.volume / exact.volume).toBeCloseTo(1, 4);
    expect(found.lcb).toBeCloseTo(exact.lcb, 2);
    expect(found.vcb).toBeCloseTo(exact.vcb, 3);
  });

  it("are linear between several trims, without corrections", () => {
    const table = tableOf(box, lbp, fineDrafts, [-0.5, 0, 0.5]);
    const plane = planeAt(2.1, lbp, { slopeAlong: -0.25 / lbp });
    const found = promised(tableHydrostatics(table, at(plane)));
    expect(found.trimVolume).toBeNull();
    expect(found.volume).toBeCloseTo(720 * (2.1 - 0.125), 6);
    expect(found.lcb).toBeCloseTo(promised(hydrostaticsAt(box, plane)).lcb, 3);
  });

  it("enter with three quarters of the sag, or the table's own share", () => {
    const sagging = at(planeAt(2, lbp, { sag: 0.04 }));
    expect(promised(tableHydrostatics(boxTable, sagging)).draft).toBeCloseTo(2.03, 12);
    expect(promised(tableHydrostatics({ ...boxTable, sagFraction: 0.5 }, sagging)).draft).toBeCloseTo(2.02, 12);
  });

  it("mirror", () => {
    const starboard = promised(tableHydrostatics(boxTable, at(planeAt(2, lbp, { tanHeel: 0.02 }))));
    const port = promised(tableHydrostatics(boxTable, at(planeAt(2, lbp, { tanHeel: -0.02 }))));
    // both waterlines come from a fit of their own
    expect(port.kmt).toBeCloseTo(starboard.kmt, 12);
  });

  it("refuse a draft outside the table, with its limits", () => {
    expect(tableHydrostatics(boxTable, at(planeAt(4.5, lbp)))).toEqual({
      ok: false,
      refusal: { type: "OutsideHydrostaticTable", quantity: "draft", value: expect.closeTo(4.5, 12), lowest: 1, highest: 4 },
    });
  });

  it("refuse a trim outside the table's trims", () => {
    const table = tableOf(box, lbp, fineDrafts, [0, 0.5]);
    expect(tableHydrostatics(table, at(planeAt(2, lbp, { slopeAlong: 0.1 / lbp })))).toEqual({
      ok: false,
      refusal: { type: "OutsideHydrostaticTable", quantity: "trim", value: expect.closeTo(-0.1, 12), lowest: 0, highest: 0.5 },
    });
  });

  it("refuse two rows at one draft and trim, and a table without rows", () => {
    const rows = [...boxTable.rows, ...boxTable.rows.slice(3, 4)];
    expect(tableHydrostatics({ rows }, at(planeAt(2, lbp)))).toMatchObject({ ok: false, refusal: { type: "RepeatedDraft", trim: 0 } });
    expect(tableHydrostatics({ rows: [] }, at(planeAt(2, lbp)))).toEqual({
      ok: false,
      refusal: { type: "EmptyHydrostaticTable", rows: 0 },
    });
  });
});

function at(plane: Waterplane): Waterline {
  return promised(waterlineFromMarks({ lbp, draftMarks: sixMarks, drafts: readingsAt(plane) }));
}

/** The demo's ship: flare, a transom that dips, a rising forefoot. */
describe("a table of a ship's own hull against her offsets", () => {
  const { record } = skerryTern();
  const ship = promised(hullFromOffsets(record.hydrostatics.kind === "offsets" ? record.hydrostatics : { sections: [] }));
  const { lbp: length } = record.vessel;
  const keys = ["volume", "lcb", "vcb", "lcf", "waterplaneArea", "kmt", "kml"] as const;
  const drafts = (step: number) => Array.from({ length: Math.round(1.6 / step) + 1 }, (_, i) => 2.4 + step * i);
  const trims = (step: number) => Array.from({ length: Math.round(2 / step) + 1 }, (_, i) => -1 + step * i);
  // amidships, between the lines of every table below
  const lies = [2.83, 3.17, 3.61].flatMap((draft) => [-0.83, 0.29, 0.71].map((trim) => ({ draft, trim })));
  const planeOf = ({ draft, trim }: { draft: number; trim: number }) => planeAt(draft + trim / 2, length, { slopeAlong: -trim / length });

  test("with several trims it is off by what linear interpolation is, and a table twice as close by a quarter of it", () => {
    const [wide, close] = [0.2, 0.1].map((step) => tableOf(ship, length, drafts(step), trims(2.5 * step)));
    for (const key of keys) {
      const [far, near] = [wide, close].map((table) => Math.max(...lies.map((lie) => offBy(key, table, lie))));
      expect(far, key).toBeLessThanOrEqual(spacingExplains(key, 0.2, 0.5));
      expect(near, key).toBeLessThanOrEqual(spacingExplains(key, 0.1, 0.25));
    }
  });

  test("with one trim and the corrections for it the volume is off by terms of third order in trim only", () => {
    const table = tableOf(ship, length, drafts(0.05));
    const worst = (trim: number) => Math.max(...[2.83, 3.17, 3.61].map((draft) => offBy("volume", table, { draft, trim }) / 1450));
    expect(worst(0.5)).toBeLessThan(worst(1) / 4 + 2e-5);
    expect(worst(0.5)).toBeLessThan(2e-4);
  });

  function offBy(key: (typeof keys)[number], table: HydrostaticTable | undefined, lie: { draft: number; trim: number }): number {
    const plane = planeOf(lie);
    const found = promised(tableHydrostatics(table ?? { rows: [] }, { plane }));
    return Math.abs(found[key] - promised(hydrostaticsAt(ship, plane))[key]);
  }

  /** Of a linear interpolation the error is at most h²/8·|f″| in each direction; f″ by differences over the hull itself, half as wide. */
  function spacingExplains(key: (typeof keys)[number], step: number, stepOfTrim: number): number {
    const f = (draft: number, trim: number) => promised(hydrostaticsAt(ship, planeOf({ draft, trim })))[key];
    const bends = drafts(0.1)
      .slice(1, -1)
      .flatMap((draft) =>
        [-0.75, -0.5, -0.25, 0, 0.25, 0.5, 0.75].map((trim) => {
          const here = f(draft, trim);
          const inDraft = Math.abs(f(draft + 0.05, trim) - 2 * here + f(draft - 0.05, trim)) / 0.05 ** 2;
          const inTrim = Math.abs(f(draft, trim + 0.125) - 2 * here + f(draft, trim - 0.125)) / 0.125 ** 2;
          return (inDraft * step ** 2 + inTrim * stepOfTrim ** 2) / 8;
        }),
      );
    return Math.max(...bends);
  }
});
