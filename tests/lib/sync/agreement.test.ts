import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { isAgreed, usualAgreement } from "@/lib/sync/agreement";
import type { ReadingValue } from "@/lib/sync/event";
import type { SlotKind } from "@/lib/sync/slot";
import { settled } from "./sample-acts";

const agreed = (kind: SlotKind, ...values: ReadingValue[]) => isAgreed(kind, values, usualAgreement);
const swing = (...valuesMm: number[]): ReadingValue => ({ mode: "turning-points", valuesMm });
const degrees = (value: number): ReadingValue => ({ mode: "settled", valuesDegrees: [value] });
const legs = (port: number, starboard: number): ReadingValue => ({ mode: "settled", portMm: [port], starboardMm: [starboard] });
const place = (x: number, y: number, z: number): ReadingValue => ({ place: [x, y, z] });

describe("readings of one slot agree", () => {
  // the usual limits of the trade, *common practice*: exactly the limit agrees, also where its difference is not exact in binary
  it.each<[string, SlotKind, ReadingValue, ReadingValue, ReadingValue]>([
    ["2 mm on a batten", "batten", settled(100.2), settled(98.2), settled(98.19)],
    ["0.02° on an inclinometer", "batten", degrees(1.05), degrees(1.07), degrees(1.0701)],
    ["2 mm on either leg of a U-tube: port", "batten", legs(210, 190), legs(212, 190), legs(212.1, 190)],
    ["2 mm on either leg of a U-tube: starboard", "batten", legs(210, 190), legs(210, 188), legs(210, 187.9)],
    ["20 mm on a draft", "draft", { value: 2.01 }, { value: 2.03 }, { value: 2.031 }],
    ["20 mm on a freeboard", "freeboard", { value: 0.01 }, { value: -0.01 }, { value: -0.011 }],
    ["10 mm in a sounding", "sounding", { value: 0.52 }, { value: 0.53 }, { value: 0.531 }],
    ["10 mm in a ballast tank", "ballast", { value: 0.52 }, { value: 0.51 }, { value: 0.509 }],
    ["0.0005 t/m³ in the water", "water", { density: 1.0245 }, { density: 1.025 }, { density: 1.0251 }],
    ["10 mm along the ship on a weight's place", "position", place(25, 4, 5), place(25.01, 4, 5), place(25.011, 4, 5)],
    ["10 mm across the ship on a weight's place", "position", place(25, 4, 5), place(25, 3.99, 5), place(25, 3.989, 5)],
    ["10 mm in height on a weight's place", "position", place(25, 4, 5), place(25, 4, 5.01), place(25, 4, 5.011)],
    ["5 mm on a length", "length", { length: 4 }, { length: 4.005 }, { length: 4.0051 }],
  ])("within %s, and not beyond", (_, kind, one, atLimit, beyond) => {
    expect(agreed(kind, one, atLimit)).toBe(true);
    expect(agreed(kind, one, beyond)).toBe(false);
  });

  it("all together, not each with the next", () => {
    expect(agreed("batten", settled(100), settled(101.5), settled(103))).toBe(false);
  });

  it("by where the bob comes to rest, not by its swings", () => {
    expect(agreed("batten", swing(110, 92, 106, 96, 102), settled(101.9))).toBe(true);
    expect(agreed("batten", swing(110, 92, 106, 96, 102), settled(102.1))).toBe(false);
    expect(agreed("batten", settled(99, 103), settled(102.5))).toBe(true);
  });

  it("by the limits that the test has set, each for its own kind", () => {
    const wide = { battenMm: 5, degrees: 0.5, draft: 0.05, sounding: 0.06, density: 0.002 };
    expect(isAgreed("batten", [settled(100), settled(105)], wide)).toBe(true);
    expect(isAgreed("batten", [degrees(1), degrees(1.5)], wide)).toBe(true);
    expect(isAgreed("draft", [{ value: 2 }, { value: 2.06 }], wide)).toBe(false);
    expect(isAgreed("sounding", [{ value: 2 }, { value: 2.06 }], wide)).toBe(true);
    expect(isAgreed("water", [{ density: 1.023 }, { density: 1.025 }], wide)).toBe(true);
  });

  it("always, where there are none or only one, even one that has no rest yet", () => {
    expect(agreed("batten")).toBe(true);
    expect(agreed("batten", settled(100))).toBe(true);
    expect(agreed("batten", swing(100, 104))).toBe(true);
  });

  it("always, in what is said of the conditions and in notes", () => {
    expect(agreed("condition", { wind: "NE 3", headcount: 9 }, { wind: "calm", headcount: 8 })).toBe(true);
    expect(agreed("note", { text: "Lost the bob" }, { text: "Nothing to tell" })).toBe(true);
  });

  it("never, where they are of different shapes or one of them has no rest", () => {
    expect(agreed("batten", settled(1), degrees(1), legs(1, 1))).toBe(false);
    expect(agreed("batten", settled(210), legs(210, 190))).toBe(false);
    expect(agreed("batten", settled(100), swing(100, 104))).toBe(false);
  });

  it("for any settled marks exactly when the highest and the lowest lie within the limit, in any order", () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: -4, max: 4 }), { minLength: 1, maxLength: 5 }),
        fc.integer({ min: -3000, max: 3000 }),
        (steps, rest) => {
          const tenths = steps.map((step) => rest + step * 7);
          const readings = tenths.map((tenth) => settled(tenth / 10));
          const isTogether = Math.max(...tenths) - Math.min(...tenths) <= 20;
          expect(agreed("batten", ...readings)).toBe(isTogether);
          expect(agreed("batten", ...readings.toReversed())).toBe(isTogether);
        },
      ),
    );
  });
});
