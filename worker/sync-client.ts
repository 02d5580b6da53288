const HEARTBEAT_MS = 15_000;
const SAVED = "battenbook-saved";

/** Tells the triggers that an event was saved. */
export function announceSaved(): void {
  dispatchEvent(new Event(SAVED));
}

/** Sends what the phone holds and fetches its job sheets anew. The flush is loaded when it is first needed: a page shows without it. */
export async function sendNow(urgent: boolean): Promise<void> {
  const [{ flush }, { flushPhotographs }, { refreshJobSheets }] = await Promise.all([
    import("./flush"),
    import("./flush-photographs"),
    import("./job-sheet-refresh"),
  ]);
  const reach = await flush({ urgent });
  if (reach !== "reached") return;
  await refreshJobSheets();
  await flushPhotographs({ urgent });
}

/** At start, on becoming visible, on `online`, after each save, and every 15 s; answers how to stop. */
export function startSending(): () => void {
  const now = () => void sendNow(true).catch(() => undefined);
  const inTurn = () => void sendNow(false).catch(() => undefined);
  const visible = () => document.visibilityState === "visible" && now();
  const saved = () => {
    inTurn();
    void askForBackgroundSync();
  };
  const heartbeat = setInterval(inTurn, HEARTBEAT_MS);
  addEventListener("online", now);
  addEventListener(SAVED, saved);
  document.addEventListener("visibilitychange", visible);
  now();
  return () => {
    clearInterval(heartbeat);
    removeEventListener("online", now);
    removeEventListener(SAVED, saved);
    document.removeEventListener("visibilitychange", visible);
  };
}

type WithSync = ServiceWorkerRegistration & { readonly sync?: { register: (tag: string) => Promise<void> } };

// a bonus where the browser has it: the worker sends even when the page is closed
async function askForBackgroundSync(): Promise<void> {
  const registration = (await navigator.serviceWorker?.getRegistration()) as WithSync | undefined;
  await registration?.sync?.register("flush").catch(() => undefined);
}
