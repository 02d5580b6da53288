import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { EventBody } from "@/lib/sync/event";
import { type DuePlan, isInPlan, ordered, readingsDue } from "@/lib/sync/readings-due";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { battenA, noReading, order, record } from "./sample-acts";
import { nothingOrdered, samplePlan } from "./sample-plan";

function newSeries(n: number, station: string, series: number): EventBody {
  return { ...record(n), ...noReading, type: "station.series", payload: { station, series } };
}

const keys = (plan: DuePlan, events: readonly EventBody[] = []) => readingsDue(plan, ordered(plan, events)).map(slotKey);
const battensOf = (due: readonly string[]) => due.filter((key) => key.startsWith("batten/"));

describe("what was ordered", () => {
  it("is what the plan has, before anybody orders more", () => {
    expect(ordered(samplePlan, [])).toEqual(nothingOrdered);
  });

  it("is the highest repeat and the highest series, in whatever order they were ordered", () => {
    const orders = [order(1, "move.repeat", 2, 3), order(2, "move.repeat", 2, 2), newSeries(3, "U", 2), newSeries(4, "A", 1)];
    for (const events of [orders, orders.toReversed()]) {
      const { repeats, series } = ordered(samplePlan, events);
      expect([repeats.get(2), repeats.get(1), series.get("U"), series.get("A")]).toEqual([3, 2, 2, 2]);
    }
  });

  it("is nothing for moves and stations that the plan has not", () => {
    expect(ordered(samplePlan, [order(1, "move.repeat", 9, 2), newSeries(2, "Z", 2)])).toEqual(nothingOrdered);
  });

  it("is not raised by opening or closing a run", () => {
    expect(ordered(samplePlan, [order(1, "move.open", 2, 5), order(2, "move.close", 2, 5)])).toEqual(nothingOrdered);
  });
});

describe("readings due", () => {
  it("go as the day goes: the round before, the round after, then what belongs to the moves", () => {
    const round = (name: string) => [
      `draft/AP/${name}`,
      `freeboard/F1S/${name}`,
      `sounding/FO1/${name}`,
      `sounding/BW1/${name}`,
      `water/midships/1/${name}`,
    ];
    expect(keys(samplePlan)).toEqual([
      ...round("before"),
      ...round("after"),
      ...["batten/0/1/A/2", "batten/0/1/U/1", "batten/0/1/I/1"],
      ...["batten/1/2/A/2", "batten/1/2/U/1", "batten/1/2/I/1"],
      ...["batten/2/1/A/2", "batten/2/1/U/1", "batten/2/1/I/1"],
      ...["position/W1/0", "position/W2/0", "position/W1/1", "position/W2/1", "position/W1/2", "position/W2/2"],
      ...["ballast/BW1/0", "ballast/BW1/1", "ballast/BW1/2"],
      ...["condition/0", "condition/1", "condition/2"],
    ]);
  });

  it("are of the last repeat and the last series", () => {
    const due = battensOf(keys(samplePlan, [order(1, "move.repeat", 2, 2), newSeries(2, "U", 3)]));
    expect(due.filter((key) => key.startsWith("batten/2/"))).toEqual(["batten/2/2/A/2", "batten/2/2/U/3", "batten/2/2/I/1"]);
  });

  it("are of the rounds that the plan asks for, and of no freeboard marks where there are none", () => {
    const { freeboardMarks, ...without } = samplePlan;
    expect(keys({ ...without, rounds: ["before"] }).filter((key) => /after|freeboard/.test(key))).toEqual([]);
  });

  it("for any plan each stand in it, and once", () => {
    const anyOrders = fc.array(
      fc.oneof(
        fc
          .record({ move: fc.integer({ min: 0, max: 3 }), repeat: fc.integer({ min: 1, max: 4 }) })
          .map(({ move, repeat }) => order(1, "move.repeat", move, repeat)),
        fc
          .record({ station: fc.constantFrom("A", "U", "I", "Z"), series: fc.integer({ min: 1, max: 4 }) })
          .map(({ station, series }) => newSeries(1, station, series)),
      ),
      { maxLength: 6 },
    );
    const anyPlan = fc.record({
      stations: fc.subarray([...samplePlan.stations]),
      moves: fc.subarray([...samplePlan.moves]),
      tanks: fc.subarray([...samplePlan.tanks]),
      weights: fc.subarray([...samplePlan.weights]),
      rounds: fc.subarray([...samplePlan.rounds]),
    });
    fc.assert(
      fc.property(anyPlan, anyOrders, (part, orders) => {
        const plan = { ...samplePlan, ...part };
        const known = ordered(plan, orders);
        const due = readingsDue(plan, known);
        expect(due.filter((slot) => !isInPlan(plan, known, slot))).toEqual([]);
        expect(new Set(due.map(slotKey)).size).toBe(due.length);
      }),
    );
  });
});

describe("a slot stands in the plan", () => {
  const stands = (slot: Slot) => isInPlan(samplePlan, nothingOrdered, slot);

  it.each<[string, Slot, Slot]>([
    ["a batten's move", battenA, { ...battenA, move: 3 }],
    ["a batten's station", battenA, { ...battenA, station: "Z" }],
    ["a repeat up to the last ordered", { ...battenA, repeat: 2 }, { ...battenA, repeat: 3 }],
    ["a series up to the last begun", { ...battenA, series: 2 }, { ...battenA, series: 3 }],
    ["a draft mark", { kind: "draft", mark: "AP", round: "after" }, { kind: "draft", mark: "F1S", round: "after" }],
    ["a freeboard mark", { kind: "freeboard", mark: "F1S", round: "before" }, { kind: "freeboard", mark: "AP", round: "before" }],
    ["a tank", { kind: "sounding", tank: "FO1", round: "before" }, { kind: "sounding", tank: "FO9", round: "before" }],
    ["a tank whose ballast is shifted", { kind: "ballast", tank: "BW1", move: 2 }, { kind: "ballast", tank: "FO1", move: 2 }],
    ["a move in which ballast is shifted", { kind: "ballast", tank: "BW1", move: 0 }, { kind: "ballast", tank: "BW1", move: 3 }],
    [
      "a place where water is drawn",
      { kind: "water", place: "midships", depth: 1, round: "before" },
      { kind: "water", place: "quay", depth: 1, round: "before" },
    ],
    ["a weight", { kind: "position", weight: "W2", move: 0 }, { kind: "position", weight: "W3", move: 0 }],
    ["a move of a weight", { kind: "position", weight: "W1", move: 2 }, { kind: "position", weight: "W1", move: 3 }],
    ["a length of a series", { kind: "length", station: "A", series: 2 }, { kind: "length", station: "A", series: 3 }],
    ["a length of a station", { kind: "length", station: "U", series: 1 }, { kind: "length", station: "Z", series: 1 }],
    ["the conditions of a move", { kind: "condition", move: 0 }, { kind: "condition", move: 3 }],
  ])("with %s that is known, and not else", (_, known, unknown) => {
    expect([known, unknown].map(stands)).toEqual([true, false]);
  });

  it("at any depth of a place where water is drawn, and always as a note", () => {
    expect(stands({ kind: "water", place: "midships", depth: 3.7, round: "before" })).toBe(true);
    expect(stands({ kind: "note" })).toBe(true);
  });

  it("as a freeboard of no plan that has no such marks", () => {
    const { freeboardMarks, ...without } = samplePlan;
    expect(isInPlan(without, nothingOrdered, { kind: "freeboard", mark: "F1S", round: "before" })).toBe(false);
  });
});
