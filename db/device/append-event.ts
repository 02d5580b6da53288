import "client-only";
import { v7 as newEventId } from "uuid";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import type { EventBody } from "@/lib/sync/event";
import { slotKey } from "@/lib/sync/slot-key";
import { type DeviceDatabase, deviceDatabase } from "./device-database";
import type { DeviceIdentity } from "./device-identity";
import { underDeviceLock } from "./device-lock";
import type { HeldEvent } from "./held-event";
import { keptTrying } from "./kept-trying";
import { signatureOf } from "./signature";
import { NotEnrolled } from "./storage-failed";
import { markStored } from "./storage-sentinel";
import { unfinishedKey } from "./unfinished-entries";

type Drafted<E> = E extends unknown ? Omit<E, "v" | "id" | "device" | "seq" | "clockOffsetMs"> : never;

/** An act as the person did it; the phone adds its own number, the next of its sequence, and its signature. */
export type EventDraft = Drafted<EventBody>;

/**
 * The event as it now stands on this phone's disk. It is answered only after the transaction has completed.
 *
 * Signing can't run inside an IndexedDB transaction, so it runs before, under a lock, and the counter is compared inside:
 * the sequence stays without gaps even where the lock is not kept. The id stays the same from try to try, so that one whose
 * success was not heard is not made twice. Throws `StorageFailed` after three fresh connections.
 */
export function appendEvent(draft: EventDraft, id: string = newEventId()): Promise<HeldEvent> {
  return underDeviceLock("append", async () => {
    const event = await keptTrying(() => appended(deviceDatabase(), id, draft));
    markStored(event.device, event.seq);
    return event;
  });
}

async function appended(db: DeviceDatabase, id: string, draft: EventDraft): Promise<HeldEvent> {
  const known = await db.events.get(id);
  if (known) return known;
  const identity = await db.identity.get("self");
  if (!identity) throw new NotEnrolled("this phone is not enrolled");
  const last = await lastSeq(db, identity.device);
  const event = await signedEvent(id, draft, identity, last + 1);
  const photographs = "photographs" in draft ? (draft.photographs ?? []) : [];
  // without photographs their table is left out: a reading waits for nothing that it does not need
  const tables = [db.events, db.counters, db.unfinished, ...(photographs.length > 0 ? [db.photographs] : [])];
  await db.transaction("rw", tables, async () => {
    const now = await lastSeq(db, identity.device);
    if (now !== last) throw new Error(`the counter moved from ${last} to ${now}`);
    await db.counters.put({ device: identity.device, last: last + 1 });
    await db.events.add(event);
    for (const name of photographs) await owePhotograph(db, name, id);
    if (event.slotKey !== null && event.type !== "void") await db.unfinished.delete(unfinishedKey(event.test, event.slotKey));
  });
  return event;
}

/** From now on a saved reading names it. One that the server has already is not sent twice. */
async function owePhotograph(db: DeviceDatabase, name: string, event: string): Promise<void> {
  const held = await db.photographs.get(name);
  // a photograph that was lost must not hold its reading up
  if (!held) return;
  const state = held.state === "unfinished" ? "saved" : held.state;
  await db.photographs.update(name, { state, events: [...held.events, event] });
}

async function signedEvent(id: string, draft: EventDraft, identity: DeviceIdentity, seq: number): Promise<HeldEvent> {
  const { device, clockOffsetMs, keys } = identity;
  const body = canonicalJson({ ...draft, v: 1, id, device, seq, clockOffsetMs });
  return {
    id,
    device,
    seq,
    test: draft.test,
    slotKey: draft.slot ? slotKey(draft.slot) : null,
    type: draft.type,
    envelope: { body, signature: await signatureOf(body, keys) },
    state: "saved",
    receipt: null,
    savedAt: new Date().toISOString(),
  };
}

async function lastSeq(db: DeviceDatabase, device: string): Promise<number> {
  return (await db.counters.get(device))?.last ?? 0;
}
