import { EventEmitter, once } from "node:events";

/** Calls back when the process has been asked to end, until the returned function is called: what stays open by itself closes then. */
export function onEnding(listener: () => void): () => void {
  emitter().on("ending", listener);
  return () => emitter().off("ending", listener);
}

/** From the first signal on that asks the process to end. */
export function watchForEnding(): void {
  for (const signal of ["SIGINT", "SIGTERM"] as const) void once(process, signal).then(tellEnding);
}

export function tellEnding(): void {
  emitter().emit("ending");
}

// Next loads this module once per bundle: who watches and who listens must share one
function emitter(): EventEmitter {
  const shared = globalThis as { battenbookEnding?: EventEmitter };
  shared.battenbookEnding ??= new EventEmitter().setMaxListeners(0);
  return shared.battenbookEnding;
}
