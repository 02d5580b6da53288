import { describe, expect, it } from "vitest";
import { basisOf, isLettingIn } from "@/lib/sync/basis";
import type { EventBody } from "@/lib/sync/event";
import { battenA, correct, idOf, noReading, one, order, record, resolve, takenBack } from "./sample-acts";

const letIn = { ...record(7), ...noReading, payload: { event: idOf(3) } };
const assign: EventBody = { ...letIn, type: "assign", slot: battenA };
const release: EventBody = { ...letIn, type: "release" };

describe("the act that an act stands on", () => {
  it.each<[string, EventBody, string | null]>([
    ["is none for a new reading", record(1), null],
    ["is none for an order of the wheelhouse", order(2, "move.open", 1), null],
    ["is the one that a correction corrects", correct(3, 1), idOf(1)],
    ["is the one that a void takes back", takenBack(4, 3), idOf(3)],
    ["is the first of those that a decision settles", resolve(5, [4, 2], one(2)), idOf(4)],
    ["is the one that an assign gives its place", assign, idOf(3)],
    ["is the one that a release lets in", release, idOf(3)],
  ])("%s", (_, body, basis) => {
    expect(basisOf(body)).toBe(basis);
  });
});

describe("letting in what was set aside", () => {
  it("is done by assign and release only", () => {
    expect([assign, release, record(1), correct(3, 1), order(2, "move.open", 1)].map(isLettingIn)).toEqual([
      true,
      true,
      false,
      false,
      false,
    ]);
  });
});
