import "client-only";
import { isUnsent, type StateChange } from "@/lib/sync/outbox";
import type { Reach } from "@/lib/sync/queue-words";
import { deviceDatabase } from "./device-database";
import type { HeldEvent } from "./held-event";

/** What the last try to send came to; page and service worker go by the same. */
export type Sending = {
  readonly reach: Reach;
  /** tries that failed in a row */
  readonly failures: number;
  /** no try before this moment, unless a person asks for one [ms since 1970] */
  readonly notBefore: number;
  /** when the server was last heard */
  readonly heardAt: string | null;
  /** a server answered that is not the one this phone was enrolled at */
  readonly isStranger: boolean;
  /** head of the test's ledger as the server last told it: this phone is its witness */
  readonly ledgerHead: string | null;
};

const neverTried: Sending = { reach: "unknown", failures: 0, notBefore: 0, heardAt: null, isStranger: false, ledgerHead: null };

/** The device whose events are sent next: the one with the oldest unsent event, else the phone's own number; null before enrolment. */
export async function deviceToSend(): Promise<string | null> {
  const db = deviceDatabase();
  const unsent = await db.events.where("state").anyOf("saved", "sending").sortBy("savedAt");
  return unsent[0]?.device ?? (await db.identity.get("self"))?.device ?? null;
}

export function eventsOfDevice(device: string): Promise<HeldEvent[]> {
  return deviceDatabase().events.where("[device+seq]").between([device, 0], [device, Number.POSITIVE_INFINITY]).toArray();
}

/** Whether the server has met another phone with this one's number: a copied profile. */
export async function isForked(device: string): Promise<boolean> {
  return (await eventsOfDevice(device)).some(({ receipt }) => receipt?.code === "forked-device");
}

export async function unsentCount(): Promise<number> {
  return deviceDatabase().events.filter(isUnsent).count();
}

export async function keepStates(changes: readonly StateChange[]): Promise<void> {
  const db = deviceDatabase();
  await db.transaction("rw", db.events, async () => {
    for (const { id, state, receipt } of changes) await db.events.update(id, receipt ? { state, receipt } : { state });
  });
}

export async function lastSending(): Promise<Sending> {
  const kept = await deviceDatabase().lastAnswer.get("sending");
  return kept ? (kept.value as Sending) : neverTried;
}

export async function keepSending(change: Partial<Sending>): Promise<void> {
  await deviceDatabase().lastAnswer.put({ key: "sending", value: { ...(await lastSending()), ...change } });
}
