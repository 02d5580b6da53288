import { cleanup, fireEvent, render, screen, within } from "@testing-library/react";
import { afterEach, expect, test } from "vitest";
import { isShown } from "@/components/reconcile/due-filters";
import { ReconcileBoard } from "@/components/reconcile/reconcile-board";
import { bargeSnapshot, battenSlot } from "../control/barge-snapshot";

afterEach(cleanup);

const other = "0190a5d1-5d00-4000-8000-0000000000a2";
const disputed = bargeSnapshot({
  read: 2,
  open: null,
  called: [{ slot: battenSlot(1, "A"), value: { mode: "settled", valuesMm: [80] }, from: other }],
});

test("shows every reading due, and those that disagree when they are asked for", () => {
  render(<ReconcileBoard test={disputed.record.test.id} snapshot={disputed} acts={null} />);
  const table = () => screen.getByRole("table", { name: "Readings due and what was read" });
  expect(within(table()).getAllByRole("row")).toHaveLength(disputed.due.length + 1);
  fireEvent.click(screen.getByRole("button", { name: /^Disagree 1$/ }));
  expect(within(table()).getAllByRole("row")).toHaveLength(2);
  expect(within(table()).getByText(/station A at move 1/)).toBeTruthy();
});

test("keeps a test with an open disagreement from being marked as reconciled, and says why", () => {
  render(<ReconcileBoard test={disputed.record.test.id} snapshot={{ ...disputed, state: "closed" }} acts={null} />);
  expect(screen.getByText("Owed before it is reconciled")).toBeTruthy();
  expect(screen.getByRole("button", { name: "Mark as reconciled" })).toHaveProperty("disabled", true);
});

test("counts what is late, missing, settled or changed", () => {
  const [read] = disputed.due.filter(({ state }) => state === "read");
  if (!read) throw new Error("nothing was read");
  const [reading] = read.readings;
  if (!reading) throw new Error("nothing was read");
  expect(isShown({ ...read, readings: [{ ...reading, late: true }] }, "late")).toBe(true);
  expect(isShown(read, "late")).toBe(false);
  expect(isShown({ ...read, readings: [{ ...reading, corrected: true }] }, "changed")).toBe(true);
  expect(isShown({ ...read, state: "resolved" }, "settled")).toBe(true);
  expect(isShown({ ...read, state: "empty", readings: [] }, "missing")).toBe(true);
});
