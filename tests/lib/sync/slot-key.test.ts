import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { battenA } from "./sample-acts";

/** Few names and numbers, so that equal slots are drawn often, and names that look like a key's own signs. */
const named = fc.constantFrom("A", "B", "1", "1/1", "/", "%2F", "A/1", "before", "ä", "🚢");
const move = fc.integer({ min: 0, max: 2 });
const ordinal = fc.integer({ min: 1, max: 2 });
const round = fc.constantFrom("before" as const, "after" as const);
const kind = <K extends Slot["kind"]>(name: K) => fc.constant(name);

const anySlot: fc.Arbitrary<Slot> = fc.oneof(
  fc.record({ kind: kind("batten"), move, repeat: ordinal, station: named, series: ordinal }),
  fc.record({ kind: fc.constantFrom("draft" as const, "freeboard" as const), mark: named, round }),
  fc.record({ kind: kind("sounding"), tank: named, round }),
  fc.record({ kind: kind("ballast"), tank: named, move }),
  fc.record({ kind: kind("water"), place: named, depth: fc.constantFrom(0, 1, 1.5, 1e-7, 1e21), round }),
  fc.record({ kind: kind("position"), weight: named, move }),
  fc.record({ kind: kind("length"), station: named, series: ordinal }),
  fc.record({ kind: kind("condition"), move }),
  fc.record({ kind: kind("note") }),
);

describe("the key of a slot", () => {
  it("reads as what it stands for", () => {
    expect(slotKey(battenA)).toBe("batten/1/1/A/1");
    expect(slotKey({ kind: "water", place: "Nº 2/aft", depth: 1.5, round: "after" })).toBe("water/N%C2%BA%202%2Faft/1.5/after");
    expect(slotKey({ kind: "note" })).toBe("note");
  });

  it("for any two slots is the same exactly when the slots are", () => {
    fc.assert(
      fc.property(fc.array(anySlot, { minLength: 60, maxLength: 120 }), (slots) => {
        const keys = new Set(slots.map(slotKey));
        const different = new Set(slots.map(canonicalJson));
        const pairs = new Set(slots.map((slot) => `${slotKey(slot)} ${canonicalJson(slot)}`));
        expect([keys.size, pairs.size]).toEqual([different.size, different.size]);
      }),
    );
  });

  it("for any slot changes with each of its words", () => {
    const changed: Record<string, unknown> = {
      move: 9,
      repeat: 9,
      series: 9,
      depth: 9,
      station: "Z",
      mark: "Z",
      tank: "Z",
      place: "Z",
      weight: "Z",
    };
    fc.assert(
      fc.property(anySlot, (slot) => {
        for (const word of Object.keys(slot).filter((each) => each in changed)) {
          expect(slotKey({ ...slot, [word]: changed[word] } as Slot)).not.toBe(slotKey(slot));
        }
        if ("round" in slot) expect(slotKey({ ...slot, round: slot.round === "after" ? "before" : "after" })).not.toBe(slotKey(slot));
      }),
    );
  });
});
