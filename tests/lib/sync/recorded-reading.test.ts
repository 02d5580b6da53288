import { expect, test } from "vitest";
import type { TestRecord } from "@/lib/record/test-record";
import { readingsOfRecord, recordedReadings } from "@/lib/sync/recorded-reading";

const id = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, "0")}`;

const readings: Required<TestRecord["readings"]> = {
  battens: [
    { id: id(1), move: 1, station: "A", series: 2, repeat: 3, mode: "settled", valuesMm: [101.5], source: "radio", reader: "Ann" },
    { id: id(2), move: 1, station: "U", series: 1, repeat: 1, mode: "settled", portMm: [210], starboardMm: [262] },
    { id: id(3), move: 1, station: "I", series: 1, repeat: 1, mode: "turning-points", valuesDegrees: [0.7, 0.8, 0.71], status: "void" },
  ],
  drafts: [{ id: id(4), mark: "FP", round: "after", value: 2.013, estimates: [2.01, 2.016] }],
  freeboards: [{ id: id(5), mark: "F1S", round: "before", value: 2.98 }],
  soundings: [
    { id: id(6), tank: "FO1", round: "before", value: 0.52 },
    { id: id(7), tank: "BW1", move: 2, value: 0.4 },
  ],
  water: [{ id: id(8), place: "midships", depth: 1, round: "before", density: 1.0232, hydrometer: "H1", temperature: 11.5 }],
  conditions: [{ id: id(9), move: 2, wind: "NE 3", headcount: 9, bobFree: true, takenAt: "2026-05-04T09:12:31.250Z" }],
};

test("writes the readings of a record back as they were", () => {
  expect(readingsOfRecord(recordedReadings(readings))).toEqual(readings);
});

test("names the place of each reading in the document", () => {
  expect(recordedReadings(readings).map(({ path }) => path)).toContain("readings.soundings[1]");
});

test("fills in what a document means where it leaves it out", () => {
  const [batten] = recordedReadings({
    battens: [{ id: id(1), move: 0, station: "A", mode: "settled", valuesMm: [0] }],
    drafts: [],
    soundings: [],
    water: [],
  });
  expect(batten?.slot).toEqual({ kind: "batten", move: 0, repeat: 1, station: "A", series: 1 });
  const [water] = recordedReadings({
    battens: [],
    drafts: [],
    soundings: [],
    water: [{ id: id(2), place: "aft", depth: 1, density: 1.02 }],
  });
  expect(water?.slot).toEqual({ kind: "water", place: "aft", depth: 1, round: "before" });
});

test("gives a batten reading the session of its move", () => {
  const { battens } = readingsOfRecord(recordedReadings(readings), () => 2);
  expect(battens.map(({ session }) => session)).toEqual([2, 2, 2]);
});
