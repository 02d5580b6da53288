import { onChange } from "./changes";
import type { Database } from "./connection";
import { onEnding } from "./ending";
import { liveSnapshot } from "./live-snapshot";

const BEAT_MS = 15_000;
/** several events of one batch make one picture */
const GATHER_MS = 60;

/**
 * A test's snapshots as they change, as server-sent events: `snapshot`, numbered by the cursor, and `beat` while nothing
 * changes. Every snapshot is whole, so whoever reconnects has caught up with the first one. Asked before each: whether the
 * listener may still see it.
 */
export function liveStream(db: Database, test: string, mayStillSee: () => Promise<boolean>, gone: AbortSignal): ReadableStream<Uint8Array> {
  const stop = new AbortController();
  gone.addEventListener("abort", () => stop.abort());
  return new ReadableStream<Uint8Array>({
    start: (controller) => sendWhileOpen(db, test, mayStillSee, controller, stop),
    cancel: () => stop.abort(),
  });
}

async function sendWhileOpen(
  db: Database,
  test: string,
  mayStillSee: () => Promise<boolean>,
  controller: ReadableStreamDefaultController<Uint8Array>,
  stop: AbortController,
): Promise<void> {
  const changes = changesOf(test, stop.signal);
  let last = "";
  while (!changes.isOver() && (await mayStillSee())) {
    const snapshot = liveSnapshot(db, test, new Date().toISOString());
    if (!snapshot || stop.signal.aborted) break;
    const now = JSON.stringify(snapshot);
    controller.enqueue(utf8(now === last ? "event: beat\ndata: beat\n\n" : `event: snapshot\nid: ${snapshot.cursor}\ndata: ${now}\n\n`));
    last = now;
    await changes.next();
  }
  if (!stop.signal.aborted) controller.close();
  stop.abort();
}

/**
 * `next` waits for a change, but not longer than a beat; a change heard meanwhile is not lost. Over when nobody listens any
 * more, or when the server has been asked to end: a line that stays open would keep it from ending.
 */
function changesOf(test: string, stopped: AbortSignal): { next: () => Promise<void>; isOver: () => boolean } {
  let heard = false;
  let ending = false;
  let wake = () => {};
  const off = onChange(test, () => {
    heard = true;
    wake();
  });
  const offEnding = onEnding(() => {
    ending = true;
    wake();
  });
  stopped.addEventListener("abort", () => {
    off();
    offEnding();
    wake();
  });
  return {
    isOver: () => ending || stopped.aborted,
    next: async () => {
      if (!heard && !ending && !stopped.aborted) await new Promise<void>((done) => wakeAfter(BEAT_MS, done, (now) => (wake = now)));
      if (heard && !stopped.aborted) await new Promise<void>((done) => setTimeout(done, GATHER_MS));
      heard = false;
    },
  };
}

function wakeAfter(ms: number, done: () => void, keep: (now: () => void) => void): void {
  const timer = setTimeout(done, ms);
  keep(() => {
    clearTimeout(timer);
    done();
  });
}

function utf8(text: string): Uint8Array {
  return new TextEncoder().encode(text);
}
