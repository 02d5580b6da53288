import type { Slot } from "./slot";

/** One text per slot, equal exactly when the slots are equal; used as a key in databases on both ends. */
export function slotKey(slot: Slot): string {
  switch (slot.kind) {
    case "batten":
      return key(slot.kind, slot.move, slot.repeat, slot.station, slot.series);
    case "draft":
    case "freeboard":
      return key(slot.kind, slot.mark, slot.round);
    case "sounding":
      return key(slot.kind, slot.tank, slot.round);
    case "ballast":
      return key(slot.kind, slot.tank, slot.move);
    case "water":
      return key(slot.kind, slot.place, slot.depth, slot.round);
    case "position":
      return key(slot.kind, slot.weight, slot.move);
    case "length":
      return key(slot.kind, slot.station, slot.series);
    case "condition":
      return key(slot.kind, slot.move);
    case "note":
      return slot.kind;
  }
}

// names may hold any character: encoding keeps the separator unambiguous
function key(...parts: (string | number)[]): string {
  return parts.map((part) => encodeURIComponent(part)).join("/");
}
