import { describe, expect, it } from "vitest";
import { hullFromOffsets, type OffsetSection } from "@/lib/hydrostatics/hull";
import { promised } from "@/lib/result";
import { boxOffsets, hullOf, workboat } from "./sample-hulls";

const side: OffsetSection["points"] = [
  [3, 0],
  [3, 5],
];

describe("hull from offsets", () => {
  it("gives a section that starts off the centreline a flat bottom, and a deck", () => {
    const [strip] = hullOf(boxOffsets(10, 6, 5)).strips;
    expect(strip?.aft).toEqual({ halfBreadths: [0, 3, 3, 0], heights: [0, 0, 5, 5] });
    expect(strip).toMatchObject({ xAft: 0, xForward: 10 });
  });

  it("takes the sections in any order", () => {
    expect(hullOf({ sections: workboat.sections.toReversed() })).toEqual(hullOf(workboat));
  });

  it("knows its limits", () => {
    expect(hullOf(workboat)).toMatchObject({ xAft: -1, xForward: 30, keel: 0, top: 5.2, greatestHalfBreadth: 3.9 });
  });

  it("assumes no shell and no appendages where none are given", () => {
    expect(hullOf(workboat)).toMatchObject({ shellFactor: 1, appendages: [] });
  });

  it("refuses a single section", () => {
    expect(hullFromOffsets({ sections: [{ x: 0, points: side }] })).toEqual({
      ok: false,
      refusal: { type: "TooFewSections", got: 1, needed: 2 },
    });
  });

  it("refuses two sections at one place", () => {
    const sections = [0, 5, 5].map((x) => ({ x, points: side }));
    expect(hullFromOffsets({ sections })).toEqual({ ok: false, refusal: { type: "SectionsAtOnePlace", x: 5 } });
  });

  it("refuses an empty section", () => {
    const sections = [
      { x: 0, points: side },
      { x: 5, points: [] },
    ];
    expect(hullFromOffsets({ sections })).toEqual({ ok: false, refusal: { type: "EmptySection", x: 5 } });
  });

  it("refuses a negative half-breadth, and says where", () => {
    const sections = [
      { x: 0, points: side },
      { x: 5, points: [[-3, 0] as const, [3, 5] as const] },
    ];
    expect(hullFromOffsets({ sections })).toEqual({ ok: false, refusal: { type: "NegativeHalfBreadth", x: 5, halfBreadth: -3, z: 0 } });
  });

  it("refuses a section listed from the deck down", () => {
    const sections = [
      { x: 0, points: side },
      { x: 5, points: [[3, 5] as const, [3, 0] as const, [0, 0] as const] },
    ];
    expect(hullFromOffsets({ sections })).toEqual({ ok: false, refusal: { type: "SectionFromDeckToKeel", x: 5, area: -15 } });
  });

  it("refuses sections that enclose nothing", () => {
    const sections = [0, 5].map((x) => ({ x, points: [[0, 0] as const, [0, 4] as const] }));
    expect(hullFromOffsets({ sections })).toEqual({ ok: false, refusal: { type: "HullWithoutVolume", sections: 2 } });
  });

  it("accepts a stem that is a single point", () => {
    const hull = promised(
      hullFromOffsets({
        sections: [
          { x: 0, points: side },
          { x: 9, points: [[0, 5]] },
        ],
      }),
    );
    expect(hull.strips[0]?.forward.heights).toEqual([5, 5, 5, 5]);
  });
});
