import { z } from "zod";
import { name, nonNegative, ordinal, wholeNumber } from "@/lib/record/quantities";
import { roundSchema } from "@/lib/record/readings-schema";

/** A reading due: the place in the plan that a reading fills. Several readings may stand in one slot. */
export const slotSchema = z.discriminatedUnion("kind", [
  z.strictObject({ kind: z.literal("batten"), move: wholeNumber, repeat: ordinal, station: name, series: ordinal }),
  z.strictObject({ kind: z.literal("draft"), mark: name, round: roundSchema }),
  z.strictObject({ kind: z.literal("freeboard"), mark: name, round: roundSchema }),
  z.strictObject({ kind: z.literal("sounding"), tank: name, round: roundSchema }),
  z.strictObject({ kind: z.literal("ballast"), tank: name, move: wholeNumber }),
  z.strictObject({ kind: z.literal("water"), place: name, depth: nonNegative, round: roundSchema }),
  z.strictObject({ kind: z.literal("position"), weight: name, move: wholeNumber }),
  z.strictObject({ kind: z.literal("length"), station: name, series: ordinal }),
  z.strictObject({ kind: z.literal("condition"), move: wholeNumber }),
  z.strictObject({ kind: z.literal("note") }),
]);

export type Slot = z.infer<typeof slotSchema>;
export type SlotKind = Slot["kind"];

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
