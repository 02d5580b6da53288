import { asc, eq, getTableName } from "drizzle-orm";
import { eventFromText } from "@/lib/sync/admission";
import { isLettingIn } from "@/lib/sync/basis";
import { events } from "../schema/events";
import { placedEvents, readings, slots } from "../schema/readings";
import { mayStandOnBase } from "./admission-facts";
import { type Database, inTransaction } from "./connection";
import { placeEvent, slotOfEvent } from "./slot-standing";
import { placeWaiting } from "./waiting-events";

const projection = [placedEvents, slots, readings] as const;

/** What stands in a test, row for row, so that it can be compared. */
export function projectionOf(db: Database, test: string): readonly string[] {
  return projection.flatMap((table) => {
    const rows = db.select().from(table).where(eq(table.test, test)).all();
    return rows.map((row) => JSON.stringify([getTableName(table), row])).sort();
  });
}

/**
 * Forgets what stands in a test and works it out again from its events, in the order in which they came. What was set
 * aside when it came stays so, unless an act let it in.
 */
export function rebuildProjection(db: Database, test: string): void {
  inTransaction(db, () => {
    for (const table of projection) db.delete(table).where(eq(table.test, test)).run();
    const stored = db.select().from(events).where(eq(events.test, test)).orderBy(asc(events.serverSeq)).all();
    for (const event of stored) {
      const read = eventFromText(event.body);
      if (!read.ok) continue;
      const { serverSeq, receivedAt } = event;
      const slot = isLettingIn(read.value) ? null : slotOfEvent(db, read.value);
      const stands = event.outcome !== "quarantined" && mayStandOnBase(db, read.value, receivedAt);
      if (stands) placeEvent(db, { body: read.value, serverSeq, receivedAt }, slot);
      placeWaiting(db, event);
    }
  });
}
