import { describe, expect, it } from "vitest";
import type { EventBody, EventOf } from "@/lib/sync/event";
import { lettingInRefusal, type SetAside } from "@/lib/sync/letting-in";
import { type QuarantineCode, quarantineCodeSchema } from "@/lib/sync/protocol";
import type { Slot } from "@/lib/sync/slot";
import { battenA, idOf, noReading, order, record, settled } from "./sample-acts";
import { nothingOrdered, samplePlan } from "./sample-plan";

const act = { ...record(9), ...noReading, payload: { event: idOf(1) } };
const release: EventOf<"release"> = { ...act, type: "release", slot: null };
const assignTo = (slot: Slot): EventOf<"assign"> => ({ ...act, type: "assign", slot });

const orphan = record(1, settled(100), { slot: { ...battenA, station: "Z" } });
const aside = (body: EventBody | null, code: QuarantineCode | null, isPlaced = false): SetAside => ({ body, code, isPlaced });

function judged(letIn: EventOf<"assign" | "release">, target: SetAside) {
  const refusal = lettingInRefusal(letIn, target, { plan: samplePlan, ordered: nothingOrdered });
  return refusal === null ? "let in" : `${refusal.type}: ${refusal.message}`;
}

const cantTakePart = "not-set-aside: The event it lets in can't take part in any way";
const takesPart = "not-set-aside: The event it lets in was not set aside, or takes part already";

describe("an event that was set aside", () => {
  it.each<[QuarantineCode, string]>([
    ["malformed-body", cantTakePart],
    ["unknown-test", cantTakePart],
    ["unknown-slot", "let in"],
    ["unknown-device", "let in"],
    ["revoked-device", "let in"],
    ["bad-signature", "let in"],
    ["same-id-other-bytes", cantTakePart],
    ["forked-device", "let in"],
    ["role-not-held", "let in"],
    ["base-quarantined", "let in"],
    ["value-does-not-fit-slot", "let in"],
    ["not-set-aside", "let in"],
    ["server-fault", "let in"],
  ])("as %s is: %s", (code, sentence) => {
    expect(judged(release, aside(record(1), code))).toBe(sentence);
  });

  it("has one of these reasons", () => {
    expect(quarantineCodeSchema.options).toHaveLength(13);
  });

  it("is given another place than it asked for, where the plan has it and its value fits", () => {
    expect(judged(assignTo(battenA), aside(orphan, "unknown-slot"))).toBe("let in");
    expect(judged(assignTo({ ...battenA, move: 7 }), aside(orphan, "unknown-slot"))).toBe(
      "unknown-slot: The plan has no such reading due: give it another place",
    );
    expect(judged(assignTo({ ...battenA, station: "I" }), aside(orphan, "unknown-slot"))).toBe(
      "value-does-not-fit-slot: The value is of another kind than the reading due there",
    );
  });

  it("is not released to a place that the plan still has not", () => {
    expect(judged(release, aside(orphan, "unknown-slot"))).toMatch(/^unknown-slot/);
  });

  it("is let in without a place where it needs none", () => {
    expect(judged(release, aside(order(1, "move.open", 1), "role-not-held"))).toBe("let in");
  });

  it("is not let in where there is nothing to read in it", () => {
    expect(judged(assignTo(battenA), aside(null, "bad-signature"))).toBe(cantTakePart);
  });
});

describe("an event that takes part", () => {
  it("needs no letting in: it was not set aside, or somebody has let it in before", () => {
    expect(judged(release, aside(record(1), null))).toBe(takesPart);
    expect(judged(assignTo(battenA), aside(orphan, "unknown-slot", true))).toBe(takesPart);
  });
});
