import { useLiveQuery } from "dexie-react-hooks";
import { deviceDatabase } from "@/db/device/device-database";
import type { HeldEvent } from "@/db/device/held-event";
import { bodyOf } from "@/db/device/own-readings";
import type { EventBody } from "@/lib/sync/event";

export type Held = { readonly event: HeldEvent; readonly body: EventBody };

/** Every event of this phone, the newest first. */
export function useHeldEvents(): readonly Held[] | undefined {
  return useLiveQuery(async () => {
    const events = await deviceDatabase().events.orderBy("[device+seq]").reverse().toArray();
    return events.map((event) => ({ event, body: bodyOf(event) }));
  });
}
