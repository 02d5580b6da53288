import { describe, expect, test } from "vitest";
import { perfectReadings } from "@/db/seed/simulated-readings";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { battenOffLine } from "@/lib/inclining/batten-off-line";
import { momentTangentLine } from "@/lib/inclining/moment-tangent-line";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";

const exact: TestRecord = { ...skerryTern().record, readings: skerryTernReadings(1, perfectReadings) };
const forward = exact.stations.find(({ id }) => id === "A");
const length = forward?.instrument === "pendulum" ? forward.length : 0;

describe("a batten reading that does not count", () => {
  test("lies on the line of the others where it was read right, and off it by what it was misread", () => {
    const right = offLine(0);
    // what the ship's own curve leaves, over a pendulum of 4 m less than a tenth of a millimetre
    expect(Math.abs(right?.residual ?? 1) * length).toBeLessThan(1e-4);
    expect((offLine(5)?.residual ?? 0) - (right?.residual ?? 0)).toBeCloseTo(0.005 / length, 12);
  });

  test("is not judged by a line that it bends itself", () => {
    const { test, reading } = disputed(5);
    const bent = promised(momentTangentLine({ ...test, readings: { ...test.readings, battens: counted(test) } }));
    const itself = bent.stations.find(({ id }) => id === "A")?.commonResiduals.find(({ move }) => move === reading.move);
    expect(Math.abs(offLine(5)?.residual ?? 0)).toBeGreaterThan(Math.abs(itself?.residual ?? 1));
  });

  test("has no place where its series has no other reading", () => {
    const { test, reading } = disputed(0);
    const alone = { ...reading, series: 2 };
    const battens = test.readings.battens.map((each) => (each === reading ? alone : each));
    const series = { ...test, readings: { ...test.readings, battens } };
    expect(battenOffLine(series, promised(momentTangentLine(series)), alone)).toBeNull();
  });
});

function offLine(misreadMm: number) {
  const { test, reading } = disputed(misreadMm);
  return battenOffLine(test, promised(momentTangentLine(test)), reading);
}

/** The test with one reading of station A in dispute, off by so much. */
function disputed(misreadMm: number) {
  const own = exact.readings.battens.find(({ station, move }) => station === "A" && move === 3);
  if (!own || !("valuesMm" in own)) throw new Error("station A has not read move 3");
  const reading = { ...own, valuesMm: own.valuesMm.map((value) => value + misreadMm), status: "disagrees" as const };
  const battens = exact.readings.battens.map((each) => (each === own ? reading : each));
  return { test: { ...exact, readings: { ...exact.readings, battens } }, reading };
}

function counted(test: TestRecord) {
  return test.readings.battens.map((each) => ({ ...each, status: "accepted" as const }));
}
