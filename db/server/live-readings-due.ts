import { and, asc, eq } from "drizzle-orm";
import { lateness } from "@/lib/sync/lateness";
import type { ReadingDue, StandingPhotograph, StandingReading } from "@/lib/sync/live";
import type { MoveRun } from "@/lib/sync/move-progress";
import { readingsDue } from "@/lib/sync/readings-due";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { accounts } from "../schema/accounts";
import { eventPhotographs } from "../schema/files";
import { readings, slots } from "../schema/readings";
import type { Database } from "./connection";
import { duePlan } from "./due-plan";
import { hasArrived } from "./photographs";

/** Every reading due with what stands in it; then slots that hold readings although nothing is due there any more (earlier repeats). */
export function liveReadingsDue(db: Database, test: string, runs: readonly MoveRun[]): ReadingDue[] {
  const due = duePlan(db, test);
  if (!due) return [];
  const standing = standingReadings(db, test, runs);
  const taken = db.select().from(slots).where(eq(slots.test, test)).all();
  const byKey = new Map(taken.map((row) => [row.slotKey, row]));
  const planned = readingsDue(due.plan, due.ordered).map((slot) => ({ slot, key: slotKey(slot) }));
  const keys = new Set(planned.map(({ key }) => key));
  const beside = taken.filter((row) => !keys.has(row.slotKey)).map(({ slot, slotKey: key }) => ({ slot, key }));
  return [...planned, ...beside].map(({ slot, key }) => {
    const { state = "empty", heads = [] } = byKey.get(key) ?? {};
    return { slot, slotKey: key, state, heads, readings: standing.get(key) ?? [] };
  });
}

function standingReadings(db: Database, test: string, runs: readonly MoveRun[]): Map<string, StandingReading[]> {
  const rows = db
    .select({ reading: readings, slot: slots.slot, author: accounts.name })
    .from(readings)
    .innerJoin(slots, and(eq(slots.test, readings.test), eq(slots.slotKey, readings.slotKey)))
    .leftJoin(accounts, eq(accounts.id, readings.author))
    .where(eq(readings.test, test))
    .orderBy(asc(readings.serverSeq))
    .all();
  const photographs = standingPhotographs(db, test);
  const bySlot = new Map<string, StandingReading[]>();
  for (const { reading, slot, author } of rows) {
    const taken = photographs.get(reading.event);
    const standing = { ...standingReading(reading, slot, author, runs), ...(taken ? { photographs: taken } : {}) };
    bySlot.set(reading.slotKey, [...(bySlot.get(reading.slotKey) ?? []), standing]);
  }
  return bySlot;
}

function standingPhotographs(db: Database, test: string): Map<string, StandingPhotograph[]> {
  const { event, sha256 } = eventPhotographs;
  const named = db.selectDistinct({ event, sha256 }).from(eventPhotographs).where(eq(eventPhotographs.test, test)).all();
  const byEvent = new Map<string, StandingPhotograph[]>();
  for (const { event, sha256 } of named) {
    byEvent.set(event, [...(byEvent.get(event) ?? []), { sha256, hasArrived: hasArrived(sha256) }]);
  }
  return byEvent;
}

function standingReading(row: typeof readings.$inferSelect, slot: Slot, author: string | null, runs: readonly MoveRun[]): StandingReading {
  const { event, reading, value, source, status, device, capturedAt, receivedAt, corrects } = row;
  const late = lateness(slot, row, runs);
  return {
    event,
    reading,
    value,
    source,
    status,
    author: author ?? row.author,
    device,
    capturedAt,
    receivedAt,
    ...late,
    corrected: corrects,
  };
}
