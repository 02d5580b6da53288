import { BATCH_BYTES, BATCH_EVENTS } from "./batch-limits";
import { envelopeHash } from "./envelope-hash";
import type { Receipt, SyncAnswer } from "./protocol";

/**
 * The phone's queue as plain rules: what is sent next, and what an answer makes of it. The page and the service worker
 * both run these; neither storage nor network is known here.
 *
 * saved (here) → sending → on-server → confirmed (in a backup, or the report issued); aside: quarantined (kept by the
 * server out of the result, still on the phone). A crash while sending means saved.
 */
export type EventState = "saved" | "sending" | "on-server" | "confirmed" | "quarantined";

export type QueuedEvent = {
  readonly id: string;
  readonly seq: number;
  readonly state: EventState;
  readonly envelope: { readonly body: string; readonly signature: string | null };
};

export type StateChange = { readonly id: string; readonly state: EventState; readonly receipt: Receipt | null };

/** Events to send now: in order of their numbers, at most 50 and at most 256 KB, but always at least one. */
export function nextBatch<E extends QueuedEvent>(events: readonly E[]): E[] {
  const batch: E[] = [];
  let bytes = 0;
  for (const event of events.filter(isUnsent).sort(bySeq)) {
    bytes += sizeOf(event);
    if (batch.length === BATCH_EVENTS || (batch.length > 0 && bytes > BATCH_BYTES)) break;
    batch.push(event);
  }
  return batch;
}

/** What the queue holds that no server has answered for. */
export function isUnsent(event: Pick<QueuedEvent, "state">): boolean {
  return event.state === "saved" || event.state === "sending";
}

/** After a crash, a cut or an answer that never came: nothing is known of what was being sent. */
export function afterSilence(batch: readonly QueuedEvent[]): StateChange[] {
  return batch.filter((event) => event.state === "sending").map(({ id }) => ({ id, state: "saved", receipt: null }));
}

/**
 * What the answer says of each event of the batch. An event without a receipt of its own goes back to saved, and so does
 * one that did not arrive as it was sent: the receipt is of something else.
 */
export function afterAnswer(batch: readonly QueuedEvent[], answer: SyncAnswer): StateChange[] {
  return batch.map(({ id, envelope }, place) => {
    const receipt = answer.results[place];
    const isWhole = answer.received[place] === envelopeHash(envelope);
    if (!receipt || !isWhole || (receipt.id !== null && receipt.id !== id)) return { id, state: "saved", receipt: null };
    return { id, state: receipt.outcome === "quarantined" ? "quarantined" : "on-server", receipt };
  });
}

/**
 * What must be sent again: everything this phone holds that the server lists as missing or that lies above its highest
 * number. After a restore from an older backup (a new epoch) that is what the server lost; while the epoch is the same, what
 * it has set aside is settled, or it would come back for ever.
 */
export function afterComparison(events: readonly QueuedEvent[], known: SyncAnswer["device"], isNewEpoch: boolean): StateChange[] {
  const missing = new Set(known.missing);
  return events
    .filter((event) => !isUnsent(event) && (isNewEpoch || event.state !== "quarantined"))
    .filter(({ seq }) => missing.has(seq) || seq > known.highestSeq)
    .map(({ id }) => ({ id, state: "saved", receipt: null }));
}

type Answered = Pick<QueuedEvent, "id" | "state"> & { readonly receipt: Receipt | null };

/** What has become safe: everything on the server up to the number to which it has backed up what it took in. */
export function afterBackup(events: readonly Answered[], confirmedTo: number): StateChange[] {
  return events
    .filter(({ state, receipt }) => state === "on-server" && receipt !== null && receipt.serverSeq <= confirmedTo)
    .map(({ id }) => ({ id, state: "confirmed", receipt: null }));
}

/** `confirmed` are those of `onServer` that are in a backup too. */
export type QueueCount = { readonly unsent: number; readonly onServer: number; readonly confirmed: number; readonly quarantined: number };

/** How many events of a phone are here only, on the server, safe in a backup, and set aside. */
export function queueCount(events: Iterable<Pick<QueuedEvent, "state">>): QueueCount {
  const count = { unsent: 0, onServer: 0, confirmed: 0, quarantined: 0 };
  for (const event of events) {
    if (isUnsent(event)) count.unsent += 1;
    else if (event.state === "quarantined") count.quarantined += 1;
    else count.onServer += 1;
    if (event.state === "confirmed") count.confirmed += 1;
  }
  return count;
}

/** Bytes of an event as it travels: its text once more as JSON, and the comma after it. */
function sizeOf({ envelope }: QueuedEvent): number {
  return new TextEncoder().encode(JSON.stringify(envelope)).length + 1;
}

function bySeq(a: QueuedEvent, b: QueuedEvent): number {
  return a.seq - b.seq;
}
