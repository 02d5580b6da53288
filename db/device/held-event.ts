import type { EventType } from "@/lib/sync/event";
import type { EventState } from "@/lib/sync/outbox";
import type { Envelope, Receipt } from "@/lib/sync/protocol";

/** One event as the phone keeps it: the exact bytes that are signed and sent, and where it stands on its way. */
export type HeldEvent = {
  readonly id: string;
  readonly device: string;
  readonly seq: number;
  readonly test: string;
  readonly slotKey: string | null;
  readonly type: EventType;
  readonly envelope: Envelope;
  readonly state: EventState;
  readonly receipt: Receipt | null;
  readonly savedAt: string;
};
