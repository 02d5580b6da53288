import { and, eq, sql } from "drizzle-orm";
import { basisOf, isLettingIn } from "@/lib/sync/basis";
import { type EventBody, eventBodySchema } from "@/lib/sync/event";
import type { Slot } from "@/lib/sync/slot";
import type { SlotEvent, Stamped } from "@/lib/sync/slot-heads";
import { slotKey } from "@/lib/sync/slot-key";
import { type SlotProjection, slotProjection } from "@/lib/sync/slot-projection";
import { events } from "../schema/events";
import { placedEvents, readings, slots } from "../schema/readings";
import type { Database } from "./connection";
import { preparedInsert, preparedQuery } from "./prepared-query";
import { slotRules } from "./slot-rules";

/** An event that takes part, as it stands in the file of events or is about to. */
export type Arriving = Stamped<EventBody>;

/**
 * Gives an event its place and works out anew what stands there; null where it fills no slot (the acts of the
 * wheelhouse). A slot that it stood in before, while it waited for its base, is worked out as well.
 */
export function placeEvent(db: Database, arriving: Arriving, slot: Slot | null): SlotProjection | null {
  const { body, serverSeq } = arriving;
  const earlier = placeOf(db, body.id);
  const row = { event: body.id, serverSeq, test: body.test, type: body.type, slotKey: slot ? slotKey(slot) : null };
  db.insert(placedEvents).values(row).onConflictDoUpdate({ target: placedEvents.event, set: row }).run();
  if (earlier && earlier.slotKey !== row.slotKey) standing(db, body.test, earlier.slot);
  return slot ? standing(db, body.test, slot, arriving) : null;
}

export function isPlaced(db: Database, event: string): boolean {
  return db.select().from(placedEvents).where(eq(placedEvents.event, event)).get() !== undefined;
}

/** Whether it is this copy of an event that takes part, of several that bear its id. */
export function isPlacedCopy(db: Database, event: string, serverSeq: number): boolean {
  return db.select().from(placedEvents).where(eq(placedEvents.event, event)).get()?.serverSeq === serverSeq;
}

/** The slot in which an act belongs: that of the act it stands on, else its own. */
export function slotOfEvent(db: Database, body: EventBody): Slot | null {
  const basis = basisOf(body);
  const place = basis === null || isLettingIn(body) ? undefined : placeOf(db, basis);
  return place?.test === body.test ? place.slot : isLettingIn(body) ? null : body.slot;
}

/** Works every slot of a test out anew, after its limits or its state have changed. */
export function standAgain(db: Database, test: string): void {
  const taken = db.select({ slot: slots.slot }).from(slots).where(eq(slots.test, test)).all();
  for (const { slot } of taken) standing(db, test, slot);
}

/** Takes an event out of its place again: it was let in before it could be judged. */
export function displaceEvent(db: Database, event: string): void {
  const place = placeOf(db, event);
  db.delete(placedEvents).where(eq(placedEvents.event, event)).run();
  if (place) standing(db, place.test, place.slot);
}

/** Works out what stands in a slot and writes it over what stood there. An arriving event need not be in the file yet. */
export function standing(db: Database, test: string, slot: Slot, arriving?: Arriving): SlotProjection {
  const acts = eventsOfSlot(db, test, slot, arriving);
  const projection = slotProjection(slot.kind, acts, slotRules(db, test));
  const place = { test, slotKey: slotKey(slot) };
  forget(db, place);
  // where no act is left, nothing is written: a rebuild would not find the slot either
  if (acts.length > 0) insertSlot(db, { ...place, slot, state: projection.state, heads: projection.heads });
  // one by one: a statement that holds them all has no room for more than some thousands
  for (const reading of projection.readings) insertReading(db, { ...reading, ...place });
  return projection;
}

const insertSlot = preparedInsert(slots);
const insertReading = preparedInsert(readings);

function forget(db: Database, { test, slotKey }: { readonly test: string; readonly slotKey: string }): void {
  for (const query of forgetting(db)) query.run({ test, slotKey });
}

const forgetting = preparedQuery((db) =>
  [slots, readings].map((table) => {
    const ofSlot = and(eq(table.test, sql.placeholder("test")), eq(table.slotKey, sql.placeholder("slotKey")));
    return db.delete(table).where(ofSlot).prepare();
  }),
);

function placeOf(db: Database, event: string): { test: string; slotKey: string; slot: Slot } | undefined {
  return placeIn(db).get({ event });
}

const placeIn = preparedQuery((db) =>
  db
    .select({ test: placedEvents.test, slotKey: slots.slotKey, slot: slots.slot })
    .from(placedEvents)
    .innerJoin(slots, and(eq(slots.test, placedEvents.test), eq(slots.slotKey, placedEvents.slotKey)))
    .where(eq(placedEvents.event, sql.placeholder("event")))
    .prepare(),
);

function eventsOfSlot(db: Database, test: string, slot: Slot, arriving?: Arriving): SlotEvent[] {
  const rows = inSlot(db).all({ test, slotKey: slotKey(slot) });
  const stored = rows.map(({ body, ...stamp }) => ({ body: eventBodySchema.parse(JSON.parse(body)), ...stamp }));
  const others = stored.filter(({ serverSeq }) => serverSeq !== arriving?.serverSeq);
  return [...others, ...(arriving ? [arriving] : [])].flatMap(({ body, ...stamp }) => (isOfSlot(body) ? [{ body, ...stamp }] : []));
}

const inSlot = preparedQuery((db) =>
  db
    .select({ body: events.body, serverSeq: events.serverSeq, receivedAt: events.receivedAt })
    .from(placedEvents)
    .innerJoin(events, eq(events.serverSeq, placedEvents.serverSeq))
    .where(and(eq(placedEvents.test, sql.placeholder("test")), eq(placedEvents.slotKey, sql.placeholder("slotKey"))))
    .prepare(),
);

function isOfSlot(event: EventBody): event is SlotEvent["body"] {
  return event.type === "record" || event.type === "correct" || event.type === "void" || event.type === "resolve";
}
