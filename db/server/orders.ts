import { and, eq, inArray } from "drizzle-orm";
import { type EventOf, eventBodySchema } from "@/lib/sync/event";
import type { MoveEvent } from "@/lib/sync/move-progress";
import { events } from "../schema/events";
import { placedEvents } from "../schema/readings";
import type { Database } from "./connection";

const moveTypes = ["move.open", "move.close", "move.repeat", "move.exclude"] as const;

/** What the wheelhouse has done with the moves of a test, in the order in which it arrived. */
export function moveEvents(db: Database, test: string): MoveEvent[] {
  return placedOf(db, test, moveTypes).flatMap(({ body, ...stamp }) => {
    const read = eventBodySchema.parse(JSON.parse(body));
    return isMoveEvent(read) ? [{ body: read, ...stamp }] : [];
  });
}

/** The series that were begun anew, each with the length told then. */
export function seriesEvents(db: Database, test: string): EventOf<"station.series">[] {
  return placedOf(db, test, ["station.series"]).flatMap(({ body }) => {
    const read = eventBodySchema.parse(JSON.parse(body));
    return read.type === "station.series" ? [read] : [];
  });
}

/** The length that was told with a series of a station [m]; null where none was. */
export function lengthOrdered(db: Database, test: string, station: string, series: number): number | null {
  const told = seriesEvents(db, test).findLast(({ payload }) => payload.station === station && payload.series === series);
  return told?.payload.length ?? null;
}

function placedOf(db: Database, test: string, types: readonly string[]) {
  const { body, serverSeq, receivedAt } = events;
  return db
    .select({ body, serverSeq, receivedAt })
    .from(placedEvents)
    .innerJoin(events, eq(events.serverSeq, placedEvents.serverSeq))
    .where(and(eq(placedEvents.test, test), inArray(placedEvents.type, [...types])))
    .orderBy(serverSeq)
    .all();
}

function isMoveEvent(event: { type: string }): event is MoveEvent["body"] {
  return moveTypes.some((type) => type === event.type);
}
