import { describe, expect, it } from "vitest";
import { usualLimits } from "@/lib/inclining/checks/check-limits";
import type { CheckedTest, Conditions } from "@/lib/inclining/checks/checked-test";
import { certificates, headcount, underKeel } from "@/lib/inclining/checks/surroundings-checks";
import { sampleTest } from "../sample-test";

function noted(conditions: readonly Conditions[]): CheckedTest {
  const test = sampleTest();
  return { ...test, readings: { ...test.readings, conditions } };
}

describe("headcount", () => {
  it.each([
    [[9, 9, 9], "met", { least: 9, most: 9 }],
    [[9, 10, 9], "not-met", { least: 9, most: 10 }],
    [[9], "attention", null],
    [[], "attention", null],
  ])("of %j is %s", (counts, verdict, found) => {
    const test = noted(counts.map((count, move) => ({ move, headcount: count })));
    expect(headcount(test)).toEqual({ id: "headcount", verdict, found, limit: null });
  });

  it("leaves out a note that was set aside", () => {
    const test = noted([
      { move: 0, headcount: 9 },
      { move: 1, headcount: 12, status: "superseded" },
      { move: 1, headcount: 9 },
    ]);
    expect(headcount(test).verdict).toBe("met");
  });
});

describe("clearance under the keel", () => {
  it.each([
    [[3.2, 1.1], "met", { least: 1.1 }],
    [[3.2, 0.1], "attention", { least: 0.1 }],
    [[], "attention", null],
  ])("of %j m is %s", (clearances, verdict, found) => {
    const test = noted(clearances.map((clearance, move) => ({ move, underKeel: clearance })));
    expect(underKeel(test, usualLimits)).toMatchObject({ verdict, found });
  });
});

describe("certificates", () => {
  it("are missed by the name of what has none", () => {
    const weights = [
      { id: "W1", mass: 10, certificate: "2026-04" },
      { id: "W2", mass: 10 },
    ];
    const hydrometers = [{ id: "H1", scale: "density-vacuum" as const }];
    expect(certificates({ ...sampleTest(), weights, hydrometers })).toMatchObject({
      verdict: "attention",
      found: { without: ["W2", "H1"] },
    });
    expect(certificates({ ...sampleTest(), weights: weights.slice(0, 1) }).verdict).toBe("met");
  });
});
