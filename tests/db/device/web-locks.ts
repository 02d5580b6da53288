type Grant = (lock: { name: string } | null) => unknown;
type Options = { readonly ifAvailable?: boolean };

/** Web Locks as the browser gives them, for one process: one holder per name, the others wait their turn. */
export function installWebLocks(): void {
  const held = new Map<string, Promise<unknown>>();
  const request = (name: string, second: Options | Grant, third?: Grant) => {
    const grant = third ?? (second as Grant);
    const before = held.get(name);
    if (before && third && (second as Options).ifAvailable) return Promise.resolve(grant(null));
    const run = (before ?? Promise.resolve()).then(() => grant({ name })).finally(() => held.get(name) === settled && held.delete(name));
    const settled = run.then(
      () => undefined,
      () => undefined,
    );
    held.set(name, settled);
    return run;
  };
  install(request);
}

/** A browser that hands out every lock at once: what is left when locks are broken. */
export function installBrokenLocks(): void {
  install((name: string, second: Options | Grant, third?: Grant) => Promise.resolve((third ?? (second as Grant))({ name })));
}

function install(request: unknown): void {
  Object.defineProperty(globalThis, "navigator", { value: { locks: { request } }, configurable: true, writable: true });
}
