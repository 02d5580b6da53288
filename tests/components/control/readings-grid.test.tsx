import { cleanup, render, screen, within } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { ReadingsGrid } from "@/components/control/readings-grid";
import { bargeSnapshot, battenSlot } from "./barge-snapshot";

afterEach(cleanup);

function rowOf(move: number): HTMLElement {
  const row = screen.getByRole("rowheader", { name: new RegExp(`^${move}\\b`) }).closest("tr");
  if (!row) throw new Error(`no row for move ${move}`);
  return row;
}

describe("the grid of battens", () => {
  test("shows what was read with its value and the word read", () => {
    render(<ReadingsGrid snapshot={bargeSnapshot({ read: 1, open: null })} />);
    const [first] = within(rowOf(0)).getAllByRole("cell");
    expect(first?.textContent).toBe("12.0 mmread");
  });

  test("shows a U-tube leg by leg", () => {
    render(<ReadingsGrid snapshot={bargeSnapshot({ read: 0, open: null })} />);
    const cells = within(rowOf(0)).getAllByRole("cell");
    expect(cells[2]?.textContent).toContain("P 200.0 S 205.0 mm");
  });

  test("says due now at the open move and not yet at the others", () => {
    render(<ReadingsGrid snapshot={bargeSnapshot({ read: 1, open: 2 })} />);
    expect(within(rowOf(2)).getAllByText("due now")).toHaveLength(3);
    expect(within(rowOf(3)).getAllByText("not yet")).toHaveLength(3);
    expect(screen.getByText("Move 2: 0 of 3 read")).toBeDefined();
  });

  test("marks a value by radio until the station's own is there", () => {
    const radio = { slot: battenSlot(2, "A"), value: { mode: "settled" as const, valuesMm: [61] }, source: "radio" as const };
    render(<ReadingsGrid snapshot={bargeSnapshot({ read: 1, open: 2, called: [radio] })} />);
    expect(within(rowOf(2)).getByText("radio")).toBeDefined();
  });

  test("shows both values and the word disagrees beyond the limit of 2 mm", () => {
    const other = {
      slot: battenSlot(1, "A"),
      value: { mode: "settled" as const, valuesMm: [80] },
      from: "0190a5d1-5d00-4000-8000-0000000000a2",
    };
    render(<ReadingsGrid snapshot={bargeSnapshot({ read: 1, open: null, called: [other] })} />);
    const [cell] = within(rowOf(1)).getAllByRole("cell");
    expect(cell?.textContent).toContain("80.0 mm");
    expect(cell?.textContent).toContain("61.3 mm");
    expect(within(rowOf(1)).getByText("disagrees")).toBeDefined();
  });
});
