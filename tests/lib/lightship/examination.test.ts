import { expect, it } from "vitest";
import { examined } from "@/lib/lightship/examination";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";
import { documentWith, sampleDocument } from "../record/sample-document";

it("a test done well has findings and no hint", () => {
  const { checks, hints } = promised(examined(sampleDocument()));
  expect(checks.length).toBeGreaterThan(18);
  expect(checks.filter(({ verdict }) => verdict === "not-met")).toEqual([]);
  expect(hints).toEqual([]);
});

it("a batten misread by three centimetres is named with its station, and the plot is no longer straight", () => {
  const record = sampleDocument();
  const wrong = record.readings.battens.findIndex((reading) => reading.move === 3 && "valuesMm" in reading);
  const reading = record.readings.battens[wrong];
  if (reading === undefined || !("valuesMm" in reading)) throw new Error("no batten at move 3");
  const path = ["readings", "battens", wrong, "valuesMm"];
  const misread = documentWith(
    path,
    reading.valuesMm.map((value) => value + 30),
  ) as TestRecord;
  const { checks, hints } = promised(examined(misread));
  expect(hints).toMatchObject([{ cause: "misread", moves: [3], evidence: { stations: [reading.station] } }]);
  expect(checks.find(({ id }) => id === "straightness")?.verdict).toBe("attention");
});

it("a test that can't be reduced is not examined", () => {
  const { readings } = sampleDocument();
  const refused = examined({ ...sampleDocument(), readings: { ...readings, battens: [], water: [] } });
  expect(refused.ok).toBe(false);
});
