import "client-only";
import type { EventBody, ReadingValue } from "@/lib/sync/event";
import type { Slot } from "@/lib/sync/slot";
import { deviceDatabase } from "./device-database";
import type { HeldEvent } from "./held-event";

/** A reading taken with this phone, as its last own event left it. */
export type OwnReading = {
  readonly reading: string;
  /** the event that a correction or a void must name as its base */
  readonly head: string;
  readonly slot: Slot;
  readonly slotKey: string;
  readonly value: ReadingValue;
  readonly capturedAt: string;
  readonly corrected: boolean;
  readonly events: readonly HeldEvent[];
};

/** Every reading of this test that stands on this phone, in the order taken; one taken back does not stand. */
export async function ownReadings(test: string): Promise<OwnReading[]> {
  const events = await deviceDatabase().events.where("test").equals(test).toArray();
  return standingReadings(events);
}

/** The readings that stand after these events of one phone. */
export function standingReadings(events: readonly HeldEvent[]): OwnReading[] {
  const standing = new Map<string, OwnReading>();
  for (const event of [...events].sort(asTaken)) takeIn(standing, event);
  return [...standing.values()];
}

export function bodyOf(event: HeldEvent): EventBody {
  return JSON.parse(event.envelope.body) as EventBody;
}

// the sequence, and not the clock, which may be set back between two readings
function asTaken(a: HeldEvent, b: HeldEvent): number {
  return a.device === b.device ? a.seq - b.seq : a.savedAt.localeCompare(b.savedAt);
}

function takeIn(standing: Map<string, OwnReading>, event: HeldEvent): void {
  const body = bodyOf(event);
  if (body.type === "void") standing.delete(body.reading);
  if (body.type !== "record" && body.type !== "correct") return;
  const before = standing.get(body.reading);
  standing.set(body.reading, {
    reading: body.reading,
    head: event.id,
    slot: body.slot,
    slotKey: event.slotKey ?? "",
    value: body.payload,
    capturedAt: before?.capturedAt ?? body.capturedAt,
    corrected: body.type === "correct",
    events: [...(before?.events ?? []), event],
  });
}
