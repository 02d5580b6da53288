import { useLiveQuery } from "dexie-react-hooks";
import { deviceDatabase } from "@/db/device/device-database";
import { lastSending } from "@/db/device/event-queue";
import { photographsOwed } from "@/db/device/photographs";
import { type QueueCount, queueCount } from "@/lib/sync/outbox";
import type { Reach } from "@/lib/sync/queue-words";

export type Queue = {
  readonly count: QueueCount;
  /** photographs that no server has answered for */
  readonly photographs: number;
  readonly reach: Reach;
  readonly heardAt: string | null;
  readonly isStranger: boolean;
};

/** What this phone holds and whether it can be sent; undefined until the store has answered. */
export function useQueue(): Queue | undefined {
  return useLiveQuery(async () => {
    const states = await deviceDatabase().events.toArray();
    const { reach, heardAt, isStranger } = await lastSending();
    return { count: queueCount(states), photographs: await photographsOwed(), reach, heardAt, isStranger };
  });
}
