import { expect, test } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { assumptionSentences } from "@/lib/report/assumption-sentences";
import { promised } from "@/lib/result";

const { record } = skerryTern();
const tern = { ...record, readings: skerryTernReadings(7) };
const result = promised(incliningResult(tern));

test("names each uncertainty that is assumed, where the test states none", () => {
  const [first] = assumptionSentences({}, result);
  expect(first).toMatch(
    /^The test states no uncertainties; taken are .*0\.1 % of each weight, 5 mm of each place, .*5 mm of the metacentre\.$/,
  );
  expect(assumptionSentences(tern, result).join()).not.toContain("states no uncertainties");
});

test("says what a sag leaves open in KM, and that none is known where the marks don't tell", () => {
  const withSag = (sag: number) => assumptionSentences(tern, { ...result, waterline: { ...result.waterline, sag } });
  expect(withSag(-0.03)[0]).toContain("a tenth of the sag, 3.0 mm");
  expect(withSag(0)[0]).toContain("taken as straight");
  expect(withSag(0.0004).join()).not.toContain("sag");
});
