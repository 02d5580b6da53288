import { describe, expect, it } from "vitest";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { recordFrom } from "@/lib/record/parse-record";
import { promised } from "@/lib/result";
import full from "./box-full.json";
import fullTruth from "./box-full.truth.json";
import plain from "./box-plain.json";
import plainTruth from "./box-plain.truth.json";

/**
 * Invented barges whose lightship is known; their readings come from strip integration and full equilibrium under each move,
 * a method unlike the one under test, and carry no noise.
 */
describe.each([
  { name: "a barge without liquids", document: plain, truth: plainTruth },
  { name: "a barge with a slack tank, a full tank, a list, persons and items", document: full, truth: fullTruth },
])("$name", ({ document, truth }) => {
  const result = promised(incliningResult(promised(recordFrom(document))));

  it("displaces what the simulated one does", () => {
    // drafts are given to the last digit and the hull is prismatic: only rounding is left
    expect(result.hydrostatics.displacement / truth.displacementAsInclined).toBeCloseTo(1, 12);
    expect(result.lightship.displacement / truth.lightship.displacement).toBeCloseTo(1, 12);
  });

  it("floats and has its centre of buoyancy where the simulated one has", () => {
    expect(result.waterline.draftAft).toBeCloseTo(truth.draftAP, 9);
    expect(result.waterline.draftForward).toBeCloseTo(truth.draftFP, 9);
    expect(result.hydrostatics.lcb).toBeCloseTo(truth.lcb, 9);
    expect(result.hydrostatics.tcb).toBeCloseTo(truth.tcb, 9);
    expect(result.hydrostatics.vcb).toBeCloseTo(truth.vcb, 9);
  });

  it("gives the moments and the classical GM of the simulated moves", () => {
    expect(result.fit.moves.map(({ moment }) => moment)).toEqual(truth.moments);
    expect(result.asInclined.gmFluid).toBeCloseTo(truth.gmFluidClassical, 9);
    for (const { no, tanHeel } of result.fit.moves) {
      expect(tanHeel).toBeCloseTo((truth.tanHeel[no] ?? 0) - (truth.tanHeel[0] ?? 0), 9);
    }
  });

  it("has the lightship's centre along and across", () => {
    // the liquid's second-order rise and its longitudinal surface, which the tank tables do not give, leave 0.2 mm along
    expect(Math.abs(result.lightship.lcg - truth.lightship.lcg)).toBeLessThan(3e-4);
    // and the list's third order 0.03 mm across
    expect(Math.abs(result.lightship.tcg - truth.lightship.tcg)).toBeLessThan(3e-5);
  });

  it("finds vcg low by the known bias of a straight line on upright sides", () => {
    // apparent GM above the local one: 3/8·BM·tan²φ of the largest heel for eight moves there and back, φ against move 0
    const largest = Math.max(...result.fit.moves.map(({ tanHeel }) => Math.abs(tanHeel)));
    const metacentricRadius = result.hydrostatics.kmt - result.hydrostatics.vcb;
    const bias = (3 / 8) * metacentricRadius * largest ** 2 * (truth.displacementAsInclined / truth.lightship.displacement);
    const found = result.lightship.vcg - truth.lightship.vcg;
    expect(found).toBeLessThan(0);
    // terms of higher order and the list's own share: a quarter of it
    expect(Math.abs(found + bias)).toBeLessThan(bias / 4);
    expect(Math.abs(found)).toBeLessThan(0.003);
  });
});
