import { describe, expect, it } from "vitest";
import { markPoints } from "@/lib/hydrostatics/mark-point";
import { promised } from "@/lib/result";

const mark = { id: "M", x: 30, y: 6, zero: -0.012 };
const raked = {
  id: "A",
  x: 0,
  y: 3,
  zero: 0,
  table: [
    [3, 1.5, 3.2, 3],
    [2, 0.5, 3, 2],
  ] as const,
};
const edge = { id: "F", x: 20, y: 6, deckEdge: 5 };

describe("mark points", () => {
  it("stand at zero plus reading", () => {
    expect(promised(markPoints({ draftMarks: [mark], drafts: [{ mark: "M", value: 2.5 }] }))).toEqual([
      { mark: "M", x: 30, y: 6, z: 2.488, scatter: null },
    ]);
  });

  it("stand where a raked mark's table says, rows in any order", () => {
    const [point] = promised(markPoints({ draftMarks: [raked], drafts: [{ mark: "A", value: 2.5 }] }));
    expect(point).toEqual({ mark: "A", x: 1, y: 3.1, z: 2.5, scatter: null });
  });

  it("stand a freeboard below the deck edge", () => {
    const points = markPoints({ draftMarks: [], freeboardMarks: [edge], drafts: [], freeboards: [{ mark: "F", value: 3.1 }] });
    expect(promised(points)).toEqual([{ mark: "F", x: 20, y: 6, z: 1.9, scatter: null }]);
  });

  it("take the mean of several estimates, and keep their scatter", () => {
    const [point] = promised(markPoints({ draftMarks: [mark], drafts: [{ mark: "M", value: 9, estimates: [2.49, 2.51, 2.53] }] }));
    expect(point?.z).toBeCloseTo(2.498, 14);
    expect(point?.scatter).toBeCloseTo(0.02 / Math.sqrt(3), 14);
  });

  it("refuse a reading outside a raked mark's table, with its limits", () => {
    expect(markPoints({ draftMarks: [raked], drafts: [{ mark: "A", value: 3.01 }] })).toEqual({
      ok: false,
      refusal: { type: "OutsideMarkTable", mark: "A", value: 3.01, lowest: 2, highest: 3 },
    });
  });

  it("refuse a mark that is not on the plan, of either kind", () => {
    const refused = { ok: false, refusal: { type: "UnknownMark", mark: "X" } };
    expect(markPoints({ draftMarks: [mark], drafts: [{ mark: "X", value: 2 }] })).toEqual(refused);
    expect(markPoints({ draftMarks: [mark], drafts: [], freeboards: [{ mark: "X", value: 2 }] })).toEqual(refused);
  });

  it("refuse a mark read twice", () => {
    const drafts = [2, 2.1].map((value) => ({ mark: "M", value }));
    expect(markPoints({ draftMarks: [mark], drafts })).toEqual({ ok: false, refusal: { type: "MarkReadTwice", mark: "M" } });
  });
});
