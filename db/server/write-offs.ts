import { and, eq } from "drizzle-orm";
import { eventFromText } from "@/lib/sync/admission";
import { events } from "../schema/events";
import { placedEvents } from "../schema/readings";
import type { Database } from "./connection";

/** Phones that were written off in a test, each with the reason: what they still hold is explained, not awaited. */
export function writeOffs(db: Database, test: string): ReadonlyMap<string, string> {
  const rows = db
    .select({ body: events.body })
    .from(placedEvents)
    .innerJoin(events, eq(events.serverSeq, placedEvents.serverSeq))
    .where(and(eq(placedEvents.test, test), eq(placedEvents.type, "device.writeOff")))
    .all();
  return new Map(
    rows.flatMap(({ body }) => {
      const read = eventFromText(body);
      if (!read.ok || read.value.type !== "device.writeOff") return [];
      return [[read.value.payload.device, read.value.reason ?? ""] as const];
    }),
  );
}
