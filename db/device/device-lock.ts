import "client-only";

/** One at a time on this phone, across its tabs and its service worker. */
export function underDeviceLock<T>(name: string, work: () => Promise<T>): Promise<T> {
  return navigator.locks.request(`battenbook-${name}`, work) as Promise<T>;
}

/** The same, but nothing when somebody else is at it already. */
export function underFreeDeviceLock<T>(name: string, work: () => Promise<T>): Promise<T | null> {
  return navigator.locks.request(`battenbook-${name}`, { ifAvailable: true }, (lock) => (lock ? work() : null)) as Promise<T | null>;
}
