import { describe, expect, it } from "vitest";
import { type Waterplane, waterplaneHeight } from "@/lib/frame";
import type { HydrostaticRow } from "@/lib/hydrostatics/hydrostatic-row";
import { tableHydrostatics } from "@/lib/hydrostatics/hydrostatic-table";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { type Waterline, waterlineFromMarks } from "@/lib/hydrostatics/waterline";
import { promised } from "@/lib/result";
import { hullOf, prismOffsets } from "../../lib/hydrostatics/sample-hulls";
import { planeAt } from "../../lib/hydrostatics/sample-planes";

describe("drafts of published surveys", () => {
  /** Source: sevensurveyor.com/draft-survey-specimen-of-calculation/; its working prints "11.16 + 10.19" but adds 11.16 + 11.19. */
  it("six marks: means forward 10.80, midships 10.965, aft 11.175 m, trim between the marks 0.375 m", () => {
    const found = promised(
      waterlineFromMarks({
        lbp: 179,
        draftMarks: pairsAt({ F: 179 - 1.7, M: 179 / 2, A: 9.45 }),
        drafts: readings({ FP: 10.79, FS: 10.81, MP: 10.9, MS: 11.03, AP: 11.16, AS: 11.19 }),
      }),
    );
    const meanAt = (x: number) => waterplaneHeight(found.plane, x, 0);
    expect(meanAt(179 - 1.7)).toBeCloseTo(10.8, 11);
    expect(meanAt(179 / 2)).toBeCloseTo(10.965, 11);
    expect(meanAt(9.45)).toBeCloseTo(11.175, 11);
    expect(meanAt(9.45) - meanAt(179 - 1.7)).toBeCloseTo(0.375, 11);
    expect(found.sagFitted).toBe(true);
  });

  /**
   * Source: sevensurveyor.com/basic-calculation-for-surveyor-part: length 150 m, marks 0.8 m abaft the forward and 4.5 m
   * forward of the aft perpendicular, 144.7 m between them, trim 2.05 m used; the aft draft here is the one that gives it.
   */
  it("drafts carried to the perpendiculars: 5.4 m forward becomes 5.3887 m", () => {
    const found = surveyOf({ lbp: 150, aft: 4.5, forward: 0.8, draftForward: 5.4, trim: 2.05 });
    expect(Math.abs(found.draftForward - 5.4 - -0.0113)).toBeLessThan(6e-5);
    expect(Math.abs(found.draftForward - 5.3887)).toBeLessThan(6e-5);
    const half = waterplaneHeight(found.plane, 75.5, 0) - waterplaneHeight(found.plane, 75, 0);
    expect(Math.abs(half - -0.0071)).toBeLessThan(6e-5);
  });

  /** Source: geludug.com/2013/04/ships-draft-survey-calculation.html: 128 m between marks, 7.1 m and 1.21 m off, trim 1.75 m. */
  it("drafts carried to the perpendiculars: 0.0971 m aft and 0.0165 m forward", () => {
    const found = surveyOf({ lbp: 128 + 7.1 + 1.21, aft: 7.1, forward: 1.21, draftForward: 4, trim: 1.75 });
    expect(Math.abs(found.draftAft - 5.75 - 0.0971)).toBeLessThan(6e-5);
    expect(Math.abs(4 - found.draftForward - 0.0165)).toBeLessThan(6e-5);
  });
});

describe("trim corrections of published surveys", () => {
  /** Source: transheldrake.com/www/Load_Surveys.html: trim 3.5 m by the stern, 30 t/cm, flotation 2 m forward, length 170 m. */
  it("first correction, metric: −123.529 t", () => {
    const [lbp, lcf] = [170, 85 + 2];
    const found = promised(tableHydrostatics({ rows: uprightSided(3000, lcf, lbp, [8, 9, 10]) }, trimmed(planeAt(9, lbp), 3.5)));
    expect(found.volume - 3000 * 9).toBeCloseTo(-123.529, 3);
    expect(found.trimVolume).toBeCloseTo(0, 9);
  });

  /** Source: the same page: trim 4 ft 10 in by the stern, 109.5 long tons/in, flotation 10.4 ft abaft midships, length 709.25 ft. */
  it("first correction, feet and long tons: 93.12711", () => {
    const [lbp, perFoot] = [709.25, 109.5 * 12];
    const lcf = lbp / 2 - 10.4;
    const found = promised(
      tableHydrostatics({ rows: uprightSided(perFoot, lcf, lbp, [28, 30, 32]) }, trimmed(planeAt(30, lbp), 4 + 10 / 12)),
    );
    expect(found.volume - perFoot * 30).toBeCloseTo(93.12711, 4);
  });

  /** Source: closed form of a wedge with its edge down, standard theory (from memory): L·t²/12·½·dB/dT, in water of 1.025 t/m³. */
  it("second correction of a wedge 100 m long at 5 m, 2 m of trim: 34.167 t, whether by table or by its offsets", () => {
    const wedge = [1, 2, 3, 4, 5, 6, 7, 8].map((draft) => wedgeRow(100, draft));
    const waterline = trimmed(planeAt(5, 100), 2);
    const table = promised(tableHydrostatics({ rows: wedge }, waterline));
    expect(1.025 * (table.volume - (table.trimVolume as number))).toBeCloseTo(2562.5, 6);
    expect(1.025 * (table.trimVolume as number)).toBeCloseTo(34.166666666666664, 6);
    const hull = hullOf(
      prismOffsets(100, [
        [0, 0],
        [9, 9],
      ]),
    );
    expect(1.025 * promised(hydrostaticsAt(hull, waterline.plane)).volume).toBeCloseTo(2596.6666666666665, 6);
  });
});

function pairsAt(places: Readonly<Record<string, number>>) {
  return Object.entries(places).flatMap(([name, x]) => [
    { id: `${name}P`, x, y: -14, zero: 0 },
    { id: `${name}S`, x, y: 14, zero: 0 },
  ]);
}

function readings(values: Readonly<Record<string, number>>) {
  return Object.entries(values).map(([mark, value]) => ({ mark, value }));
}

// marks in pairs at the ends only: a straight line between them
function surveyOf(ship: { lbp: number; aft: number; forward: number; draftForward: number; trim: number }): Waterline {
  const { draftForward, trim } = ship;
  return promised(
    waterlineFromMarks({
      lbp: ship.lbp,
      draftMarks: pairsAt({ A: ship.aft, F: ship.lbp - ship.forward }),
      drafts: readings({ AP: draftForward + trim, AS: draftForward + trim, FP: draftForward, FS: draftForward }),
    }),
  );
}

function trimmed(plane: Waterplane, trim: number): Waterline {
  const draftMarks = pairsAt({ A: 0, F: plane.lbp });
  const [aft, forward] = [plane.draftAtAp + trim / 2, plane.draftAtAp - trim / 2];
  return promised(waterlineFromMarks({ lbp: plane.lbp, draftMarks, drafts: readings({ AP: aft, AS: aft, FP: forward, FS: forward }) }));
}

// volume grows evenly with draft, and the longitudinal second moment does not
function uprightSided(area: number, lcf: number, lbp: number, drafts: readonly number[]): HydrostaticRow[] {
  return drafts.map((draft) => {
    const vcb = draft / 2;
    const kml = vcb + (area * lbp ** 2) / 12 / (area * draft);
    return { trim: 0, draft, volume: area * draft, lcb: lcf, vcb, lcf, waterplaneArea: area, kmt: vcb + 5, kml };
  });
}

function wedgeRow(length: number, draft: number): HydrostaticRow {
  const [area, volume, vcb] = [2 * draft * length, draft ** 2 * length, (2 / 3) * draft];
  const kml = vcb + (area * length ** 2) / 12 / volume;
  return { trim: 0, draft, volume, lcb: 50, vcb, lcf: 50, waterplaneArea: area, kmt: vcb + (2 / 3) * draft, kml };
}
