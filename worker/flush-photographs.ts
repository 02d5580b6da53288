import { underFreeDeviceLock } from "@/db/device/device-lock";
import { unsentCount } from "@/db/device/event-queue";
import {
  announcedPhotograph,
  letGoPhotograph,
  notePhotographRefused,
  notePhotographSent,
  photographsToLetGo,
  photographsToSend,
} from "@/db/device/photograph-sending";
import { keepPhotographWait, photographWait } from "@/db/device/photograph-wait";
import type { Reach } from "@/lib/sync/queue-words";
import { retryDelay } from "@/lib/sync/retry";
import { isOnServer, type PhotographHeard, sentPhotograph } from "./photograph-request";
import { signedInByKey } from "./sign-in";
import { browser, type Surroundings } from "./sync-request";

type Wish = {
  /** a person pressed the button, or the page became visible: no wait is kept, and what was refused is offered again */
  readonly urgent: boolean;
};

/**
 * Sends the photographs of this phone, one in flight, after the events that name them: while an event waits, photographs do.
 *
 * Under a lock of its own, so that no photograph on a slow line keeps a reading back; null when another is at it. A photograph is
 * owed until the server has answered for it by its hash: silence, errors and portals leave it here, and it is tried for ever.
 */
export function flushPhotographs(wish: Wish, around: Surroundings = browser): Promise<Reach | null> {
  return underFreeDeviceLock("photographs", () => drained(wish, around));
}

async function drained({ urgent }: Wish, around: Surroundings): Promise<Reach> {
  const { failures, notBefore } = await photographWait();
  if (!urgent && around.now() < notBefore) return "no-answer";
  for (const name of await photographsToSend()) {
    if ((await unsentCount()) > 0) return "unknown";
    const photograph = await announcedPhotograph(name);
    if (photograph === null || (photograph.refusal !== null && !urgent)) continue;
    const heard = await sentSignedIn(photograph, around);
    if (heard.type === "sign-in-needed") await waited(failures + 1, null, around);
    if (heard.type === "no-answer") await waited(failures + 1, heard.retryAfterMs, around);
    if (heard.type === "sign-in-needed" || heard.type === "no-answer") return heard.type;
    if (heard.type === "refused") await notePhotographRefused(name, heard.sentence);
    else await notePhotographSent(name, around.now());
  }
  await keepPhotographWait({ failures: 0, notBefore: 0 });
  if (urgent) await letGo(around);
  return "reached";
}

async function sentSignedIn(photograph: Parameters<typeof sentPhotograph>[0], around: Surroundings): Promise<PhotographHeard> {
  const heard = await sentPhotograph(photograph, around);
  if (heard.type !== "sign-in-needed" || !(await signedInByKey(around))) return heard;
  return sentPhotograph(photograph, around);
}

async function waited(failures: number, retryAfter: number | null, around: Surroundings): Promise<void> {
  const wait = Math.max(retryDelay(failures, around.chance()), retryAfter ?? 0);
  await keepPhotographWait({ failures, notBefore: around.now() + wait });
}

async function letGo(around: Surroundings): Promise<void> {
  for (const name of await photographsToLetGo(around.now())) {
    if (await isOnServer(name, around)) await letGoPhotograph(name);
  }
}
