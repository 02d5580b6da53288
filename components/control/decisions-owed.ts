import type { LiveSnapshot, MoveProgress, Phone, Quarantined, ReadingDue } from "@/lib/sync/live";
import { isReadAgain } from "@/lib/sync/reconciling";
import { phoneInWords } from "./phone-in-words";
import { slotInWords } from "./slot-in-words";

/** What only the lead can settle, most pressing first. */
export type Decision =
  | { readonly kind: "disagreement"; readonly due: ReadingDue; readonly sentence: string }
  | { readonly kind: "move"; readonly move: MoveProgress; readonly sentence: string }
  | { readonly kind: "quarantined"; readonly held: Quarantined; readonly sentence: string }
  | { readonly kind: "missing"; readonly phone: Phone; readonly sentence: string };

export function decisionsOwed(snapshot: LiveSnapshot): Decision[] {
  return [...disagreements(snapshot), ...movesInDispute(snapshot), ...quarantined(snapshot), ...phonesWithGaps(snapshot)];
}

function disagreements(snapshot: LiveSnapshot): Decision[] {
  return snapshot.due
    .filter((due) => due.state === "disagrees" && !isReadAgain(snapshot.moves, due))
    .map((due) => ({ kind: "disagreement", due, sentence: `Readings disagree: ${slotInWords(due.slot)}.` }));
}

function movesInDispute(snapshot: LiveSnapshot): Decision[] {
  return snapshot.moves
    .filter((move) => move.state === "disagrees")
    .map((move) => ({ kind: "move", move, sentence: `Two leads gave different orders for move ${move.no}.` }));
}

function quarantined(snapshot: LiveSnapshot): Decision[] {
  const name = new Map(snapshot.phones.map((phone) => [phone.device, phone.name]));
  return snapshot.quarantined.map((held) => ({
    kind: "quarantined",
    held,
    sentence: `Set aside, from ${name.get(held.device) ?? "an unknown phone"}: ${held.message}`,
  }));
}

function phonesWithGaps(snapshot: LiveSnapshot): Decision[] {
  return snapshot.phones
    .filter((phone) => phone.missing.length > 0 && phone.writtenOff === null)
    .map((phone) => ({ kind: "missing", phone, sentence: `${phone.name} (${phone.person}): ${phoneInWords(phone)}.` }));
}
