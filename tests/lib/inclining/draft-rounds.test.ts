import { describe, expect, it } from "vitest";
import { draftRounds, marksRead } from "@/lib/inclining/draft-rounds";
import { readingsThatCount } from "@/lib/inclining/readings-that-count";
import { waterlineAtZero } from "@/lib/inclining/ship-afloat";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";
import { bargeRecord } from "../../components/control/barge";

type Draft = TestRecord["readings"]["drafts"][number];

/** The barge floats at 2 m on even keel; after the moves her drafts stand as `after` makes them. */
function readTwice(after: (draft: Draft) => Draft): TestRecord {
  const record = bargeRecord(4);
  const { drafts } = record.readings;
  const later = drafts.map((draft, i) => ({ ...after(draft), id: `0190a5d1-0000-7000-8000-0000000001${10 + i}`, round: "after" as const }));
  return { ...record, readings: { ...record.readings, drafts: [...drafts, ...later] } };
}

function marksOf(record: TestRecord) {
  return marksRead(record, promised(waterlineAtZero(record, readingsThatCount(record))));
}

describe("the rounds of the marks", () => {
  it("are fitted apart: 20 mm more at the aft marks alone is trim and a little sag", () => {
    const { before, after } = draftRounds(readTwice((draft) => ({ ...draft, value: draft.mark.startsWith("0") ? 2.02 : 2 })));
    expect(before).toMatchObject({ draftAft: expect.closeTo(2, 12), trim: expect.closeTo(0, 12) });
    expect(after).toMatchObject({
      draftAft: expect.closeTo(2.02, 12),
      draftForward: expect.closeTo(2, 12),
      trim: expect.closeTo(0.02, 12),
    });
  });

  it("give what each mark changed, and nothing where it was read in one round only", () => {
    const marks = marksOf(readTwice((draft) => ({ ...draft, value: 2.004 })));
    for (const { change } of marks) expect(change).toBeCloseTo(0.004, 12);
    expect(draftRounds(bargeRecord(4)).after).toBeNull();
    expect(marksOf(bargeRecord(4)).map(({ change }) => change)).toEqual(Array(6).fill(null));
  });

  it("with readings after the moves only have no change to show", () => {
    const record = bargeRecord(4);
    const drafts = record.readings.drafts.map((draft) => ({ ...draft, round: "after" as const }));
    const late = { ...record, readings: { ...record.readings, drafts } };
    expect(marksOf(late)[0]?.change).toBeNull();
    expect(draftRounds(late).before).toBeNull();
  });
});

it("a mark counts by the mean of its estimates, known by their scatter", () => {
  const record = bargeRecord(4);
  const [first, ...others] = record.readings.drafts;
  if (first === undefined) throw new Error("no draft");
  const drafts = [{ ...first, value: 2.01, estimates: [1.99, 2, 2.01] }, ...others];
  const [mark, other] = marksOf({ ...record, readings: { ...record.readings, drafts } });
  // standard deviation 10 mm of three
  expect(mark).toMatchObject({
    mark: first.mark,
    value: expect.closeTo(2, 12),
    estimates: 3,
    scatter: expect.closeTo(0.01 / Math.sqrt(3), 12),
  });
  expect(other).toMatchObject({ value: 2, estimates: 1, scatter: null });
});
