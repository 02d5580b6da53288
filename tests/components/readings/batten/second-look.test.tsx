import { describe, expect, test } from "vitest";
import type { Station } from "@/components/readings/batten/batten-entry";
import { deservesSecondLook, secondLookAt } from "@/components/readings/batten/second-look";

const station: Station = { id: "A", instrument: "pendulum", place: null, length: 4, scale: [-2000, 2000], series: 1 };
const own = [0, 101].map((valueMm, move) => ({
  slot: { kind: "batten" as const, move, repeat: 1, station: "A", series: 1 },
  value: { mode: "settled" as const, valuesMm: [valueMm] },
}));

describe("a second look", () => {
  test("is asked for when a point was forgotten", () => {
    expect(deservesSecondLook(1015, [0, 101.5])).toBe(true);
  });

  test("is not asked for on the first move to the other side", () => {
    expect(deservesSecondLook(-101, [0, 101])).toBe(false);
  });

  test("is never asked for before two readings that differ are known", () => {
    expect([deservesSecondLook(900, []), deservesSecondLook(900, [0]), deservesSecondLook(900, [5, 5])]).toEqual([false, false, false]);
  });

  test("goes by this station's readings of other moves only", () => {
    const settled = (valueMm: number) => ({ mode: "settled" as const, valuesMm: [valueMm] });
    expect(secondLookAt(settled(1015), station, 2, own)).toContain("far from what this station has read before");
    expect(secondLookAt(settled(1015), { ...station, id: "B" }, 2, own)).toBeNull();
    expect(secondLookAt(settled(1015), station, 1, own)).toBeNull();
  });

  test("is asked for where two turning points in a row lie on one side", () => {
    const value = { mode: "turning-points" as const, valuesMm: [90, 95, 100, 91] };
    expect(secondLookAt(value, station, 2, [])).toContain("same side");
  });
});
