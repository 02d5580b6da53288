import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { draftAt, freeboardAt, waterlineFromMarks } from "@/lib/hydrostatics/waterline";
import { promised } from "@/lib/result";
import { readingsAt, sixMarks } from "./sample-marks";
import { planeAt } from "./sample-planes";

const lbp = 60;
const marks = { lbp, draftMarks: sixMarks };
const plane = planeAt(2.2, lbp, { slopeAlong: -0.004, tanHeel: 0.01, sag: 0.03 });

describe("waterline from marks", () => {
  it("gives back the waterplane that the marks stand on", () => {
    const found = promised(waterlineFromMarks({ ...marks, drafts: readingsAt(plane) }));
    expect(found.plane.draftAtAp).toBeCloseTo(2.2, 13);
    expect(found.plane.slopeAlong).toBeCloseTo(-0.004, 14);
    expect(found.plane.tanHeel).toBeCloseTo(0.01, 14);
    expect(found.plane.sag).toBeCloseTo(0.03, 13);
    expect(found).toMatchObject({ sagFitted: true, marks: 6, degreesOfFreedom: 2 });
    for (const residual of Object.values(found.residuals)) expect(residual).toBeCloseTo(0, 13);
  });

  it("states drafts at the perpendiculars and at half length, with the sag, and trim and heel", () => {
    const found = promised(waterlineFromMarks({ ...marks, drafts: readingsAt(plane) }));
    expect(found.draftAft).toBeCloseTo(2.2, 12);
    expect(found.draftForward).toBeCloseTo(2.2 - 0.24, 12);
    expect(found.draftMidships).toBeCloseTo(2.2 - 0.12 + 0.03, 12);
    expect(found.trim).toBeCloseTo(0.24, 12);
    expect(found.heelDegrees).toBeCloseTo((Math.atan(0.01) * 180) / Math.PI, 11);
  });

  it("counts residuals as measured minus fitted", () => {
    const drafts = readingsAt(plane).map((reading) => (reading.mark === "MS" ? { ...reading, value: reading.value + 0.06 } : reading));
    const found = promised(waterlineFromMarks({ ...marks, drafts }));
    expect(found.residuals.MS).toBeGreaterThan(0);
    expect(found.residuals.MP).toBeLessThan(0);
    expect(found.residualDeviation).toBeGreaterThan(0.005);
  });

  it("takes freeboards together with drafts", () => {
    const freeboardMarks = [10, 45].map((x) => ({ id: `F${x}`, x, y: 6, deckEdge: 5 }));
    const freeboards = freeboardMarks.map(({ id, x, y, deckEdge }) => ({ mark: id, value: freeboardAt(plane, { x, y, z: deckEdge }) }));
    const found = promised(waterlineFromMarks({ ...marks, freeboardMarks, drafts: readingsAt(plane), freeboards }));
    expect(found.marks).toBe(8);
    expect(found.plane.sag).toBeCloseTo(0.03, 13);
    expect(found.residuals.F45).toBeCloseTo(0, 13);
  });

  it("leaves the sag out without a mark in the middle third, and says so", () => {
    const ends = sixMarks.filter(({ x }) => x !== 31);
    const found = promised(waterlineFromMarks({ lbp, draftMarks: ends, drafts: readingsAt(planeAt(2, lbp, { tanHeel: 0.01 }), ends) }));
    expect(found.sagFitted).toBe(false);
    expect(found.plane.sag).toBe(0);
    expect(found.covariance[3]).toEqual([0, 0, 0, 0]);
  });

  it("leaves the sag out where the marks span less than half the length", () => {
    const near = sixMarks.map((mark) => ({ ...mark, x: 30 + (mark.x - 30) / 2.2 }));
    expect(promised(waterlineFromMarks({ lbp, draftMarks: near, drafts: readingsAt(plane, near) })).sagFitted).toBe(false);
  });

  it("leaves the sag out where marks at two lengths can't tell it from trim", () => {
    const twoLengths = sixMarks.filter(({ x }) => x !== 57);
    const level = planeAt(2, lbp, { slopeAlong: -0.002, tanHeel: 0.01 });
    const found = promised(waterlineFromMarks({ lbp, draftMarks: twoLengths, drafts: readingsAt(level, twoLengths) }));
    expect(found.sagFitted).toBe(false);
    expect(found.plane.slopeAlong).toBeCloseTo(-0.002, 13);
  });

  it("has no residual deviation where the marks just suffice", () => {
    const three = [sixMarks[0], sixMarks[1], sixMarks[4]] as typeof sixMarks;
    const found = promised(waterlineFromMarks({ lbp, draftMarks: three, drafts: readingsAt(planeAt(2, lbp), three) }));
    expect(found).toMatchObject({ degreesOfFreedom: 0, residualDeviation: null });
  });

  it("has the covariance of its own scatter", () => {
    // four marks at the corners: u(c)² = 1/Σy²
    const corners = [0, 60].flatMap((x) => [-5, 5].map((y) => ({ id: `${x}${y}`, x, y, zero: 0 })));
    const found = promised(waterlineFromMarks({ lbp, draftMarks: corners, drafts: readingsAt(planeAt(2, lbp), corners) }));
    expect(found.covariance[2]?.[2]).toBeCloseTo(1 / 100, 15);
    expect(found.covariance[1]?.[1]).toBeCloseTo(1 / 3600, 15);
  });

  it("mirrors, and does not care in which order the marks are read", () => {
    const noise = fc.array(fc.double({ min: -0.02, max: 0.02, noNaN: true }), { minLength: 6, maxLength: 6 });
    fc.assert(
      fc.property(noise, (errors) => {
        const drafts = readingsAt(plane).map((reading, i) => ({ ...reading, value: reading.value + (errors[i] as number) }));
        const here = promised(waterlineFromMarks({ ...marks, drafts }));
        const shuffled = promised(waterlineFromMarks({ ...marks, drafts: drafts.toReversed() }));
        const mirrored = promised(waterlineFromMarks({ lbp, draftMarks: sixMarks.map((mark) => ({ ...mark, y: -mark.y })), drafts }));
        expect(shuffled.plane.tanHeel).toBeCloseTo(here.plane.tanHeel, 13);
        expect(shuffled.draftMidships).toBeCloseTo(here.draftMidships, 13);
        expect(mirrored.plane.tanHeel + here.plane.tanHeel).toBe(0);
        expect(mirrored.plane.draftAtAp).toBe(here.plane.draftAtAp);
      }),
    );
  });

  it("refuses two marks", () => {
    const refused = waterlineFromMarks({ ...marks, drafts: readingsAt(plane).slice(0, 2) });
    expect(refused).toEqual({ ok: false, refusal: { type: "TooFewMarks", got: 2, needed: 3 } });
  });

  it("refuses marks at one breadth: nothing tells the heel", () => {
    const centreline = sixMarks.map((mark) => ({ ...mark, y: 0 }));
    const refused = waterlineFromMarks({ lbp, draftMarks: centreline, drafts: readingsAt(plane, centreline) });
    expect(refused).toEqual({ ok: false, refusal: { type: "MarksAtOneBreadth", y: 0, marks: 6 } });
  });

  it("refuses marks at one length: nothing tells the trim", () => {
    const midships = [-6, 0, 6].map((y) => ({ id: `${y}`, x: 30, y, zero: 0 }));
    const refused = waterlineFromMarks({ lbp, draftMarks: midships, drafts: readingsAt(plane, midships) });
    expect(refused).toEqual({ ok: false, refusal: { type: "MarksAtOneLength", x: 30, marks: 3 } });
  });

  it("refuses marks in one slanting line", () => {
    const slanting = [0, 30, 60].map((x) => ({ id: `${x}`, x, y: x / 10, zero: 0 }));
    const refused = waterlineFromMarks({ lbp, draftMarks: slanting, drafts: readingsAt(plane, slanting) });
    expect(refused).toEqual({ ok: false, refusal: { type: "MarksInOneLine", marks: 3 } });
  });
});

describe("draft and freeboard of a waterplane", () => {
  it("are its height on the centreline, and what stands out of it", () => {
    expect(draftAt(plane, 30)).toBeCloseTo(2.11, 13);
    expect(freeboardAt(plane, { x: 30, y: -6, z: 5 })).toBeCloseTo(5 - 2.11 + 0.06, 13);
  });
});
