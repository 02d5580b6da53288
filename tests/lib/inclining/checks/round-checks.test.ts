import { describe, expect, it } from "vitest";
import { usualLimits } from "@/lib/inclining/checks/check-limits";
import { draftsBeforeAfter, soundingsBeforeAfter, waterlineMarks, waterSamples } from "@/lib/inclining/checks/round-checks";
import { incliningTest } from "@/lib/inclining/inclining-test";
import type { IncliningTestData } from "@/lib/inclining/test-data";
import type { MarkReading } from "@/lib/inclining/test-readings";
import { promised } from "@/lib/result";
import { sampleTest } from "../sample-test";

const { afloat } = promised(incliningTest(sampleTest()));

function reading(change: Partial<IncliningTestData["readings"]>): IncliningTestData {
  return sampleTest({ readings: { ...sampleTest().readings, ...change } });
}

function marks(round: MarkReading["round"], values: readonly number[]): MarkReading[] {
  return ["AP", "AS", "FP", "FS"]
    .slice(0, values.length)
    .map((mark, i) => ({ id: `${round} ${mark}`, mark, round, value: values[i] as number }));
}

describe("marks that were read", () => {
  it("are enough where all draft marks of both sides were", () => {
    expect(waterlineMarks(sampleTest(), usualLimits)).toMatchObject({
      verdict: "met",
      found: { marks: { port: 2, starboard: 2 }, unread: 0, freeboards: { port: 0, starboard: 0 } },
    });
  });

  it("are not enough where one was left out", () => {
    const finding = waterlineMarks(reading({ drafts: marks("before", [2, 2, 2]) }), usualLimits);
    expect(finding).toMatchObject({ verdict: "attention", found: { marks: { port: 2, starboard: 1 }, unread: 1 } });
  });

  it("are enough with five freeboards a side and no draft mark", () => {
    const sided = (y: number, count: number) =>
      Array.from({ length: count }, (_, i) => ({ id: `F${i}${y > 0 ? "S" : "P"}`, x: 10 * i, y, deckEdge: 5 }));
    const test = (count: number) => {
      const freeboardMarks = [...sided(-6, 5), ...sided(6, count)];
      const freeboards = freeboardMarks.map(({ id }) => ({ id, mark: id, round: "before" as const, value: 3 }));
      return { ...reading({ drafts: [], freeboards }), freeboardMarks };
    };
    expect(waterlineMarks(test(5), usualLimits).verdict).toBe("met");
    expect(waterlineMarks(test(4), usualLimits).verdict).toBe("attention");
  });
});

describe("drafts before and after", () => {
  it("that changed by less than the limit are met, the mark named", () => {
    const drafts = [...marks("before", [2, 2, 2, 2]), ...marks("after", [2.01, 2, 1.985, 2])];
    expect(draftsBeforeAfter(reading({ drafts }), usualLimits)).toEqual({
      id: "drafts-before-after",
      verdict: "met",
      found: { change: expect.closeTo(-0.015, 12), at: "FP" },
      limit: { most: 0.02 },
    });
  });

  it("that changed more, or were not read again, are to be looked at", () => {
    const drafts = [...marks("before", [2, 2, 2, 2]), ...marks("after", [2.03])];
    expect(draftsBeforeAfter(reading({ drafts }), usualLimits).verdict).toBe("attention");
    expect(draftsBeforeAfter(sampleTest(), usualLimits)).toMatchObject({ verdict: "attention", found: null });
  });

  it("leave out readings that were set aside", () => {
    const [wrong, ...after] = marks("after", [3, 2, 2, 2]);
    const drafts = [...marks("before", [2, 2, 2, 2]), { ...(wrong as MarkReading), status: "void" as const }, ...after];
    expect(draftsBeforeAfter(reading({ drafts }), usualLimits)).toMatchObject({ verdict: "met", found: { change: 0 } });
  });
});

describe("soundings before and after", () => {
  const row = { lcg: 20, tcg: 0, vcg: 0.5, inertia: 8 };
  const tanks = [
    {
      id: "FO",
      density: 0.86,
      measure: "sounding" as const,
      table: [
        { level: 0, volume: 0, ...row },
        { level: 1, volume: 9, ...row },
      ],
    },
  ];
  const sounded = (after: number) => ({
    ...reading({
      soundings: [
        { id: "1", tank: "FO", round: "before", value: 0.5 },
        { id: "2", tank: "FO", round: "after", value: after },
        { id: "3", tank: "FO", move: 4, value: 0.9 },
      ],
    }),
    tanks,
  });

  it("are compared tank by tank; those taken with a move stand aside", () => {
    expect(soundingsBeforeAfter(sounded(0.505), usualLimits)[0]).toMatchObject({
      verdict: "met",
      found: { change: expect.closeTo(0.005, 12) },
    });
    expect(soundingsBeforeAfter(sounded(0.45), usualLimits)[0]?.verdict).toBe("attention");
  });

  it("don't matter without tanks", () => {
    expect(soundingsBeforeAfter(sampleTest(), usualLimits)).toEqual([]);
  });
});

describe("water samples", () => {
  it("of one place at depth are enough for a small ship only", () => {
    expect(waterSamples(sampleTest(), afloat, usualLimits)).toMatchObject({
      verdict: "met",
      found: { places: 1, deepest: 1 },
      limit: { places: 1 },
    });
    const large = sampleTest({ vessel: { lbp: 150 } });
    expect(waterSamples(large, afloat, usualLimits)).toMatchObject({ verdict: "attention", limit: { places: 3 } });
  });

  it("from the surface are not enough", () => {
    const test = reading({ water: [{ id: "w", place: "midships", depth: 0, density: 1 }] });
    expect(waterSamples(test, afloat, usualLimits).verdict).toBe("attention");
  });
});
