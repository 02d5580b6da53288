import "client-only";
import { deviceDatabase } from "./device-database";

/** A mark that belongs to this phone alone: a caution confirmed, the station it reads. */
export async function deviceNote(key: string): Promise<string | null> {
  return (await deviceDatabase().notes.get(key))?.value ?? null;
}

export async function keepDeviceNote(key: string, value: string): Promise<void> {
  await deviceDatabase().notes.put({ key, value });
}
