import { cleanup, fireEvent, render, screen, within } from "@testing-library/react";
import { afterEach, expect, test } from "vitest";
import { Decisions } from "@/components/control/decisions";
import { ReadingHistory } from "@/components/reconcile/reading-history";
import type { LiveSnapshot, StandingPhotograph } from "@/lib/sync/live";
import { bargeSnapshot, battenSlot } from "./barge-snapshot";

afterEach(cleanup);

const other = "0190a5d1-5d00-4000-8000-0000000000a2";
const disputed = bargeSnapshot({
  read: 2,
  open: null,
  called: [{ slot: battenSlot(1, "A"), value: { mode: "settled", valuesMm: [80] }, from: other }],
});
const here = { sha256: "a".repeat(64), hasArrived: true };
const away = { sha256: "b".repeat(64), hasArrived: false };
const words = /^Photograph of station A at move 1, taken \d\d:\d\d:31 by /;

/** The same, where the readings that disagree were photographed. */
function photographed(...photographs: readonly (readonly StandingPhotograph[])[]): LiveSnapshot {
  const due = disputed.due.map((each) =>
    each.state === "disagrees"
      ? { ...each, readings: each.readings.map((reading, i) => (photographs[i] ? { ...reading, photographs: photographs[i] } : reading)) }
      : each,
  );
  return { ...disputed, due };
}

const disagreeing = (snapshot: LiveSnapshot) => snapshot.due.find(({ state }) => state === "disagrees") ?? expect.fail("nothing disagrees");

test("each reading that disagrees has its own photographs beside it", () => {
  render(<Decisions snapshot={photographed([here], [away])} acts={null} />);
  const [, first, second] = within(screen.getByRole("table", { name: /Readings that disagree/ })).getAllByRole("row");
  if (!first || !second) return expect.fail("two readings disagree");
  expect(within(first).getByRole("img", { name: words }).getAttribute("src")).toBe(`/api/v1/photographs/${here.sha256}`);
  expect(within(second).queryByRole("img")).toBeNull();
  expect(within(second).getByText("photograph not arrived yet")).toBeTruthy();
});

test("no column stands for photographs where none was taken", () => {
  render(<Decisions snapshot={disputed} acts={null} />);
  expect(screen.queryByRole("columnheader", { name: "Photographs" })).toBeNull();
});

test("a corrected reading still has the photograph it was first taken with", () => {
  const due = disagreeing(photographed([here]));
  const [first, ...others] = due.readings;
  if (!first) return expect.fail("nothing was read");
  const corrected = { ...first, event: "0190a5d1-5d00-7000-8000-00000000ffff", photographs: undefined, corrected: true };
  const readings = [{ ...first, status: "superseded" as const }, corrected, ...others];
  const snapshot = { ...disputed, due: disputed.due.map((each) => (each.slotKey === due.slotKey ? { ...due, readings } : each)) };
  render(<Decisions snapshot={snapshot} acts={null} />);
  const row = screen.getByRole("row", { name: /corrected/ });
  expect(within(row).getByRole("img", { name: words })).toBeTruthy();
});

test("a photograph in a reading's history opens large, with the same words, and closes", () => {
  render(<ReadingHistory due={disagreeing(photographed([here]))} acts={null} />);
  fireEvent.click(screen.getByRole("button", { name: words }));
  const dialog = screen.getByRole("dialog", { name: words });
  expect(within(dialog).getByRole("img", { name: words })).toBeTruthy();
  fireEvent.click(within(dialog).getByRole("button", { name: "Close" }));
  expect(screen.queryByRole("dialog")).toBeNull();
});
