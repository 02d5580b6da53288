import { describe, expect, it } from "vitest";
import { type Slot, type SlotKind, slotSchema } from "@/lib/sync/slot";
import { battenA } from "./sample-acts";

const slots: Record<SlotKind, Slot> = {
  batten: battenA,
  draft: { kind: "draft", mark: "AP", round: "before" },
  freeboard: { kind: "freeboard", mark: "F1S", round: "after" },
  sounding: { kind: "sounding", tank: "FO1", round: "before" },
  ballast: { kind: "ballast", tank: "BW1", move: 0 },
  water: { kind: "water", place: "midships", depth: 1.5, round: "before" },
  position: { kind: "position", weight: "W1", move: 0 },
  length: { kind: "length", station: "A", series: 1 },
  condition: { kind: "condition", move: 0 },
  note: { kind: "note" },
};

describe("a slot", () => {
  it.each(Object.entries(slots))("of kind %s is read as it was written", (_, slot) => {
    expect(slotSchema.parse(JSON.parse(JSON.stringify(slot)))).toEqual(slot);
  });

  it.each<[string, object]>([
    ["of no kind", { kind: "heel" }],
    ["with a word of another kind", { ...slots.draft, tank: "FO1" }],
    ["of a move before the reference", { ...battenA, move: -1 }],
    ["of a repeat before the first", { ...battenA, repeat: 0 }],
    ["of a series before the first", { ...slots.length, series: 0 }],
    ["of a station without a name", { ...battenA, station: " " }],
    ["above the water", { ...slots.water, depth: -0.1 }],
    ["of a round between the rounds", { ...slots.sounding, round: "during" }],
  ])("is refused %s", (_, slot) => {
    expect(slotSchema.safeParse(slot).success).toBe(false);
  });
});
