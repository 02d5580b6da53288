import { describe, expect, it } from "vitest";
import { markSuspects } from "@/lib/hydrostatics/mark-suspects";
import { waterlineFromMarks } from "@/lib/hydrostatics/waterline";
import { promised } from "@/lib/result";
import { readingsAt, sixMarks } from "./sample-marks";
import { planeAt } from "./sample-planes";

const lbp = 60;
const plane = planeAt(2.2, lbp, { slopeAlong: -0.004, tanHeel: 0.01, sag: 0.03 });

describe("mark suspects", () => {
  it("are none where all marks agree", () => {
    expect(markSuspects(waterlineWithError("MS", 0), 0.02)).toEqual([]);
  });

  it("name the pair that six marks can't separate, with the error each would have", () => {
    // port and starboard at one length share the misfit: the arrangement sees only their difference
    const suspects = markSuspects(waterlineWithError("MS", 0.1), 0.02);
    expect(suspects.map(({ mark }) => mark).sort()).toEqual(["MP", "MS"]);
    expect(suspects.find(({ mark }) => mark === "MS")?.error).toBeCloseTo(0.1, 12);
    expect(suspects.find(({ mark }) => mark === "MP")?.error).toBeCloseTo(-0.1, 12);
  });

  it("name the one mark where more marks tell it from the others", () => {
    const more = [...sixMarks, ...[12, 22, 42, 50].flatMap((x) => [-6, 0, 6].map((y) => ({ id: `${x}/${y}`, x, y, zero: 0 })))];
    const suspects = markSuspects(waterlineWithError("MS", 0.1, more), 0.02);
    expect(suspects).toEqual([{ mark: "MS", error: expect.closeTo(0.1, 12) }]);
  });

  it("are none where the error stays below the limit", () => {
    expect(markSuspects(waterlineWithError("MS", 0.01), 0.02)).toEqual([]);
  });

  it("are none where the marks just suffice: nothing contradicts", () => {
    const three = [sixMarks[0], sixMarks[1], sixMarks[4]] as typeof sixMarks;
    expect(markSuspects(waterlineWithError("AS", 0.5, three), 0.02)).toEqual([]);
  });
});

function waterlineWithError(mark: string, error: number, draftMarks = sixMarks) {
  const drafts = readingsAt(plane, draftMarks).map((reading) =>
    reading.mark === mark ? { ...reading, value: reading.value + error } : reading,
  );
  return promised(waterlineFromMarks({ lbp, draftMarks, drafts }));
}
