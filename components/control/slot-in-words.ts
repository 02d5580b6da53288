import type { Slot } from "@/lib/sync/slot";

/** A reading due, as it is called out: "station B at move 3", "mark FP before the moves". */
export function slotInWords(slot: Slot): string {
  switch (slot.kind) {
    case "batten":
      return `station ${slot.station} at move ${slot.move}${slot.repeat > 1 ? `, repeat ${slot.repeat}` : ""}`;
    case "draft":
      return `draft mark ${slot.mark} ${slot.round} the moves`;
    case "freeboard":
      return `freeboard ${slot.mark} ${slot.round} the moves`;
    case "sounding":
      return `tank ${slot.tank} ${slot.round} the moves`;
    case "ballast":
      return `tank ${slot.tank} at move ${slot.move}`;
    case "water":
      return `water ${slot.place} at ${slot.depth} m, ${slot.round} the moves`;
    case "position":
      return `position of ${slot.weight} at move ${slot.move}`;
    case "length":
      return `length of station ${slot.station}`;
    case "condition":
      return `conditions at move ${slot.move}`;
    case "note":
      return "note";
  }
}
