import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { actsBeneath, basesOf, slotHeads } from "@/lib/sync/slot-heads";
import { type Act, anyActs, anyArrivals } from "./any-acts";
import { correct, idOf, one, record, resolve, stamped, takenBack } from "./sample-acts";

const headsOf = (acts: readonly Act[]) => slotHeads(acts.map((act) => stamped(act)));
const idsOf = (events: readonly { body: { id: string } }[]) => events.map(({ body }) => body.id);

function found(acts: readonly Act[]) {
  const { heads, forkedHeads, deferred, byId } = headsOf(acts);
  return { heads: idsOf(heads), forked: [...forkedHeads].sort(), deferred: idsOf(deferred).sort(), known: [...byId.keys()].sort() };
}

describe("the heads of a slot", () => {
  it("are the acts that nothing stands on, in the order of their ids", () => {
    expect(found([record(3), record(1), correct(2, 1)]).heads).toEqual([2, 3].map(idOf));
  });

  it("are one where a decision stands on many", () => {
    expect(found([record(1), record(2), correct(3, 1), resolve(4, [2, 3], one(3))]).heads).toEqual([idOf(4)]);
  });

  it("do not contradict each other only by being several", () => {
    expect(found([record(1), record(2), takenBack(3, 1)]).forked).toEqual([]);
  });

  it.each<[string, Act[], number[]]>([
    ["two corrections of one base", [record(1), correct(2, 1), correct(3, 1)], [2, 3]],
    ["a correction and a void of one base", [record(1), correct(2, 1), takenBack(3, 1)], [2, 3]],
    ["two decisions on the same heads", [record(1), record(2), resolve(3, [1, 2], one(1)), resolve(4, [1, 2], one(2))], [3, 4]],
    ["ways that part far below the heads", [record(1), correct(2, 1), correct(3, 1), correct(4, 2), correct(5, 4)], [3, 5]],
    ["two voids and a correction of one base", [record(1), takenBack(2, 1), takenBack(3, 1), correct(4, 1)], [2, 3, 4]],
    ["a head that a decision left out", [record(1), correct(2, 1), correct(3, 1), correct(4, 1), resolve(5, [2, 3], one(2))], [4, 5]],
  ])("contradict each other by %s", (_, acts, forked) => {
    expect(found(acts).forked).toEqual(forked.map(idOf));
  });

  it.each<[string, Act[]]>([
    ["a decision has brought the ways together again", [record(1), correct(2, 1), correct(3, 1), resolve(4, [2, 3], one(2))]],
    ["every way ends in a void", [record(1), takenBack(2, 1), correct(3, 1), takenBack(4, 3)]],
  ])("do not where %s", (_, acts) => {
    expect(found(acts).forked).toEqual([]);
  });
});

describe("acts that wait", () => {
  it("are those whose base is missing, and what stands on them, each once", () => {
    const acts = [record(1), resolve(3, [1, 2], one(1)), correct(4, 3), correct(4, 3)];
    expect(found(acts)).toEqual({ heads: [idOf(1)], forked: [], deferred: [3, 4].map(idOf), known: [idOf(1)] });
    expect(found([...acts, record(2)])).toMatchObject({ heads: [idOf(4)], deferred: [] });
  });

  it("are those that stand on each other in a circle", () => {
    expect(found([correct(1, 2), correct(2, 1), correct(3, 3)])).toMatchObject({ heads: [], deferred: [1, 2, 3].map(idOf) });
  });
});

describe("what an act stands on", () => {
  it("is nothing, one act, or every head it settles", () => {
    const bases = [record(1), correct(2, 1), resolve(3, [1, 2], one(1))].map((act) => basesOf(stamped(act)));
    expect(bases).toEqual([[], [idOf(1)], [idOf(1), idOf(2)]]);
  });

  it("goes down to the first acts, and names the missing ones too", () => {
    const acts = [record(1), correct(2, 1), record(3), resolve(4, [2, 3, 9], one(3)), correct(5, 4)];
    const { byId } = headsOf([...acts, record(9)]);
    const beneath = (n: number) => [...actsBeneath(stamped(acts[n - 1] ?? record(99)), byId)].sort();
    expect(beneath(1)).toEqual([]);
    expect(beneath(5)).toEqual([1, 2, 3, 4, 9].map(idOf));
    expect([...actsBeneath(stamped(correct(7, 8)), byId)]).toEqual([idOf(8)]);
  });
});

describe("for any acts on each other", () => {
  it("the same is found in any order of arrival and under any repetition", () => {
    fc.assert(
      fc.property(anyArrivals, ({ acts, arrived }) => {
        expect(found(arrived)).toEqual(found(acts));
      }),
      { numRuns: 1000 },
    );
  });

  it("every act stands or waits, and every act that stands leads to a head", () => {
    fc.assert(
      fc.property(anyActs, (acts) => {
        const { heads, deferred, byId } = headsOf(acts);
        expect([...byId.keys(), ...idsOf(deferred)].sort()).toEqual(acts.map(({ id }) => id));
        const reached = heads.flatMap((head) => [head.body.id, ...actsBeneath(head, byId)]);
        expect([...new Set(reached)].sort()).toEqual([...byId.keys()].sort());
      }),
    );
  });
});
