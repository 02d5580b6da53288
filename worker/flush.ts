import { deviceIdentity, updateIdentity } from "@/db/device/device-identity";
import { underFreeDeviceLock } from "@/db/device/device-lock";
import { deviceToSend, eventsOfDevice, keepSending, keepStates, lastSending, unsentCount } from "@/db/device/event-queue";
import type { HeldEvent } from "@/db/device/held-event";
import { oweAllPhotographs } from "@/db/device/photograph-sending";
import { BATCH_EVENTS } from "@/lib/sync/batch-limits";
import { afterAnswer, afterBackup, afterComparison, afterSilence, nextBatch, type StateChange } from "@/lib/sync/outbox";
import { PROTOCOL, type SyncAnswer } from "@/lib/sync/protocol";
import type { Reach } from "@/lib/sync/queue-words";
import { retryDelay } from "@/lib/sync/retry";
import { signedInByKey } from "./sign-in";
import { browser, type Heard, type Surroundings, sync } from "./sync-request";

/** A phone with nothing to send still asks now and then: the server may have been restored and miss what it had. */
const QUIET_MS = 60_000;

type Wish = {
  /** a person pressed the button, or the page became visible: no wait is kept */
  readonly urgent: boolean;
};

/**
 * Sends what this phone holds, oldest first, one batch at a time, until nothing is left or nobody answers.
 *
 * One flusher for all tabs and the service worker, under a Web Lock; null when another is at it. An event leaves the
 * state "saved" only by a receipt of its own: silence, errors and portals leave it there.
 */
export function flush(wish: Wish, surroundings: Surroundings = browser): Promise<Reach | null> {
  return underFreeDeviceLock("flush", () => drained(wish, surroundings));
}

async function drained({ urgent }: Wish, around: Surroundings): Promise<Reach> {
  const { reach, notBefore, heardAt } = await lastSending();
  const waits = reach === "sign-in-needed" || around.now() < notBefore;
  if (waits && !urgent) return reach;
  const quietSince = heardAt ? around.now() - Date.parse(heardAt) : Number.POSITIVE_INFINITY;
  if (!urgent && quietSince < QUIET_MS && (await unsentCount()) === 0) return reach;
  return sendUntilQuiet(around);
}

async function sendUntilQuiet(around: Surroundings): Promise<Reach> {
  let most = BATCH_EVENTS;
  let hasSignedIn = false;
  for (;;) {
    const device = await deviceToSend();
    if (device === null) return "unknown";
    const batch = nextBatch(await eventsOfDevice(device)).slice(0, most);
    const heard = await sentBatch(device, batch, around);
    if (heard.type === "too-large" && most > 1) {
      await keepStates(afterSilence(sending(batch)));
      most = Math.max(1, Math.floor(batch.length / 2));
      continue;
    }
    if (heard.type === "sign-in-needed" && !hasSignedIn) {
      hasSignedIn = true;
      await keepStates(afterSilence(sending(batch)));
      if (await signedInByKey(around)) continue;
    }
    const moved = await takenIn(device, batch, heard, around);
    if (moved !== "more") return moved;
  }
}

async function sentBatch(device: string, batch: readonly HeldEvent[], around: Surroundings): Promise<Heard> {
  await keepStates(batch.map(({ id }) => ({ id, state: "sending", receipt: null })));
  const events = batch.map(({ envelope }) => envelope);
  return sync({ protocol: PROTOCOL, device, holds: await unsentCount(), events }, around);
}

/** "more" while the queue moves; else where sending stands now. */
async function takenIn(device: string, batch: readonly HeldEvent[], heard: Heard, around: Surroundings): Promise<Reach | "more"> {
  if (heard.type === "sign-in-needed") return paused(batch);
  if (heard.type !== "answer") return failed(batch, heard.type === "no-answer" ? heard.retryAfterMs : null, around);
  if (!(await isOurServer(heard.answer))) return failed(batch, null, around, true);
  const changes = afterAnswer(batch, heard.answer);
  const moved = changes.filter((change) => change.state !== "saved").length;
  await keepStates([...changes, ...(await changesByComparison(device, changes, heard.answer))]);
  await keepStates(afterBackup(await eventsOfDevice(device), heard.answer.confirmedTo));
  await updateIdentity({ server: idOf(heard.answer), clockOffsetMs: heard.clockOffsetMs });
  if (batch.length > 0 && moved === 0) return failed(batch, null, around);
  const now = new Date(around.now()).toISOString();
  await keepSending({ reach: "reached", failures: 0, notBefore: 0, heardAt: now, isStranger: false, ledgerHead: heard.answer.ledgerHead });
  return (await unsentCount()) > 0 ? "more" : "reached";
}

/** What the server has lost since; events just answered for are left alone, or a server that miscounts would get them for ever. */
async function changesByComparison(device: string, changes: readonly StateChange[], answer: SyncAnswer): Promise<StateChange[]> {
  const answered = new Set(changes.map(({ id }) => id));
  const others = (await eventsOfDevice(device)).filter(({ id }) => !answered.has(id));
  const known = (await deviceIdentity())?.server;
  const isNewEpoch = known !== undefined && known !== null && known.epoch !== answer.server.epoch;
  if (isNewEpoch) await oweAllPhotographs();
  return afterComparison(others, answer.device, isNewEpoch);
}

async function paused(batch: readonly HeldEvent[]): Promise<Reach> {
  await keepStates(afterSilence(sending(batch)));
  await keepSending({ reach: "sign-in-needed" });
  return "sign-in-needed";
}

async function failed(batch: readonly HeldEvent[], retryAfter: number | null, around: Surroundings, isStranger = false): Promise<Reach> {
  await keepStates(afterSilence(sending(batch)));
  const failures = (await lastSending()).failures + 1;
  const wait = Math.max(retryDelay(failures, around.chance()), retryAfter ?? 0);
  await keepSending({ reach: "no-answer", isStranger, failures, notBefore: around.now() + wait });
  return "no-answer";
}

// the batch was read before it was marked
function sending(batch: readonly HeldEvent[]): HeldEvent[] {
  return batch.map((event) => ({ ...event, state: "sending" }));
}

/** Somebody else's server under the same name is no place for this phone's readings. */
async function isOurServer(answer: SyncAnswer): Promise<boolean> {
  const known = (await deviceIdentity())?.server;
  return !known || known.id === answer.server.id;
}

function idOf({ server }: SyncAnswer) {
  return { id: server.id, epoch: server.epoch };
}
