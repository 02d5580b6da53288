import { expect, it } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { defendedLightship } from "@/lib/lightship/defended-lightship";
import { examined } from "@/lib/lightship/examination";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { resultDocument } from "@/lib/report/result-document";
import { resultPage } from "@/lib/report/result-page";
import { promised } from "@/lib/result";

it("prints what a person looks for, each figure with its unit", () => {
  const { record } = skerryTern();
  const test = { ...record, readings: skerryTernReadings(7), settings: { draws: 20_000 } };
  const result = resultDocument(test, promised(incliningResult(test)), promised(defendedLightship(test)), promised(examined(test)));
  const page = resultPage(result);
  const lightship = page.indexOf("Lightship, classical method, with its 95 % interval");
  expect(page[lightship + 1]).toMatch(/^ {2}Displacement +1318\.\d t {3}131\d\.\d to 132\d\.\d$/);
  expect(page[lightship + 2]).toMatch(/^ {2}VCG, classical +5\.71\d m {3}5\.70\d to 5\.71\d$/);
  expect(page[lightship + 5]).toMatch(/^ {2}TCG to starboard +−0\.021 m$/);
  expect(page.filter((line) => /^ {2}Scatter (between moves|of stations within a move) +0\.\d\d mm per m$/.test(line))).toHaveLength(2);
  expect(page).toContain("  Agreement of the marks: met; 6 marks agree with one waterplane");
  expect(page.filter((line) => /^ {2}Mark \w+ +[+−]\d\.\d mm {3}read \d\.\d{3} m, 1 estimate$/.test(line))).toHaveLength(6);
  expect(page.slice(page.indexOf("After the moves less before")).some((line) => /^ {2}Draft aft +[+−]0\.00\d m/.test(line))).toBe(true);
  // the earlier test of the ship had 1296.2 t
  expect(page.find((line) => line.startsWith("  Displacement compared"))).toMatch(
    /met {2}\+1\.7\d % against 1296\.2 t of the earlier test; at most 2\.00 % \(SOLAS II-1\/5\.5\)$/,
  );
  expect(page).toContain("What leaves VCG open");
  expect(page).toContain("  Heel to each side                           met  2.43° to port, 2.44° to starboard; 1° to 4° each side");
  expect(page).toContain("  Headcount through the moves           attention  not noted; unchanged");
  expect(page.join("\n")).not.toMatch(/NaN|undefined|null/);
  expect(page.filter((line) => line.includes("GM") && line.endsWith("–"))).toHaveLength(3);
});
