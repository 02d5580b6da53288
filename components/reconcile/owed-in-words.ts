import { slotInWords } from "@/components/control/slot-in-words";
import type { LiveSnapshot } from "@/lib/sync/live";
import type { OwedBeforeReconciled } from "@/lib/sync/reconciling";

/** What is still owed before a test is reconciled, a sentence each. */
export function owedInWords(owed: OwedBeforeReconciled, { due, phones }: Pick<LiveSnapshot, "due" | "phones">): string {
  switch (owed.type) {
    case "OpenDisagreement": {
      const slot = due.find(({ slotKey }) => slotKey === owed.slotKey)?.slot;
      return `Readings disagree: ${slot ? slotInWords(slot) : owed.slotKey}.`;
    }
    case "MoveInDispute":
      return `Two leads gave different orders for move ${owed.move}.`;
    case "UnexplainedGap": {
      const name = phones.find(({ device }) => device === owed.device)?.name ?? "A phone";
      return `${name} has taken ${owed.missing} more than have arrived: bring it near, read its file in, or write it off with a reason.`;
    }
  }
}
