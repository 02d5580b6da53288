import { cleanup, render, screen, within } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { StandingResult } from "@/components/control/standing-result";
import { IntervalTable } from "@/components/lightship/interval-table";
import { foundLightship } from "@/components/lightship/lightship-found";
import { LightshipPage } from "@/components/lightship/lightship-page";
import { LightshipResult } from "@/components/lightship/lightship-result";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { testSoFar } from "@/lib/inclining/test-so-far";
import type { TestRecord } from "@/lib/record/test-record";
import { lightshipDigits } from "@/lib/report/result-digits";
import { wholeResult } from "@/lib/report/result-document";
import { resultPage } from "@/lib/report/result-page";
import { promised } from "@/lib/result";
import { bargeRecord } from "../control/barge";

afterEach(cleanup);

/** A figure with its unit, as it is printed in a section of the page for a person. */
function printed(page: readonly string[], section: string, label: string): string {
  const from = page.findIndex((line) => line.startsWith(section));
  const line = page.slice(from).find((each) => each.startsWith(`  ${label} `)) ?? "";
  return line
    .slice(2 + label.length)
    .trim()
    .split(/\s+/)
    .slice(0, 2)
    .join(" ");
}

function ofTerm(container: HTMLElement, term: string): string {
  return within(container).getByText(term).nextElementSibling?.textContent ?? "";
}

const tern = { ...skerryTern().record, readings: skerryTernReadings(7) };

describe.each<[string, TestRecord]>([
  ["the ship of the examples", tern],
  ["the barge", bargeRecord(4)],
  ["a ship whose drafts are badly known", { ...tern, uncertainty: { draft: 1, density: 0.0005, readingMm: 40 } }],
])("the digits of %s", (_, given) => {
  const record = { ...given, settings: { ...given.settings, draws: 5000 } };
  const document = promised(wholeResult(record));
  const page = resultPage(document);

  test("as inclined are the same in central control, on the lightship page and from the command", () => {
    const control = render(<StandingResult record={record} so={testSoFar(record)} moves={[]} unmeasured={[]} />).container;
    const lightship = render(<LightshipPage record={record} mayState={false} />).container;
    const inclined = (label: string) => printed(page, "As inclined", label);
    for (const [term, there, label] of [
      ["Displacement", "Displacement", "Displacement"],
      ["Free surface", "Free surface", "Free surface correction"],
      ["GM solid", "GM solid", "GM solid"],
      ["LCG", "LCG, as inclined", "LCG"],
      ["TCG, to starboard +", "TCG, as inclined", "TCG to starboard"],
    ] as const) {
      expect(ofTerm(control, term), term).toBe(inclined(label));
      const facts = within(lightship)
        .getAllByText(there)
        .find((each) => each.tagName === "DT");
      expect(facts?.nextElementSibling?.textContent, there).toBe(inclined(label));
    }
    expect(ofTerm(control, "GM fluid")).toBe(inclined("GM fluid"));
    expect(ofTerm(control, "KG, as inclined")).toBe(inclined("VCG"));
    expect(ofTerm(lightship, "GM fluid")).toBe(inclined("GM fluid"));
    expect(ofTerm(lightship, "KG, as inclined")).toBe(inclined("VCG"));
    const row = within(lightship).getByRole("rowheader", { name: "As inclined" }).closest("tr");
    const cells = within(row as HTMLElement)
      .getAllByRole("cell")
      .map((cell) => cell.textContent ?? "");
    expect(`${cells[0]} t`).toBe(inclined("Displacement"));
    expect(`${cells[3]} m`).toBe(inclined("VCG"));
  });

  test("of the lightship are the same in the headline, in the intervals and from the command", () => {
    const { result } = promised(foundLightship(record));
    const { interval95 } = document.lightship;
    const digits = lightshipDigits(result.lightship, result.asInclined, interval95);
    const headline = render(<LightshipResult lightship={result.lightship} difference={null} digits={digits} />).container;
    const lightship = (label: string) => printed(page, "Lightship,", label);
    expect(ofTerm(headline, "Displacement")).toBe(lightship("Displacement"));
    expect(ofTerm(headline, "VCG above baseline")).toBe(lightship("VCG, classical"));
    expect(ofTerm(headline, "LCG forward of AP")).toBe(lightship("LCG"));
    expect(ofTerm(headline, "TCG to starboard +")).toBe(lightship("TCG to starboard"));
    render(<IntervalTable intervals={interval95} digits={digits} isAssumed />);
    const row = screen.getByRole("rowheader", { name: "VCG, classical" }).closest("tr")?.textContent ?? "";
    const line = page.find((each) => each.startsWith("  VCG, classical ")) ?? "";
    const [low, high] = (line.split(" m   ")[1] ?? "").split(" to ");
    expect(row).toBe(`VCG, classical${low} m${high} m`);
  });

  test("do not change when the intervals arrive", () => {
    const { result } = promised(foundLightship(record));
    const before = lightshipDigits(result.lightship, result.asInclined, null);
    expect(before).toEqual(lightshipDigits(result.lightship, result.asInclined, document.lightship.interval95));
  });
});

test("digits that the uncertainty does not leave are not shown", () => {
  const { result } = promised(foundLightship({ ...tern, uncertainty: { draft: 1, density: 0.0005, readingMm: 40 } }));
  const digits = lightshipDigits(result.lightship, result.asInclined, null);
  expect(digits.displacement).toBe(0);
  expect(digits.lcg).toBeLessThan(3);
  expect(lightshipDigits(result.lightship, promised(foundLightship(tern)).result.asInclined, null)).toEqual({
    displacement: 1,
    vcg: 3,
    lcg: 3,
    tcg: 3,
  });
});
