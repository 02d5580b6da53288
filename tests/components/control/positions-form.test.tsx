import { cleanup, fireEvent, render, screen, waitFor } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { type Measured, PositionsForm } from "@/components/control/positions-form";
import { bargeSnapshot } from "./barge-snapshot";

afterEach(cleanup);

const { due, record } = bargeSnapshot({ read: 1, open: 2 });
const slots = due.filter(({ slot }) => slot.kind === "position" && slot.move === 2);

function form(): Measured[] {
  const measured: Measured[] = [];
  const onMeasured = async (rows: readonly Measured[]) => void measured.push(...rows);
  render(<PositionsForm move={2} planned={record.moves[2]?.positions ?? {}} due={slots} onMeasured={onMeasured} />);
  return measured;
}

describe("where the weights stand", () => {
  test("begins with the plan's places", () => {
    form();
    expect(screen.getAllByLabelText(/^y,/).map((field) => (field as HTMLInputElement).value)).toEqual(["4", "4.5"]);
  });

  test("is not taken in before a person says that it was measured", async () => {
    const measured = form();
    fireEvent.click(screen.getByRole("button", { name: "Save positions" }));
    expect((await screen.findByRole("alert")).textContent).toBe("Measure the weights where they stand, then confirm it here.");
    expect(measured).toEqual([]);
  });

  test("is taken in as measured, not as planned", async () => {
    const measured = form();
    const [first] = screen.getAllByLabelText(/^y,/);
    if (!first) throw new Error("no field for y");
    fireEvent.change(first, { target: { value: "4,013" } });
    fireEvent.click(screen.getByRole("checkbox"));
    fireEvent.click(screen.getByRole("button", { name: "Save positions" }));
    await waitFor(() =>
      expect(measured).toEqual([
        { weight: "W1", place: [28, 4.013, 5.6] },
        { weight: "W2", place: [32, 4.5, 5.6] },
      ]),
    );
  });

  test("refuses a place that is no number", async () => {
    const measured = form();
    const [first] = screen.getAllByLabelText(/^z,/);
    if (!first) throw new Error("no field for z");
    fireEvent.change(first, { target: { value: "5.6 m" } });
    fireEvent.click(screen.getByRole("checkbox"));
    fireEvent.click(screen.getByRole("button", { name: "Save positions" }));
    expect((await screen.findByRole("alert")).textContent).toBe("“5.6 m” is not a number.");
    expect(measured).toEqual([]);
  });
});
