import { useLiveQuery } from "dexie-react-hooks";
import { deviceNote, keepDeviceNote } from "@/db/device/device-notes";

/** A mark of this phone and the way to set it; undefined until the store has answered. */
export function useDeviceNote(key: string) {
  const value = useLiveQuery(() => deviceNote(key), [key]);
  return { value, keep: (next: string) => keepDeviceNote(key, next) };
}
