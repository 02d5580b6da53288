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
