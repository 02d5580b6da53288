import { render, screen } from "@testing-library/react";
import { expect, test } from "vitest";
import { EntryMatter } from "@/components/ledger/entry-matter";
import type { EntryLine } from "@/components/ledger/ledger-table";

const entry: EntryLine = {
  seq: 7,
  at: "2026-05-04T10:00:00.000Z",
  name: "Mara Quist",
  role: "reader",
  what: "record",
  before: null,
  after: null,
  reason: null,
  hash: "a".repeat(64),
};
const slot = { kind: "draft", mark: "AP", round: "before" };

test("says a reading as it was called out", () => {
  const { container } = render(<EntryMatter entry={{ ...entry, after: { serverSeq: 9, slot, value: { value: 3.381 } } }} />);
  expect(container.textContent).toBe("draft mark AP before the moves: 3.381 m");
});

test("says a correction with what it was before, and why", () => {
  const change = {
    before: [{ event: "x", value: { value: 3.381 } }],
    after: { slot, value: { value: 3.281 } },
    reason: "one figure misread",
  };
  const { container } = render(<EntryMatter entry={{ ...entry, ...change }} />);
  expect(container.textContent).toBe("draft mark AP before the moves: 3.381 m → 3.281 m“one figure misread”");
});

test("says a change of state in a line, and why an event was set aside", () => {
  const { container, rerender } = render(<EntryMatter entry={{ ...entry, before: "open", after: "closed" }} />);
  expect(container.textContent).toBe("open → closed");
  rerender(<EntryMatter entry={{ ...entry, after: { code: "unknown-slot", message: "The plan has no such reading due" } }} />);
  expect(container.textContent).toBe("The plan has no such reading due");
});

test("names the move that was ordered", () => {
  const { container } = render(<EntryMatter entry={{ ...entry, after: { serverSeq: 9, slot: null, value: { move: 5, repeat: 2 } } }} />);
  expect(container.textContent).toBe("move 5, repeat 2");
});

test("folds everything else away as it is written", () => {
  render(<EntryMatter entry={{ ...entry, after: { role: "reader", account: "x" } }} />);
  expect(screen.getByText("As it is written")).toBeTruthy();
  expect(screen.getByText(/"role": "reader"/)).toBeTruthy();
});
