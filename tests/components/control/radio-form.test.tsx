import { cleanup, fireEvent, render, screen, waitFor } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import type { RadioReading } from "@/components/control/radio-entry";
import { RadioForm } from "@/components/control/radio-form";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { bargeSnapshot, battenSlot } from "./barge-snapshot";

afterEach(cleanup);

const { due, record } = bargeSnapshot({ read: 1, open: 2 });

/** The form with a slot already asked for, and what it has handed on. */
function formFor(slot: Slot): RadioReading[] {
  const taken: RadioReading[] = [];
  const onRecord = async (reading: RadioReading) => {
    taken.push(reading);
  };
  render(<RadioForm due={due} stations={record.stations} first={slotKey(slot)} onRecord={onRecord} />);
  return taken;
}

function typed(label: string | RegExp, text: string) {
  fireEvent.change(screen.getByLabelText(label), { target: { value: text } });
}

function takeIn() {
  fireEvent.click(screen.getByRole("button", { name: "Take in by radio" }));
}

describe("a value called over the radio", () => {
  test("is taken in with a comma as with a point", async () => {
    const taken = formFor(battenSlot(2, "A"));
    typed(/^Value/, "101,5");
    takeIn();
    await waitFor(() => expect(taken).toEqual([{ slot: battenSlot(2, "A"), value: { mode: "settled", valuesMm: [101.5] } }]));
    expect(await screen.findByText("Saved: station A at move 2.")).toBeDefined();
  });

  test.each([
    ["12..5", "“12..5” is not a number."],
    ["a hundred", "“a” is not a number."],
    ["", "Nothing is typed here yet."],
    ["4500", "A batten is read in millimetres: not more than 3000 to either side."],
  ])("is refused in a sentence where %j is typed", async (text, sentence) => {
    const taken = formFor(battenSlot(2, "A"));
    typed(/^Value/, text);
    takeIn();
    expect((await screen.findByRole("alert")).textContent).toBe(sentence);
    expect(taken).toEqual([]);
  });

  test("is refused as a swing of two turning points", async () => {
    const taken = formFor(battenSlot(2, "A"));
    typed(/^Value/, "101 97");
    fireEvent.click(screen.getByLabelText("Turning points of a swing"));
    takeIn();
    expect((await screen.findByRole("alert")).textContent).toBe("A swing needs at least 3 turning points in order; 2 given.");
    expect(taken).toEqual([]);
  });

  test("is refused as a density in kilograms", async () => {
    const taken = formFor({ kind: "water", place: "midships", depth: 1, round: "before" });
    typed("Value", "1025");
    takeIn();
    expect((await screen.findByRole("alert")).textContent).toBe("Water is between 0.95 and 1.1 t/m³: type 1.025, not 1025.");
    expect(taken).toEqual([]);
  });

  test("asks for both legs of a U-tube", async () => {
    const taken = formFor(battenSlot(2, "U"));
    typed("Port leg", "180.5");
    takeIn();
    expect((await screen.findByRole("alert")).textContent).toBe("Nothing is typed here yet.");
    typed("Starboard leg", "224");
    takeIn();
    await waitFor(() => expect(taken[0]?.value).toEqual({ mode: "settled", portMm: [180.5], starboardMm: [224] }));
  });
});
