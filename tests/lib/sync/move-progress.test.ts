import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type MoveEvent, moveProgress } from "@/lib/sync/move-progress";
import { order, phones, stamped } from "./sample-acts";

const from = (device: string) => ({ device });
const at = (capturedAt: string, clockOffsetMs: number | null = null) => ({ capturedAt, clockOffsetMs });

function runs(...acts: MoveEvent["body"][]) {
  return moveProgress(
    [0, 1],
    acts.map((act) => stamped(act)),
  );
}

function states(...acts: MoveEvent["body"][]) {
  return Object.fromEntries(runs(...acts).map(({ move, repeat, state }) => [`${move}.${repeat}`, state]));
}

describe("a move", () => {
  it("is due until somebody opens it, and has one run until a repeat is ordered", () => {
    const due = { repeat: 1, state: "due", excluded: null, openedAt: null, closedAt: null, closedMoment: null, closedSeq: null };
    expect(runs()).toEqual([
      { move: 0, ...due },
      { move: 1, ...due },
    ]);
  });

  it("is open once opened, and closed once anybody closed it, whoever opens it again", () => {
    expect(states(order(1, "move.open", 0))).toEqual({ "0.1": "open", "1.1": "due" });
    expect(states(order(1, "move.open", 0), order(2, "move.close", 0), order(3, "move.open", 0))).toEqual({
      "0.1": "closed",
      "1.1": "due",
    });
    expect(states(order(2, "move.close", 0))).toEqual({ "0.1": "closed", "1.1": "due" });
  });

  it("is read again as another run, which is due until it is opened", () => {
    const acts = [order(1, "move.open", 1), order(2, "move.close", 1), order(3, "move.repeat", 1, 2)];
    expect(states(...acts)).toEqual({ "0.1": "due", "1.1": "closed", "1.2": "due" });
    expect(states(...acts, order(4, "move.open", 1, 2))).toEqual({ "0.1": "due", "1.1": "closed", "1.2": "open" });
  });

  it("has only the runs that were told, however high their number", () => {
    expect(states(order(1, "move.repeat", 1, 1_000_000_000))).toEqual({ "0.1": "due", "1.1": "due", "1.1000000000": "due" });
  });

  it("that the plan has not is no run", () => {
    expect(states(order(1, "move.open", 7))).toEqual({ "0.1": "due", "1.1": "due" });
  });

  it("is left out for the first reason given, without one too, and keeps its state", () => {
    const gust = order(2, "move.exclude", 1, 1, { reason: "A gust", ...at("2026-05-04T09:20:00.000Z") });
    const tug = order(3, "move.exclude", 1, 1, { reason: "A tug", ...at("2026-05-04T09:19:00.000Z") });
    expect(runs(order(1, "move.open", 1), gust, tug)[1]).toMatchObject({ state: "open", excluded: "A tug" });
    expect(runs(order(1, "move.exclude", 1))[1]).toMatchObject({ state: "due", excluded: "excluded" });
  });
});

describe("the time of a move", () => {
  it("is that of the first open and the first close, in the words of the phone that did it", () => {
    const opens = [order(1, "move.open", 1, 1, at("2026-05-04T09:13:00.000Z")), order(2, "move.open", 1, 1, at("2026-05-04T09:12:00Z"))];
    const closes = [order(3, "move.close", 1, 1, at("2026-05-04T09:20:00.500Z")), order(4, "move.close", 1, 1, at("2026-05-04T09:20:00Z"))];
    expect(runs(...opens, ...closes)[1]).toMatchObject({
      openedAt: "2026-05-04T09:12:00Z",
      closedAt: "2026-05-04T09:20:00Z",
      closedSeq: 3,
    });
  });

  it("is compared by the server's clock, however wrong a phone's own is", () => {
    const threeHoursFast = order(1, "move.close", 1, 1, at("2026-05-04T12:20:00.000Z", -3 * 3_600_000));
    const right = order(2, "move.close", 1, 1, at("2026-05-04T09:21:00.000Z", 0));
    const closedMoment = Date.parse("2026-05-04T09:20:00.000Z");
    expect(runs(right, threeHoursFast)[1]).toMatchObject({ closedAt: "2026-05-04T12:20:00.000Z", closedMoment });
  });
});

describe("two runs open at once", () => {
  const here = order(1, "move.open", 0);

  it("contradict each other when two phones opened them: the weights stand in one place only", () => {
    const there = order(2, "move.open", 1, 1, from(phones.aft));
    expect(states(here, there)).toEqual({ "0.1": "disagrees", "1.1": "disagrees" });
    expect(states(here, there, order(3, "move.close", 0))).toEqual({ "0.1": "closed", "1.1": "open" });
  });

  it("do not when one phone opened both, or two phones the same run", () => {
    expect(states(here, order(2, "move.open", 1))).toEqual({ "0.1": "open", "1.1": "open" });
    expect(states(here, order(2, "move.open", 0, 1, from(phones.aft)))).toEqual({ "0.1": "open", "1.1": "due" });
  });

  it("of one move, its first and its repeat, contradict each other too", () => {
    expect(states(here, order(2, "move.open", 0, 2, from(phones.aft)))).toEqual({ "0.1": "disagrees", "0.2": "disagrees", "1.1": "due" });
  });
});

describe("for any orders of the wheelhouse", () => {
  const anyOrder = fc.record({
    type: fc.constantFrom("move.open" as const, "move.close" as const, "move.repeat" as const, "move.exclude" as const),
    move: fc.integer({ min: 0, max: 2 }),
    repeat: fc.integer({ min: 1, max: 3 }),
    device: fc.constantFrom(phones.wheelhouse, phones.aft),
    minute: fc.integer({ min: 10, max: 13 }),
    clockOffsetMs: fc.constantFrom(null, 0, 60_000, -120_000),
  });

  it("the runs are the same in any order of arrival and under any repetition", () => {
    const arrivals = fc.array(anyOrder, { maxLength: 8 }).chain((drawn) => {
      const acts = drawn.map(({ type, move, repeat, device, minute, clockOffsetMs }, i) =>
        stamped(order(i + 1, type, move, repeat, { device, ...at(`2026-05-04T09:${minute}:00.000Z`, clockOffsetMs), reason: `${i}` })),
      );
      return fc.tuple(fc.constant(acts), fc.shuffledSubarray([...acts, ...acts], { minLength: 2 * acts.length }));
    });
    fc.assert(
      fc.property(arrivals, ([acts, arrived]) => {
        expect(moveProgress([0, 1, 2], arrived)).toEqual(moveProgress([0, 1, 2], acts));
      }),
      { numRuns: 500 },
    );
  });
});
