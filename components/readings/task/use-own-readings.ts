import { useLiveQuery } from "dexie-react-hooks";
import { type OwnReading, ownReadings } from "@/db/device/own-readings";

export type { OwnReading };

/** The readings that stand on this phone for a test; undefined until the store has answered. */
export function useOwnReadings(test: string): readonly OwnReading[] | undefined {
  return useLiveQuery(() => ownReadings(test), [test]);
}
