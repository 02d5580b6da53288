import { describe, expect, it } from "vitest";
import { name, nonNegative, number, ordinal, place, positive, text, time, wholeNumber } from "@/lib/record/quantities";

describe("a number of a record", () => {
  it.each([Number.NaN, Number.POSITIVE_INFINITY, "1", null])("is never %j", (given) => {
    expect([number, positive, nonNegative, wholeNumber, ordinal].some((schema) => schema.safeParse(given).success)).toBe(false);
  });

  it("is what its kind allows, zero where that means something", () => {
    const allowed = (schema: typeof number) => [-1, 0, 0.5, 1].filter((given) => schema.safeParse(given).success);
    expect([number, nonNegative, positive, wholeNumber, ordinal].map(allowed)).toEqual([
      [-1, 0, 0.5, 1],
      [0, 0.5, 1],
      [0.5, 1],
      [0, 1],
      [1],
    ]);
  });
});

describe("a name or a text", () => {
  it("stands without the space around it, and is never empty or endless", () => {
    expect(name.parse(" AP ")).toBe("AP");
    expect([" ", "n".repeat(61)].map((given) => name.safeParse(given).success)).toEqual([false, false]);
    expect([" ", "t".repeat(2001)].map((given) => text.safeParse(given).success)).toEqual([false, false]);
  });

  it("may be of any script, but not of half a character", () => {
    expect(text.parse("Ruß am Lot 🚢, 左舷")).toBe("Ruß am Lot 🚢, 左舷");
    for (const half of ["\ud83d", "\udea2", "Quay \udea2\ud83d"])
      expect([name, text].map((schema) => schema.safeParse(half).success)).toEqual([false, false]);
  });
});

describe("a place and a time", () => {
  it("are three coordinates, and a moment of universal time", () => {
    expect(place.safeParse([1, 2, 3]).success).toBe(true);
    expect(
      [
        [1, 2],
        [1, 2, 3, 4],
      ].map((given) => place.safeParse(given).success),
    ).toEqual([false, false]);
    expect(time.safeParse("2026-05-04T09:12:00.000Z").success).toBe(true);
    expect(["2026-05-04T09:12:00", "09:12", "2026-02-30T09:12:00Z"].map((given) => time.safeParse(given).success)).toEqual([
      false,
      false,
      false,
    ]);
  });
});
