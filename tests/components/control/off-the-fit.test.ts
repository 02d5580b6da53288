import { expect, test } from "vitest";
import { offTheFit } from "@/components/control/off-the-fit";
import { perfectReadings } from "@/db/seed/simulated-readings";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import type { TestRecord } from "@/lib/record/test-record";
import type { StandingReading } from "@/lib/sync/live";
import type { Slot } from "@/lib/sync/slot";

const exact: TestRecord = { ...skerryTern().record, readings: skerryTernReadings(1, perfectReadings) };
const batten: Slot = { kind: "batten", move: 3, repeat: 1, station: "A", series: 1 };
const draft: Slot = { kind: "draft", mark: exact.draftMarks[0]?.id ?? "", round: "before" };

test("each of two battens is off the line by what it was misread, in millimetres of the batten", () => {
  const own = exact.readings.battens.find(({ station, move }) => station === "A" && move === 3);
  if (!own || !("valuesMm" in own)) throw new Error("station A has not read move 3");
  const two = [0, 12].map((by, i) => ({
    ...own,
    id: `look-${i}`,
    valuesMm: own.valuesMm.map((value) => value + by),
    status: "disagrees" as const,
  }));
  const battens = [...exact.readings.battens.filter((each) => each !== own), ...two];
  const record = { ...exact, readings: { ...exact.readings, battens } };
  const [right, misread] = offTheFit(record, batten, two.map(head)).map((words) => Number(words?.replace("−", "-").replace(" mm", "")));
  expect(Math.abs(right ?? 1)).toBeLessThanOrEqual(0.1);
  expect((misread ?? 0) - (right ?? 0)).toBeCloseTo(12, 6);
});

test("a draft is off the waterline of the other marks in millimetres, and a sounding off nothing", () => {
  const own = exact.readings.drafts.find(({ mark, round }) => draft.kind === "draft" && mark === draft.mark && round === "before");
  if (!own) throw new Error("the first mark was not read");
  const { estimates: _, ...single } = own;
  const misread = { ...single, id: "look", value: own.value + 0.05, status: "disagrees" as const };
  const drafts = [...exact.readings.drafts.filter((each) => each !== own), misread];
  const record = { ...exact, readings: { ...exact.readings, drafts } };
  expect(offTheFit(record, draft, [head(misread)])).toEqual(["+50 mm"]);
  expect(offTheFit(record, { kind: "sounding", tank: "GW", round: "before" }, [head(misread)])).toEqual([null]);
});

test("a reading that the wheelhouse has not heard yet is off nothing", () => {
  expect(offTheFit(exact, batten, [head({ id: "not here" })])).toEqual([null]);
});

function head({ id }: { readonly id: string }): StandingReading {
  const common = {
    source: "station",
    status: "disagrees",
    author: "Mara",
    device: "phone",
    late: false,
    capturedAfterClose: false,
  } as const;
  const times = { capturedAt: "2026-05-04T09:12:31.250Z", receivedAt: "2026-05-04T09:13:00.000Z" };
  return { ...common, ...times, event: `event of ${id}`, reading: id, corrected: false, value: { value: 1 } };
}
