import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { MoveSignal } from "@/components/control/move-signal";
import { snapshotWithUnsent } from "@/components/control/snapshot-with-unsent";
import type { EventBody } from "@/lib/sync/event";
import { bargeSnapshot, battenSlot } from "./barge-snapshot";

afterEach(cleanup);

const act = {
  v: 1,
  device: "0190a5d1-5d00-4000-8000-0000000000d9",
  seq: 1,
  test: "0190a5d1-5d00-7000-8000-000000000001",
  jobTag: "plan",
  author: "0190a5d1-5d00-4000-8000-0000000000a9",
  capturedAt: "2026-05-04T10:00:00.000Z",
  clockOffsetMs: 0,
  reason: null,
} as const;
const noReading = { reading: null, base: null, slot: null, source: null } as const;

describe("the signal of the test", () => {
  test("says which move is open and which stations are due", () => {
    render(<MoveSignal snapshot={bargeSnapshot({ read: 1, open: 2 })} />);
    expect(screen.getByText("2").className).toContain("text-beacon");
    expect(screen.getByText("OPEN")).toBeDefined();
    expect(screen.getByText("Due: A, B, U")).toBeDefined();
  });

  test("says which move is next while none is open", () => {
    render(<MoveSignal snapshot={bargeSnapshot({ read: 1, open: null })} />);
    expect(screen.getByText("NEXT, NOT OPEN")).toBeDefined();
    expect(screen.getByText("2")).toBeDefined();
  });

  test("says when every move is closed", () => {
    render(<MoveSignal snapshot={bargeSnapshot({ read: 4, open: null })} />);
    expect(screen.getByText("ALL CLOSED")).toBeDefined();
  });

  test("follows an order that this device has not sent yet", () => {
    const open: EventBody = {
      ...act,
      ...noReading,
      id: "0190a5d1-5d00-7000-8000-00000000ff01",
      type: "move.open",
      payload: { move: 2, repeat: 1 },
    };
    const slot = battenSlot(2, "B");
    const called: EventBody = {
      ...act,
      id: "0190a5d1-5d00-7000-8000-00000000ff02",
      seq: 2,
      type: "record",
      reading: "0190a5d1-5d00-7000-8000-00000000ff03",
      base: null,
      slot,
      payload: { mode: "settled", valuesMm: [14.3] },
      source: "radio",
    };
    render(<MoveSignal snapshot={snapshotWithUnsent(bargeSnapshot({ read: 1, open: null }), [open, called])} />);
    expect(screen.getByText("OPEN")).toBeDefined();
    expect(screen.getByText("1 of 3 read")).toBeDefined();
    expect(screen.getByText("Due: A, U")).toBeDefined();
  });

  test("reads a move again after an unsent order to repeat it", () => {
    const repeat: EventBody = {
      ...act,
      ...noReading,
      id: "0190a5d1-5d00-7000-8000-00000000ff04",
      type: "move.repeat",
      payload: { move: 1, repeat: 2 },
    };
    const snapshot = snapshotWithUnsent(bargeSnapshot({ read: 4, open: null }), [repeat]);
    render(<MoveSignal snapshot={snapshot} />);
    expect(screen.getByText("NEXT, NOT OPEN")).toBeDefined();
    expect(screen.getByText("Repeat 2")).toBeDefined();
    expect(snapshot.due.filter(({ slot }) => slot.kind === "batten" && slot.repeat === 2)).toHaveLength(3);
  });
});
