import "client-only";
import type { DeviceDatabase } from "./device-database";

const KEY = "battenbook-sentinel";

/** What stood in the store when it was last written, remembered outside IndexedDB. */
export type Sentinel = { readonly device: string; readonly seq: number };

/** Notes outside the store how far it got, so that an emptied store is noticed. */
export function markStored(device: string, seq: number): void {
  try {
    globalThis.localStorage?.setItem(KEY, JSON.stringify({ device, seq } satisfies Sentinel));
  } catch {
    // the sentinel is a second witness: saving never waits for it
  }
}

/** The events this phone once held and holds no more, because the browser emptied or rolled back its store; null where all is well. */
export async function lostFromStore(
  db: DeviceDatabase,
): Promise<{ readonly device: string; readonly from: number; readonly to: number } | null> {
  const sentinel = storedSentinel();
  if (!sentinel) return null;
  const last = (await db.counters.get(sentinel.device))?.last ?? 0;
  return last < sentinel.seq ? { device: sentinel.device, from: last + 1, to: sentinel.seq } : null;
}

/** The person has seen that the store was emptied. */
export function forgetSentinel(): void {
  globalThis.localStorage?.removeItem(KEY);
}

function storedSentinel(): Sentinel | null {
  try {
    const text = globalThis.localStorage?.getItem(KEY);
    return text ? (JSON.parse(text) as Sentinel) : null;
  } catch {
    return null;
  }
}
