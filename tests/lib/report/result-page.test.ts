import { expect, it } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { resultPage } from "@/lib/report/result-page";
import { promised } from "@/lib/result";

it("prints what a person looks for, each figure with its unit", () => {
  const { record } = skerryTern();
  const result = promised(incliningResult({ ...record, readings: skerryTernReadings(7) }));
  const page = resultPage(result);
  const lightship = page.indexOf("Lightship, classical method");
  expect(page.slice(lightship + 1, lightship + 5).map((line) => line.trim().split(/\s+/).at(-1))).toEqual(["t", "m", "m", "m"]);
  expect(page[lightship + 1]).toMatch(/^ {2}Displacement +1318\.\d t$/);
  expect(page.join("\n")).not.toMatch(/NaN|undefined|null/);
  expect(page.filter((line) => line.includes("GM") && line.endsWith("–"))).toHaveLength(3);
});
