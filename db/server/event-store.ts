import { and, asc, desc, eq, isNull, max, ne, notInArray, or, sql } from "drizzle-orm";
import type { Envelope, QuarantineCode, Receipt, SyncAnswer } from "@/lib/sync/protocol";
import { events } from "../schema/events";
import type { Database } from "./connection";
import { preparedInsert, preparedQuery } from "./prepared-query";

export type StoredEvent = typeof events.$inferSelect;

/** Keeps an event with the receipt it gets. The number is given, because the receipt is worked out before. */
export function storeEvent(db: Database, event: StoredEvent): void {
  insertEvent(db, event);
}

const insertEvent = preparedInsert(events);

export function nextServerSeq(db: Database): number {
  const last = db
    .select({ value: max(events.serverSeq) })
    .from(events)
    .get();
  return (last?.value ?? 0) + 1;
}

/** The event that was sent before with exactly these bytes and this signature; its receipt is given again. */
export function sameEvent(db: Database, { signature }: Envelope, bodyHash: string): StoredEvent | undefined {
  return withBytes(db)
    .all({ bodyHash })
    .find((event) => event.signature === signature);
}

const withBytes = preparedQuery((db) => {
  const same = db
    .select()
    .from(events)
    .where(eq(events.bodyHash, sql.placeholder("bodyHash")));
  return same.orderBy(asc(events.serverSeq)).prepare();
});

/** Whether another event has this id. */
export function isIdTaken(db: Database, id: string, bodyHash: string): boolean {
  return otherOfId(db).get({ id, bodyHash }) !== undefined;
}

const otherOfId = preparedQuery((db) => {
  const taken = and(eq(events.id, sql.placeholder("id")), ne(events.bodyHash, sql.placeholder("bodyHash")), isGenuine());
  return db.select({ id: events.id }).from(events).where(taken).prepare();
});

/** Whether another event of the device has this number. */
export function isSeqTaken(db: Database, device: string, seq: number, bodyHash: string): boolean {
  return otherOfSeq(db).get({ device, seq, bodyHash }) !== undefined;
}

const otherOfSeq = preparedQuery((db) => {
  const number = and(eq(events.device, sql.placeholder("device")), eq(events.seq, sql.placeholder("seq")));
  const taken = and(number, ne(events.bodyHash, sql.placeholder("bodyHash")), isGenuine());
  return db.select({ id: events.id }).from(events).where(taken).prepare();
});

// what anybody may have written, or what broke on its way, takes no name or number from the real event
function isGenuine() {
  return or(isNull(events.code), notInArray(events.code, ["bad-signature", "unknown-device", "malformed-body"]));
}

/** An event by its id; of several with one id (all but the first are set aside) the last. What only bears its name is none. */
export function eventById(db: Database, id: string): StoredEvent | undefined {
  return genuineEventById(db, id) ?? bearingName(db, id);
}

/** A genuine event by its id; undefined where there are only broken or unproved copies of it. */
export function genuineEventById(db: Database, id: string): StoredEvent | undefined {
  return db
    .select()
    .from(events)
    .where(and(eq(events.id, id), isGenuine()))
    .orderBy(desc(events.serverSeq))
    .get();
}

function bearingName(db: Database, id: string): StoredEvent | undefined {
  return db.select().from(events).where(eq(events.id, id)).orderBy(desc(events.serverSeq)).get();
}

/** Events that stand on an act, or that want to let it in. */
export function eventsOn(db: Database, basis: string): StoredEvent[] {
  return onBasis(db).all({ basis });
}

const onBasis = preparedQuery((db) => {
  const standing = db
    .select()
    .from(events)
    .where(eq(events.basis, sql.placeholder("basis")));
  return standing.orderBy(asc(events.serverSeq)).prepare();
});

const MOST_MISSING = 1000;

/**
 * What has arrived from a device: its highest number, and the first thousand numbers below it that have not; when those have come, it
 * hears of the next. A broken copy has not arrived.
 */
export function receivedFrom(db: Database, device: string): SyncAnswer["device"] & { received: number } {
  const rows = db
    .selectDistinct({ seq: events.seq })
    .from(events)
    .where(and(eq(events.device, device), isGenuine()))
    .orderBy(asc(events.seq))
    .all();
  const seqs = rows.flatMap(({ seq }) => seq ?? []);
  return { highestSeq: seqs.at(-1) ?? 0, missing: gapsIn(seqs), received: seqs.length };
}

// a phone may claim any number: what is answered does not grow with it
function gapsIn(seqs: readonly number[]): number[] {
  const missing: number[] = [];
  let due = 1;
  for (const seq of seqs) {
    while (due < seq && missing.length < MOST_MISSING) missing.push(due++);
    due = seq + 1;
  }
  return missing;
}

export function receiptOf(event: Pick<StoredEvent, "id" | "outcome" | "serverSeq" | "code" | "message">): Receipt {
  const { id, outcome, serverSeq, code, message } = event;
  return { id, outcome, serverSeq, ...aside(code, message) };
}

function aside(code: QuarantineCode | null, message: string | null): { code?: QuarantineCode; message?: string } {
  return code === null ? {} : { code, message: message ?? "" };
}
