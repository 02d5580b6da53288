import { cleanup, fireEvent, render, screen, waitFor } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import type { LeadActs } from "@/components/control/lead-acts";
import { PositionAgain } from "@/components/control/position-again";
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

describe("a weight measured once more", () => {
  const place: [number, number, number] = [28, 4.02, 5.6];
  const once = bargeSnapshot({ read: 1, open: 2, called: [{ slot: { kind: "position", weight: "W1", move: 2 }, value: { place } }] });
  const again = once.due.find(({ slot, state }) => slot.kind === "position" && state === "read");

  test("corrects the standing place, with its reason", async () => {
    if (!again) throw new Error("the place was not taken in");
    const corrected: Parameters<LeadActs["correct"]>[] = [];
    const nothing = async () => undefined;
    const orders = { openMove: nothing, closeMove: nothing, repeatMove: nothing, excludeMove: nothing, takeBack: nothing };
    const letting = { assign: nothing, writeOff: nothing, release: nothing };
    const correct: LeadActs["correct"] = async (...given) => void corrected.push(given);
    render(<PositionAgain due={again} acts={{ ...orders, ...letting, record: nothing, resolve: nothing, correct }} />);
    fireEvent.change(screen.getByLabelText(/^y,/), { target: { value: "4.0" } });
    fireEvent.click(screen.getByRole("checkbox"));
    fireEvent.click(screen.getByRole("button", { name: "Save positions" }));
    expect((await screen.findByRole("alert")).textContent).toContain("Write the reason");
    expect(corrected).toEqual([]);
    fireEvent.change(screen.getByLabelText("Why it is measured again"), { target: { value: "tape sagged" } });
    fireEvent.click(screen.getByRole("button", { name: "Save positions" }));
    await waitFor(() => expect(corrected).toEqual([[again.readings[0], again.slot, { place: [28, 4, 5.6] }, "tape sagged"]]));
  });
});
