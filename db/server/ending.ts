import { EventEmitter } from "node:events";

/** What is in hand when the server is asked to end is done well within this time; a silent connection would hold it for ever. */
const PATIENCE_MS = 5000;
const exitCodes = { SIGINT: 130, SIGTERM: 143 } as const;

/** Calls back when the process has been asked to end, at once where it has been, until the returned function is called. */
export function onEnding(listener: () => void): () => void {
  const ending = shared();
  if (ending.isAsked) listener();
  ending.emitter.on("ending", listener);
  return () => ending.emitter.off("ending", listener);
}

/** From the first signal on: what stays open by itself closes, and the process ends when its work is done or its time is up. */
export function watchForEnding(): void {
  for (const [signal, code] of Object.entries(exitCodes)) {
    process.once(signal, () => {
      tellEnding();
      setTimeout(() => process.exit(code), PATIENCE_MS).unref();
    });
  }
}

export function tellEnding(): void {
  const ending = shared();
  ending.isAsked = true;
  ending.emitter.emit("ending");
}

type Ending = { readonly emitter: EventEmitter; isAsked: boolean };

// Next loads this module once per bundle: who watches and who listens must share one
function shared(): Ending {
  const place = globalThis as { battenbookEnding?: Ending };
  place.battenbookEnding ??= { emitter: new EventEmitter().setMaxListeners(0), isAsked: false };
  return place.battenbookEnding;
}
