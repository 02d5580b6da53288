import "client-only";
import { deviceDatabase } from "./device-database";

export function unfinishedKey(test: string, slotKey: string): string {
  return `${test}|${slotKey}`;
}

/** What was being typed for this slot when the page was last here. */
export async function unfinishedEntry(test: string, slotKey: string): Promise<unknown> {
  return (await deviceDatabase().unfinished.get(unfinishedKey(test, slotKey)))?.entry ?? null;
}

export async function keepUnfinishedEntry(test: string, slotKey: string, entry: unknown): Promise<void> {
  const key = unfinishedKey(test, slotKey);
  await deviceDatabase().unfinished.put({ key, test, slotKey, entry, touchedAt: new Date().toISOString() });
}

export async function dropUnfinishedEntry(test: string, slotKey: string): Promise<void> {
  await deviceDatabase().unfinished.delete(unfinishedKey(test, slotKey));
}

/** How many entries stand half typed on this phone; a new version of the program waits for none. */
export function unfinishedCount(): Promise<number> {
  return deviceDatabase().unfinished.count();
}
