import { cleanup, render, screen, within } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { ChecksPanel } from "@/components/lightship/checks-panel";
import { LightshipPage } from "@/components/lightship/lightship-page";
import { bargeRecord } from "../control/barge";

afterEach(cleanup);

function cellsOf(check: string): string[] {
  const row = screen.getByRole("rowheader", { name: check }).closest("tr");
  return row
    ? within(row)
        .getAllByRole("cell")
        .map((cell) => cell.textContent ?? "")
    : [];
}

describe("the checks of a test", () => {
  test("stand each with what was found, the limit, the verdict in a word, and the source", () => {
    render(<LightshipPage mayState={false} record={bargeRecord(4)} />);
    // 40 t·m to port and 42.5 t·m to starboard on 1476 t with GM 2.2 m: tangents 0.01232 and 0.01309
    expect(cellsOf("Heel to each side").slice(0, 3)).toEqual(["0.71° to port, 0.75° to starboard", "1° to 4° each side", "not met"]);
    expect(cellsOf("Weight movements").slice(0, 3)).toEqual(["4 movements", "8, or 6 where the plot is straight after them", "not met"]);
    expect(cellsOf("Sense of the stations").slice(0, 3)).toEqual(["all go one way", "all go one way", "met"]);
    expect(cellsOf("Straightness of the plot")[3]).toContain("IMO gives no number");
  });

  test("are counted by verdict in the panel's head", () => {
    render(
      <ChecksPanel
        checks={[
          { id: "headcount", verdict: "attention", found: null, limit: null },
          { id: "initial-list", verdict: "not-met", found: { degrees: 0.7 }, limit: { most: 0.5 } },
          { id: "stations", verdict: "met", found: { stations: 3 }, limit: { recommended: 3, least: 2, smallShip: 30 } },
        ]}
      />,
    );
    expect(screen.getByText("1 not met, 1 attention, 1 met")).toBeDefined();
    expect(cellsOf("List at zero")[0]).toBe("0.70° to starboard");
  });
});
