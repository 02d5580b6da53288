import { describe, expect, it } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { type Faults, inside } from "@/lib/inclining/faults";
import { incliningTest } from "@/lib/inclining/inclining-test";
import { inclinedUncertainty } from "@/lib/lightship/inclined-uncertainty";
import type { LightshipTestData } from "@/lib/lightship/inclining-result";
import { statedUncertainty } from "@/lib/lightship/stated-uncertainty";
import { uncertainInputs } from "@/lib/lightship/uncertain-inputs";
import type { TestRecord } from "@/lib/record/test-record";
import { answer, promised, type Result } from "@/lib/result";
import { localExpansion } from "@/lib/uncertainty/local-expansion";
import { bargeRecord } from "../../components/control/barge";

const numbers = ["displacement", "gm", "vcg", "lcg", "tcg"] as const;

/** The whole reduction done again a standard uncertainty up and down for each input, as the intervals are. */
function byWholeReduction(test: TestRecord) {
  const ship = promised(incliningTest(test));
  const { slope, spread } = ship.line;
  const stated = statedUncertainty(test.uncertainty);
  const inputs = uncertainInputs(test, stated, { relative: spread.slopeUncertainty / slope, degreesOfFreedom: null });
  const numbersOf = (given: LightshipTestData): Result<readonly number[], Faults> => {
    const found = inside("", incliningTest(given));
    if (!found.ok) return found;
    const { displacement, gmFluid, vcg, lcg, tcg } = found.value.asInclined;
    return answer([displacement, gmFluid, vcg, lcg, tcg]);
  };
  const { linear } = promised(localExpansion<LightshipTestData, Faults>(numbersOf, test, inputs));
  return Object.fromEntries(
    numbers.map((number, i) => {
      const kmt = number === "vcg" ? stated.kmt : 0;
      return [number, Math.hypot(kmt, ...linear.map((each) => each[i] ?? 0))];
    }),
  );
}

const { record } = skerryTern();
const tern: TestRecord = { ...record, readings: skerryTernReadings(7) };

describe("the closed form agrees with the whole reduction within a fifth, for", () => {
  it.each([
    ["the ship of the examples", tern],
    ["the barge, whose sides are upright", bargeRecord(4)],
  ])("%s", (_, test) => {
    const { afloat, line, asInclined } = promised(incliningTest(test));
    const closed = inclinedUncertainty(test, afloat, line, asInclined.gmFluid);
    const whole = byWholeReduction(test);
    for (const number of numbers) {
      expect(closed[number] / (whole[number] ?? 0), number).toBeGreaterThan(0.8);
      expect(closed[number] / (whole[number] ?? 0), number).toBeLessThan(1.25);
    }
  });
});
