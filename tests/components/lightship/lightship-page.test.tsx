import { cleanup, render, screen, within } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { foundLightship } from "@/components/lightship/lightship-found";
import { LightshipPage } from "@/components/lightship/lightship-page";
import { promised } from "@/lib/result";
import { bargeRecord, displacement } from "../control/barge";

afterEach(cleanup);

/** The barge as inclined has KG 4.8 m at midships; two weights of 5 t stand at z 5.6 m, x 28 and 32 m, y ∓4 m. */
const mass = displacement - 10;
const vcg = (displacement * 4.8 - 10 * 5.6) / mass;

function rowOf(table: HTMLElement, label: string): string[] {
  const row = within(table).getByRole("rowheader", { name: label }).closest("tr");
  return row
    ? within(row)
        .getAllByRole("cell")
        .map((cell) => cell.textContent ?? "")
    : [];
}

describe("the lightship page", () => {
  test("finds the barge's lightship", () => {
    const { lightship } = promised(foundLightship(bargeRecord(4)));
    // the barge's readings are exact: only the arithmetic of the reduction stands between
    expect(lightship.displacement).toBeCloseTo(mass, 6);
    expect(lightship.vcg).toBeCloseTo(vcg, 6);
    expect(lightship.lcg).toBeCloseTo(30, 6);
    expect(lightship.tcg).toBeCloseTo(0, 6);
  });

  test("shows each line of the way with its mass and moments", () => {
    render(<LightshipPage mayState={false} record={bargeRecord(4)} />);
    const table = screen.getByRole("table", { name: "From as inclined to lightship" });
    expect(rowOf(table, "As inclined")).toEqual(["1476.0", "30.000", "0.000", "4.800", "44280.0", "0.0", "7084.8"]);
    expect(rowOf(table, "less test weights")).toEqual(["−10.00", "30.000", "0.000", "5.600", "−300.0", "0.0", "−56.0"]);
    expect(rowOf(table, "Lightship")).toEqual(["1466.0", "30.000", "0.000", "4.795", "43980.0", "0.0", "7028.8"]);
  });

  test("adds and deducts the items of the plan by name", () => {
    const items = [
      { action: "deduct" as const, label: "scaffolding", mass: 2, x: 10, y: 0, z: 8 },
      { action: "add" as const, label: "anchor, port", mass: 1.5, x: 57, y: -2, z: 5 },
    ];
    render(<LightshipPage mayState={false} record={{ ...bargeRecord(4), items }} />);
    const table = screen.getByRole("table", { name: "From as inclined to lightship" });
    expect(rowOf(table, "less scaffolding").slice(0, 4)).toEqual(["−2.00", "10.000", "0.000", "8.000"]);
    expect(rowOf(table, "plus anchor, port").slice(0, 4)).toEqual(["+1.50", "57.000", "−2.000", "5.000"]);
    expect(rowOf(table, "Lightship")[0]).toBe("1465.5");
  });

  test("gives the residual of every mark", () => {
    render(<LightshipPage mayState={false} record={bargeRecord(4)} />);
    const table = screen.getByRole("table", { name: "Residual of each mark" });
    expect(within(table).getAllByRole("row")).toHaveLength(1 + 6);
  });

  test("names the marks among which a wrong one hides, and not one of them for the culprit", () => {
    const record = bargeRecord(4);
    const drafts = record.readings.drafts.map((draft) =>
      draft.mark === "30S" ? { ...draft, value: 2.12, estimates: [2.11, 2.13] } : draft,
    );
    render(<LightshipPage mayState={false} record={{ ...record, readings: { ...record.readings, drafts } }} />);
    const table = screen.getByRole("table", { name: "Residual of each mark" });
    expect(rowOf(table, "30S").slice(0, 2)).toEqual(["2.120 m", "2, ± 10.0 mm"]);
    const told = screen.getByText(/^Read again: one of /).textContent;
    expect(told).toContain("30S (by +0.120 m)");
    expect(told).toContain("30P (by −0.120 m)");
    expect(told).toContain("these marks can’t tell which");
  });

  test("shows the rounds before and after the moves side by side with what changed", () => {
    const record = bargeRecord(4);
    const { drafts } = record.readings;
    const later = drafts.map((draft, i) => ({
      ...draft,
      id: `0190a5d1-0000-7000-8000-0000000001${10 + i}`,
      round: "after" as const,
      value: 2.03,
    }));
    render(<LightshipPage mayState={false} record={{ ...record, readings: { ...record.readings, drafts: [...drafts, ...later] } }} />);
    const rounds = screen.getByRole("table", { name: "Before and after the moves" });
    expect(rowOf(rounds, "Draft aft")).toEqual(["2.000 m", "2.030 m", "+0.030 m"]);
    expect(rowOf(screen.getByRole("table", { name: "Residual of each mark" }), "0P").at(-1)).toBe("+30.0 mm");
    expect(screen.getByText(/changed most: \+0\.030 m\.$/)).toBeDefined();
  });

  test("compares the lightship with an earlier test, where the record has one, with the limits of SOLAS", () => {
    const previous = { kind: "earlier" as const, displacement: 1500, vcg: 4.8, lcg: 30 };
    render(<LightshipPage mayState={false} record={{ ...bargeRecord(4), previous }} />);
    const table = screen.getByRole("table", { name: "Checks of the test" });
    expect(rowOf(table, "Displacement compared")).toEqual([
      "−2.27 % against 1500 t of the earlier test",
      "at most 2.00 %",
      "not met",
      "SOLAS II-1/5.5",
    ]);
    expect(rowOf(table, "LCG compared").slice(2)).toEqual(["met", "SOLAS II-1/5.5"]);
    expect(rowOf(table, "VCG compared")).toHaveLength(4);
  });

  test("says in sentences what keeps the lightship from being known, and shows no figure", () => {
    const record = bargeRecord(4);
    render(<LightshipPage mayState={false} record={{ ...record, readings: { ...record.readings, drafts: [], water: [] } }} />);
    expect(screen.getByText("The lightship can’t be worked out yet")).toBeDefined();
    expect(screen.queryByRole("table", { name: "From as inclined to lightship" })).toBeNull();
    expect(screen.getAllByRole("listitem").length).toBeGreaterThanOrEqual(2);
    expect(screen.queryByText("Settings of this test")).toBeNull();
  });
});
