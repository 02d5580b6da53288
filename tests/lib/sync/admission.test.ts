import { describe, expect, it } from "vitest";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import { type AdmissionFacts, admission, eventFromText, isFitting } from "@/lib/sync/admission";
import type { EventBody, EventType, ReadingValue } from "@/lib/sync/event";
import { type Role, roleSchema } from "@/lib/sync/job-sheet";
import type { Slot } from "@/lib/sync/slot";
import { battenA, correct, idOf, noReading, one, order, people, phones, record, resolve, settled, takenBack } from "./sample-acts";
import { nothingOrdered, samplePlan } from "./sample-plan";

/** A signed event of a phone in good standing, sent by its holder, a reader. */
const good: AdmissionFacts = {
  device: { isKnown: true, isRevoked: false, hasKey: true },
  isSignatureGood: true,
  isIdTakenByOtherBytes: false,
  isSeqTaken: false,
  isAuthorHolder: true,
  isSenderTrusted: true,
  rolesHeld: ["reader"],
  plan: { plan: samplePlan, ordered: nothingOrdered },
  base: { isQuarantined: false, author: null, slot: null },
};
const wheelhouseAct = { ...record(9), ...noReading, author: people.lead };
const own = { isQuarantined: false, author: people.reader, slot: battenA };
const others = { ...own, author: people.otherReader };

function judged(event: EventBody, changes: Partial<AdmissionFacts> = {}) {
  const result = admission(event, { ...good, ...changes });
  return result.ok ? "admitted" : `${result.refusal.type}: ${result.refusal.message}`;
}

describe("an event that is whole", () => {
  it("is admitted as it is", () => {
    expect(admission(record(1), good)).toEqual({ ok: true, value: record(1) });
  });

  it.each<[string, Partial<AdmissionFacts>, string]>([
    [
      "from a phone nobody enrolled",
      { device: { isKnown: false, isRevoked: false, hasKey: false } },
      "unknown-device: This phone is not enrolled on this server",
    ],
    ["from a revoked phone", { device: { isKnown: true, isRevoked: true, hasKey: true } }, "revoked-device: This phone was revoked"],
    ["signed over other bytes", { isSignatureGood: false }, "bad-signature: The signature does not fit the event's bytes"],
    ["unsigned from a phone with a key", { isSignatureGood: null }, "bad-signature: This phone has a key, but the event is not signed"],
    [
      "unsigned, and sent by a stranger to the phone",
      { device: { isKnown: true, isRevoked: false, hasKey: false }, isSignatureGood: null, isSenderTrusted: false },
      "bad-signature: It is not signed, and somebody else sent it",
    ],
    ["of somebody who never had the phone", { isAuthorHolder: false }, "role-not-held: The author never held this phone"],
    ["under the id of another one", { isIdTakenByOtherBytes: true }, "same-id-other-bytes: Another event has this id"],
    [
      "under the number of another one: a copied phone",
      { isSeqTaken: true },
      "forked-device: Number 1 of this phone is another event: enrol the phone again",
    ],
    ["of a test that is not here", { plan: null }, "unknown-test: The test is not on this server"],
    [
      "of a person without a role",
      { rolesHeld: [] },
      "role-not-held: record needs another role than the author held then (none in this test)",
    ],
  ])("is set aside when it comes %s", (_, facts, sentence) => {
    expect(judged(record(1), facts)).toBe(sentence);
  });

  it.each<[string, EventBody, Partial<AdmissionFacts>, string]>([
    [
      "on a reading that is set aside",
      correct(2, 1),
      { base: { ...own, isQuarantined: true, slot: null } },
      "base-quarantined: The reading it stands on is set aside",
    ],
    [
      "a slot that the plan has not",
      record(1, settled(1), { slot: { ...battenA, station: "Z" } }),
      {},
      "unknown-slot: The plan has no such reading due",
    ],
    [
      "a repeat that nobody ordered",
      record(1, settled(1), { slot: { ...battenA, repeat: 3 } }),
      {},
      "unknown-slot: The plan has no such reading due",
    ],
    [
      "a value of another kind than its slot",
      record(1, { density: 1.025 }),
      {},
      "value-does-not-fit-slot: The value is of another kind than the reading due",
    ],
  ])("is set aside when it gives %s", (_, event, facts, sentence) => {
    expect(judged(event, facts)).toBe(sentence);
  });

  it("is admitted unsigned from a phone that could keep no key, sent by its holder or the wheelhouse", () => {
    expect(judged(record(1), { device: { isKnown: true, isRevoked: false, hasKey: false }, isSignatureGood: null })).toBe("admitted");
  });

  it("goes where the act it stands on stands, whatever it says itself", () => {
    const elsewhere = correct(2, 1, settled(1), { slot: { ...battenA, station: "Z" } });
    expect(judged(elsewhere, { base: own })).toBe("admitted");
    expect(judged(elsewhere)).toBe("unknown-slot: The plan has no such reading due");
    const angle: ReadingValue = { mode: "settled", valuesDegrees: [0.7] };
    expect(judged(correct(2, 1, angle), { base: { ...own, slot: { ...battenA, station: "I" } } })).toBe("admitted");
    expect(judged(correct(2, 1, angle), { base: own })).toMatch(/^value-does-not-fit-slot/);
  });

  it("is judged by its sender before its role, and by its role before its place", () => {
    const wrong = record(1, settled(1), { slot: { ...battenA, station: "Z" } });
    expect(judged(wrong, { rolesHeld: [], isSignatureGood: false })).toMatch(/^bad-signature/);
    expect(judged(wrong, { rolesHeld: [] })).toMatch(/^role-not-held/);
  });
});

describe("who may do what", () => {
  const acts: Record<EventType, EventBody> = {
    record: record(1),
    correct: correct(2, 1),
    void: takenBack(3, 1),
    resolve: resolve(4, [1, 2], one(1)),
    assign: { ...wheelhouseAct, type: "assign", slot: battenA, payload: { event: idOf(8) } },
    release: { ...wheelhouseAct, type: "release", payload: { event: idOf(8) } },
    "move.open": order(5, "move.open", 1),
    "move.close": order(5, "move.close", 1),
    "move.repeat": order(5, "move.repeat", 1, 2),
    "move.exclude": order(5, "move.exclude", 1),
    "station.series": { ...wheelhouseAct, type: "station.series", payload: { station: "A", series: 2 } },
    "session.open": { ...wheelhouseAct, type: "session.open", payload: { session: 2 } },
    "session.close": { ...wheelhouseAct, type: "session.close", payload: { session: 2 } },
    "device.writeOff": { ...wheelhouseAct, type: "device.writeOff", payload: { device: phones.forward } },
    attest: { ...wheelhouseAct, type: "attest", payload: { head: "0".repeat(64) } },
  };
  const everything = Object.keys(acts).filter((type) => type !== "attest");
  const allowed = (rolesHeld: readonly Role[], base = others) =>
    Object.entries(acts).flatMap(([type, act]) => (judged(act, { rolesHeld, base }) === "admitted" ? [type] : []));

  it("a reader records, and corrects and takes back his own readings, never another's", () => {
    expect(allowed(["reader"], own)).toEqual(["record", "correct", "void"]);
    expect(allowed(["reader"], others)).toEqual(["record"]);
    expect(judged(correct(2, 1), { base: others })).toBe("role-not-held: correct needs another role than the author held then (reader)");
  });

  it("a reader reads at his station: what comes by radio or on paper is the wheelhouse's to write", () => {
    expect(judged(record(1, settled(1), { source: "radio" }))).toMatch(/^role-not-held/);
    expect(judged(record(1, settled(1), { source: "paper" }))).toMatch(/^role-not-held/);
    expect(judged(record(1, settled(1), { source: "radio" }), { rolesHeld: ["lead"] })).toBe("admitted");
  });

  it("a reader's correction may come before the reading it corrects", () => {
    expect(judged(correct(2, 1))).toBe("admitted");
  });

  it.each<Role>(["lead", "engineer"])("a %s acts on anybody's readings and gives every order, but attests nothing", (role) => {
    expect(allowed([role])).toEqual(everything);
  });

  it("a witness attests, and does nothing else", () => {
    expect(allowed(["witness"], own)).toEqual(["attest"]);
  });

  it("an administrator has no hand in the readings", () => {
    expect(allowed(["administrator"], own)).toEqual([]);
  });

  it("whoever holds several roles may do what any of them may", () => {
    expect(allowed(["witness", "reader"])).toEqual(["record", "attest"]);
    expect(allowed([...roleSchema.options])).toEqual(Object.keys(acts));
    expect(judged(acts.attest, { rolesHeld: ["administrator", "reader"] })).toBe(
      "role-not-held: attest needs another role than the author held then (administrator, reader)",
    );
  });
});

describe("a value that fits its slot", () => {
  const mm = settled(100);
  const legs: ReadingValue = { mode: "settled", portMm: [100], starboardMm: [90] };
  const angle: ReadingValue = { mode: "settled", valuesDegrees: [0.7] };
  const at = (slot: Slot, value: ReadingValue) => isFitting(record(1, value), slot, samplePlan);

  it("is the one that the instrument of its station shows", () => {
    const fitting = ["A", "U", "I", "Z"].map((station) => [mm, legs, angle].map((value) => at({ ...battenA, station }, value)));
    expect(fitting).toEqual([
      [true, false, false],
      [false, true, false],
      [false, false, true],
      [false, false, false],
    ]);
  });

  it("is of its kind elsewhere", () => {
    const slots: Slot[] = [
      { kind: "draft", mark: "AP", round: "before" },
      { kind: "sounding", tank: "FO1", round: "before" },
      { kind: "water", place: "midships", depth: 1, round: "before" },
      { kind: "position", weight: "W1", move: 0 },
      { kind: "length", station: "A", series: 1 },
      { kind: "note" },
    ];
    const values: ReadingValue[] = [
      { value: 2, estimates: [2] },
      { value: 2 },
      { density: 1.025 },
      { place: [25, 4, 5] },
      { length: 4 },
      { text: "Lost the bob" },
    ];
    const fitting = slots.map((slot) => values.flatMap((value, i) => (at(slot, value) ? [i] : [])));
    expect(fitting).toEqual([[0, 1], [1], [2], [3], [4], [5]]);
  });

  it("is asked of a new value that settles a disagreement, and of no act without a value", () => {
    expect(isFitting(resolve(4, [1, 2], { choice: "new", value: mm }), battenA, samplePlan)).toBe(true);
    expect(isFitting(resolve(4, [1, 2], { choice: "new", value: angle }), battenA, samplePlan)).toBe(false);
    expect([takenBack(3, 1), resolve(4, [1, 2], one(1))].map((act) => isFitting(act, battenA, samplePlan))).toEqual([true, true]);
  });
});

describe("the text of an event", () => {
  it("is read as the event it holds", () => {
    expect(eventFromText(canonicalJson(record(1)))).toEqual({ ok: true, value: record(1) });
  });

  it.each([
    ["that is not JSON", '{"v":1,', "The event is not JSON"],
    ["that holds no event", "[]", /^body: /],
    ["of a newer phone", canonicalJson({ ...record(1), v: 2 }), /^v: /],
    ["with a bad figure", canonicalJson({ ...record(1), capturedAt: "this morning" }), /^capturedAt: /],
  ])("%s is set aside with the place of the fault", (_, text, message) => {
    expect(eventFromText(text)).toEqual({ ok: false, refusal: { type: "malformed-body", message: expect.stringMatching(message) } });
  });
});
