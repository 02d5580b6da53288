import { describe, expect, it } from "vitest";
import { usualAgreement } from "@/lib/sync/agreement";
import type { EventOf } from "@/lib/sync/event";
import { lateness } from "@/lib/sync/lateness";
import { moveProgress } from "@/lib/sync/move-progress";
import type { Slot } from "@/lib/sync/slot";
import { type ProjectedReading, slotProjection } from "@/lib/sync/slot-projection";
import { battenA, order, record, settled, stamped } from "./sample-acts";

/** Move 1 was closed at 09:20 by the fifth act that came in; the phone of the wheelhouse is a minute fast. */
const closed = moveProgress(
  [0, 1],
  [stamped(order(5, "move.close", 1, 1, { capturedAt: "2026-05-04T09:21:00.000Z", clockOffsetMs: -60_000 }))],
);

function readingOf(n: number, changes: Partial<EventOf<"record">> = {}): ProjectedReading {
  const rules = { limits: usualAgreement, reconciledAt: null };
  const [reading] = slotProjection("batten", [stamped(record(n, settled(100), changes))], rules).readings;
  if (!reading) throw new Error("a record gives a reading");
  return reading;
}

const late = (n: number, capturedAt: string, clockOffsetMs: number | null = null, slot: Slot = battenA) =>
  lateness(slot, readingOf(n, { capturedAt, clockOffsetMs }), closed);

describe("a batten reading", () => {
  it("is in time when it came and was taken before its move was closed", () => {
    expect(late(4, "2026-05-04T09:19:00.000Z")).toEqual({ late: false, capturedAfterClose: false });
  });

  it("is late when it came after the close, though it was taken before", () => {
    expect(late(6, "2026-05-04T09:19:00.000Z")).toEqual({ late: true, capturedAfterClose: false });
  });

  it("was captured after the close by both phones' clocks as measured, not as they show", () => {
    expect(late(6, "2026-05-04T09:20:30.000Z")).toEqual({ late: true, capturedAfterClose: true });
    expect(late(6, "2026-05-04T09:19:30.000Z", 40_000)).toEqual({ late: true, capturedAfterClose: true });
    expect(late(6, "2026-05-04T12:19:00.000Z", -3 * 3_600_000)).toEqual({ late: true, capturedAfterClose: false });
    expect(late(6, "2026-05-04T09:20:00.000Z")).toEqual({ late: true, capturedAfterClose: false });
  });

  it("is neither where its run was never closed: another move, or a repeat", () => {
    const neither = { late: false, capturedAfterClose: false };
    expect(late(6, "2026-05-04T09:30:00.000Z", null, { ...battenA, move: 0 })).toEqual(neither);
    expect(late(6, "2026-05-04T09:30:00.000Z", null, { ...battenA, repeat: 2 })).toEqual(neither);
  });
});

describe("any other reading", () => {
  it("has no move that could be closed before it", () => {
    const slot: Slot = { kind: "position", weight: "W1", move: 1 };
    expect(late(6, "2026-05-04T09:30:00.000Z", null, slot)).toEqual({ late: false, capturedAfterClose: false });
  });
});
