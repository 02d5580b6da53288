import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { usualAgreement } from "@/lib/sync/agreement";
import { type SlotProjection, slotProjection } from "@/lib/sync/slot-projection";
import { type Act, anyActs, anyArrivals, anyMoment } from "./any-acts";
import { correct, idOf, one, received, record, resolve, settled, stamped, takenBack } from "./sample-acts";

function standing(acts: readonly Act[], reconciledAt: string | null = null): SlotProjection {
  const rules = { limits: usualAgreement, reconciledAt };
  return slotProjection(
    "batten",
    acts.map((act) => stamped(act)),
    rules,
  );
}

/** The same without its stamps, which do tell the order of arrival. */
function stampedInTurn(acts: readonly Act[]) {
  const events = acts.map((body, i) => ({ body, serverSeq: i + 1, receivedAt: received(i) }));
  const { readings, ...rest } = slotProjection("batten", events, { limits: usualAgreement, reconciledAt: null });
  return { ...rest, readings: readings.map(({ serverSeq, receivedAt, ...reading }) => reading) };
}

/** What has become of each value, by the number of its act. */
function fates({ readings }: SlotProjection): Record<number, string> {
  return Object.fromEntries(readings.map(({ event, status }) => [Number(event.slice(-12)), status]));
}

const radio = (n: number, mm: number) => record(n, settled(mm), { source: "radio" });
const paper = (n: number, mm: number) => record(n, settled(mm), { source: "paper" });

describe("a slot", () => {
  it("is empty before anything was read", () => {
    expect(standing([])).toEqual({ state: "empty", readings: [], heads: [], deferred: [] });
  });

  it("is read by one reading, with all that is known of it", () => {
    const { reading, device, author, capturedAt } = record(1);
    const provenance = { author, device, capturedAt, clockOffsetMs: null, receivedAt: received(1), serverSeq: 1, reason: null };
    const value = { event: idOf(1), reading, value: settled(100), source: "station", status: "accepted", corrects: false, ...provenance };
    expect(standing([record(1)])).toEqual({ state: "read", readings: [value], heads: [idOf(1)], deferred: [] });
  });

  it("hears the same act again without a second reading (C0)", () => {
    expect(standing([record(1), record(1), record(1)])).toEqual(standing([record(1)]));
  });

  it("keeps readings within the limit together as replicates, the same phone's second look too (C1, C7)", () => {
    const replicates = standing([record(1, settled(100)), record(2, settled(102)), record(3, settled(101))]);
    expect(replicates).toMatchObject({ state: "read", heads: [idOf(1), idOf(2), idOf(3)] });
    expect(fates(replicates)).toEqual({ 1: "accepted", 2: "accepted", 3: "accepted" });
  });

  it("disagrees when they lie further apart all together, though each is near the next (C2)", () => {
    const apart = standing([record(1, settled(100)), record(2, settled(101.5)), record(3, settled(103))]);
    expect(apart).toMatchObject({ state: "disagrees", heads: [idOf(1), idOf(2), idOf(3)] });
    expect(fates(apart)).toEqual({ 1: "disagrees", 2: "disagrees", 3: "disagrees" });
  });

  it("counts a correction instead of what it corrects", () => {
    const corrected = standing([record(1, settled(100)), correct(2, 1, settled(110)), correct(3, 2, settled(120))]);
    expect(corrected).toMatchObject({ state: "read", heads: [idOf(3)] });
    expect(fates(corrected)).toEqual({ 1: "superseded", 2: "superseded", 3: "accepted" });
    expect(corrected.readings.map(({ corrects }) => corrects)).toEqual([false, true, true]);
  });

  it("is empty again once its reading was taken back", () => {
    const emptied = standing([record(1), takenBack(2, 1)]);
    expect(emptied).toMatchObject({ state: "empty", heads: [] });
    expect(fates(emptied)).toEqual({ 1: "void" });
  });

  it("disagrees by two corrections of one reading, even to the same value (C3)", () => {
    const forked = standing([record(1), correct(2, 1, settled(101)), correct(3, 1, settled(101))]);
    expect(forked).toMatchObject({ state: "disagrees", heads: [idOf(2), idOf(3)] });
    expect(fates(forked)).toEqual({ 1: "superseded", 2: "disagrees", 3: "disagrees" });
  });

  it("disagrees by a correction against a void of the same reading: both heads stay (C4)", () => {
    const against = standing([record(1), correct(2, 1, settled(101)), takenBack(3, 1)]);
    expect(against).toMatchObject({ state: "disagrees", heads: [idOf(2), idOf(3)] });
    expect(fates(against)).toEqual({ 1: "disagrees", 2: "disagrees" });
  });

  it("takes no value from an act whose base has not arrived, until it does", () => {
    const waiting = standing([record(1), correct(3, 2, settled(140))]);
    expect(waiting).toMatchObject({ state: "read", heads: [idOf(1)], deferred: [idOf(3)] });
    expect(fates(waiting)).toEqual({ 1: "accepted" });
    expect(standing([correct(2, 1), record(1)])).toEqual(standing([record(1), correct(2, 1)]));
  });

  it("is empty when two people take the same reading back: they agree", () => {
    expect(standing([record(1), takenBack(2, 1), takenBack(3, 1)])).toMatchObject({ state: "empty", heads: [] });
    expect(standing([record(1), correct(2, 1), takenBack(3, 1), takenBack(4, 2)])).toMatchObject({ state: "empty", heads: [] });
  });
});

describe("readings by radio and on paper", () => {
  it("count while the station's own is absent", () => {
    expect(fates(standing([radio(1, 100)]))).toEqual({ 1: "accepted" });
    expect(fates(standing([radio(1, 100), paper(2, 101)]))).toEqual({ 1: "accepted", 2: "accepted" });
  });

  it("step back behind the station's own, however far they lie from it", () => {
    const both = standing([radio(1, 140), record(2, settled(100)), paper(3, 60)]);
    expect(both.state).toBe("read");
    expect(fates(both)).toEqual({ 1: "superseded", 2: "accepted", 3: "superseded" });
  });

  it("count again when the station takes its own back", () => {
    expect(fates(standing([radio(1, 140), record(2), takenBack(3, 2)]))).toEqual({ 1: "accepted", 2: "void" });
  });

  it("disagree with each other until the station's own arrives", () => {
    expect(standing([radio(1, 100), radio(2, 110)]).state).toBe("disagrees");
    expect(standing([radio(1, 100), radio(2, 110), record(3)]).state).toBe("read");
  });
});

describe("a disagreement", () => {
  const apart = [record(1, settled(100)), record(2, settled(110))];

  it("is settled by choosing one of the heads, or their mean: then both count", () => {
    expect(fates(standing([...apart, resolve(3, [1, 2], { choice: "mean" })]))).toEqual({ 1: "accepted", 2: "accepted" });
    const settledNow = standing([...apart, resolve(3, [1, 2], one(2))]);
    expect(settledNow).toMatchObject({ state: "resolved", heads: [idOf(3)] });
    expect(fates(settledNow)).toEqual({ 1: "superseded", 2: "accepted" });
  });

  it("is settled by a new value, which is a reading of the person who settled it", () => {
    const anew = standing([...apart, resolve(3, [1, 2], { choice: "new", value: settled(104) })]);
    expect(fates(anew)).toEqual({ 1: "superseded", 2: "superseded", 3: "accepted" });
    expect(anew.readings[2]).toMatchObject({ value: settled(104), reading: idOf(3), source: "station", reason: "Read again" });
  });

  it("is settled by none: no value counts, the slot is not read", () => {
    const none = standing([...apart, resolve(3, [1, 2], { choice: "none" })]);
    expect(none.state).toBe("resolved");
    expect(fates(none)).toEqual({ 1: "superseded", 2: "superseded" });
  });

  it("of a correction and a void is settled for what the void would take back", () => {
    const acts = [record(1, settled(100)), correct(2, 1, settled(101)), takenBack(3, 1)];
    expect(fates(standing([...acts, resolve(4, [2, 3], one(1))]))).toEqual({ 1: "accepted", 2: "superseded" });
    expect(fates(standing([...acts, resolve(4, [2, 3], one(3))]))).toEqual({ 1: "void", 2: "superseded" });
    expect(fates(standing([...acts, resolve(4, [2, 3], { choice: "mean" })]))).toEqual({ 1: "void", 2: "accepted" });
  });

  it("opens again by a head that the decision did not name: within the limit, or correcting what it settled", () => {
    expect(standing([...apart, resolve(3, [1, 2], one(2)), correct(4, 1)])).toMatchObject({
      state: "disagrees",
      heads: [idOf(3), idOf(4)],
    });
    const reopened = standing([...apart, resolve(3, [1, 2], one(2)), record(4, settled(110))]);
    expect(reopened).toMatchObject({ state: "disagrees", heads: [idOf(3), idOf(4)] });
    expect(fates(reopened)).toEqual({ 1: "superseded", 2: "disagrees", 4: "disagrees" });
  });

  it("is settled again by a decision that names the first decision and the new head", () => {
    const reopened = [...apart, resolve(3, [1, 2], { choice: "mean" }), record(4, settled(105))];
    expect(fates(standing([...reopened, resolve(5, [3, 4], { choice: "mean" })]))).toEqual({ 1: "accepted", 2: "accepted", 4: "accepted" });
  });

  it("between two decisions of the same heads keeps both (C3)", () => {
    const two = standing([...apart, resolve(3, [1, 2], one(1)), resolve(4, [1, 2], one(2))]);
    expect(two).toMatchObject({ state: "disagrees", heads: [idOf(3), idOf(4)] });
    expect(fates(two)).toEqual({ 1: "disagrees", 2: "disagrees" });
  });

  it("is not settled by choosing what the decision does not stand on", () => {
    const stray = standing([...apart, resolve(3, [1, 2], one(9))]);
    expect(Object.values(fates(stray))).not.toContain("accepted");
    const round = [...apart, resolve(3, [1, 2], one(4)), resolve(4, [1, 2], one(3))];
    expect(standing(round)).toMatchObject({ state: "disagrees", heads: [idOf(3), idOf(4)] });
  });
});

describe("after the test was reconciled", () => {
  const reconciled = received(2);

  it("what came before stands as it did", () => {
    expect(standing([record(1), record(2)], reconciled).state).toBe("read");
    expect(standing([record(1), takenBack(2, 1)], reconciled).state).toBe("empty");
    expect(standing([record(1), record(3)], received(4)).state).toBe("read");
  });

  it.each<[string, Act[], number[]]>([
    ["a further reading within the limit", [record(1), record(3)], [1, 3]],
    ["the first reading of the slot", [record(3)], [3]],
    ["a correction", [record(1), correct(3, 1)], [3]],
    ["a void, which would take a value out of the result", [record(1), takenBack(3, 1)], [3]],
    ["the reading that an earlier correction had waited for", [correct(1, 3), record(3)], [1]],
  ])("%s opens the slot: somebody must decide", (_, acts, heads) => {
    const late = standing(acts, reconciled);
    expect(late).toMatchObject({ state: "disagrees", heads: heads.map(idOf) });
    expect(Object.values(fates(late))).not.toContain("accepted");
  });

  it("a decision settles it, by one head as by many, and opens nothing itself", () => {
    expect(standing([record(1), takenBack(3, 1), resolve(4, [3], one(1))], reconciled)).toMatchObject({ state: "resolved" });
    const corrected = standing([record(1), correct(3, 1), resolve(4, [3], { choice: "mean" })], reconciled);
    expect(fates(corrected)).toEqual({ 1: "superseded", 3: "accepted" });
  });
});

describe("for any acts on each other", () => {
  it("any order of arrival and any repetition give the same", () => {
    fc.assert(
      fc.property(anyArrivals, anyMoment, ({ acts, arrived }, reconciledAt) => {
        expect(standing(arrived, reconciledAt)).toEqual(standing(acts, reconciledAt));
        expect(stampedInTurn(arrived)).toEqual(stampedInTurn(acts));
      }),
      { numRuns: 2000 },
    );
  });

  it("no value is lost: each stands in the slot once, or waits for its base", () => {
    fc.assert(
      fc.property(anyActs, (acts) => {
        const { readings, deferred } = standing(acts);
        const given = acts.filter(({ type, payload }) => type === "record" || type === "correct" || "value" in payload);
        const held = readings.map(({ event }) => event);
        expect([...held, ...deferred.filter((id) => given.some((act) => act.id === id))].sort()).toEqual(given.map(({ id }) => id));
      }),
    );
  });

  it("nothing counts while a slot disagrees", () => {
    fc.assert(
      fc.property(anyActs, anyMoment, (acts, reconciledAt) => {
        const { state, readings } = standing(acts, reconciledAt);
        const counted = readings.filter(({ status }) => status === "accepted");
        expect(state === "disagrees" ? counted : []).toEqual([]);
        expect(state === "read" ? counted.length : 1).toBeGreaterThan(0);
      }),
    );
  });

  it("a decision that names every head settles the slot", () => {
    fc.assert(
      fc.property(anyActs, anyMoment, fc.constantFrom("mean" as const, "none" as const), (acts, reconciledAt, choice) => {
        const open = standing(acts, reconciledAt);
        fc.pre(open.state === "disagrees");
        const decision = { ...resolve(20, [], { choice }), base: [...open.heads] };
        expect(standing([...acts, decision], reconciledAt)).toMatchObject({ state: "resolved", heads: [idOf(20)] });
      }),
      { numRuns: 2000 },
    );
  });
});
