import { EventEmitter } from "node:events";

type Listener = () => void;

/** Tells the open live pages of a test that something has changed; they ask what for themselves. */
export function tellChange(test: string): void {
  emitter().emit(test);
}

/** Calls back after every change of a test, until the returned function is called. */
export function onChange(test: string, listener: Listener): () => void {
  emitter().on(test, listener);
  return () => emitter().off(test, listener);
}

// Next loads this module once per bundle: sender and listeners must share one
function emitter(): EventEmitter {
  const shared = globalThis as { battenbookChanges?: EventEmitter };
  shared.battenbookChanges ??= new EventEmitter().setMaxListeners(0);
  return shared.battenbookChanges;
}
