import { expect, test } from "vitest";
import { perfectReadings } from "@/db/seed/simulated-readings";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { markOffWaterline } from "@/lib/inclining/mark-off-waterline";
import type { TestRecord } from "@/lib/record/test-record";

const exact: TestRecord = { ...skerryTern().record, readings: skerryTernReadings(1, perfectReadings) };

test("a draft in dispute is off the waterline of the other marks by what it was misread, with the sign of the misreading", () => {
  // a table and a curve of readings are written to a tenth of a millimetre
  expect(Math.abs(offBy(0) ?? 1)).toBeLessThan(5e-4);
  expect((offBy(0.05) ?? 0) - (offBy(0) ?? 0)).toBeCloseTo(0.05, 9);
  expect((offBy(-0.02) ?? 0) - (offBy(0) ?? 0)).toBeCloseTo(-0.02, 9);
});

test("a mark has no place where the others give no waterline", () => {
  const { disputed, reading } = withDispute(0);
  const few = { ...disputed, readings: { ...disputed.readings, drafts: [reading], freeboards: [] } };
  expect(markOffWaterline(few, "draft", reading)).toBeNull();
});

function offBy(misread: number): number | null {
  const { disputed, reading } = withDispute(misread);
  return markOffWaterline(disputed, "draft", reading);
}

function withDispute(misread: number) {
  const [own] = exact.readings.drafts.filter(({ round }) => round === "before");
  if (!own) throw new Error("no draft was read");
  const { estimates: _, ...single } = own;
  const reading = { ...single, value: own.value + misread, status: "disagrees" as const };
  const drafts = exact.readings.drafts.map((each) => (each === own ? reading : each));
  return { disputed: { ...exact, readings: { ...exact.readings, drafts } }, reading };
}
