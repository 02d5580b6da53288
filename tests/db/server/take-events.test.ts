import { beforeEach, describe, expect, test } from "vitest";
import { ledgerOf } from "@/db/server/ledger-entries";
import { liveSnapshot } from "@/db/server/live-snapshot";
import { chainHead } from "@/lib/ledger/hash-chain";
import { sha256Hex } from "@/lib/ledger/sha256";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { idOf, Phone, readingOf } from "./phone";
import { at, hoursLater, personWith, testIn, type Yard, yard } from "./yard";

const mark: Slot = { kind: "draft", mark: "AP", round: "before" };
let ship: Yard;
let mara: Phone;
let nils: Phone;
let lead: Phone;

beforeEach(() => {
  ship = yard();
  mara = new Phone(ship.db, ship.test, personWith(ship, "reader", "Mara").id);
  nils = new Phone(ship.db, ship.test, personWith(ship, "reader", "Nils").id);
  lead = new Phone(ship.db, ship.test, personWith(ship, "lead", "Ragna").id);
});

describe("two phones that read one mark differently", () => {
  test("are both stored, shown as a disagreement, and neither reader hears of the other", () => {
    expect(outcomes(mara.sends([mara.reads(mark, { value: 3.381 })]))).toEqual(["applied"]);
    expect(outcomes(nils.sends([nils.reads(mark, { value: 3.431 })]))).toEqual(["applied"]);
    const due = standing(mark);
    expect(due?.state).toBe("disagrees");
    expect(due?.readings.map(({ author, status }) => [author, status])).toEqual([
      ["Mara", "disagrees"],
      ["Nils", "disagrees"],
    ]);
  });

  test("are settled by the lead, and open again when one more reads", () => {
    const given = [mara.reads(mark, { value: 3.381 }), nils.reads(mark, { value: 3.431 })];
    for (const [i, phone] of [mara, nils].entries()) phone.sends(given.slice(i, i + 1));
    const resolve = lead.says({
      type: "resolve",
      reading: null,
      base: given.map(idOf),
      slot: mark,
      source: null,
      payload: { choice: "one", head: idOf(given[0] ?? { body: "", signature: null }) },
      reason: "read again from the boat",
    });
    expect(outcomes(lead.sends([resolve]))).toEqual(["applied"]);
    expect(standing(mark)?.state).toBe("resolved");
    expect(outcomes(lead.sends([lead.reads(mark, { value: 3.382 }, { source: "radio" })]))).toEqual(["disagrees"]);
    expect(standing(mark)?.state).toBe("disagrees");
  });

  test("stand as replicates within the limit", () => {
    mara.sends([mara.reads(mark, { value: 3.381 })]);
    nils.sends([nils.reads(mark, { value: 3.399 })]);
    expect(standing(mark)).toMatchObject({ state: "read", readings: [{ status: "accepted" }, { status: "accepted" }] });
  });
});

test("one batch sent three times is one reading each, with three identical receipts", () => {
  const batch = [mara.reads(mark, { value: 3.381 }), mara.reads({ ...mark, mark: "XX" }, { value: 3 }), mara.reads(mark, { value: 3.43 })];
  const answers = [at, hoursLater(1), hoursLater(2)].map((when) => mara.sends(batch, when).results);
  expect(answers[1]).toEqual(answers[0]);
  expect(answers[2]).toEqual(answers[0]);
  expect(answers[0]?.map(({ outcome }) => outcome)).toEqual(["applied", "quarantined", "applied"]);
  expect(count("events")).toBe(3);
  expect(count("readings")).toBe(2);
  expect(ledgerOf(ship.db, ship.test).filter(({ contentHash }) => contentHash !== null)).toHaveLength(3);
});

test("every event has one entry in its test's chain, over its exact bytes, in the order in which they came", () => {
  const batch = [mara.reads(mark, { value: 3.381 }), mara.reads(mark, { value: 3.382 })];
  mara.sends(batch);
  nils.sends([{ body: "no JSON", signature: null }]);
  const chain = ledgerOf(ship.db, ship.test);
  expect(chainHead(chain).ok).toBe(true);
  expect(chain.flatMap(({ contentHash }) => contentHash ?? [])).toEqual(batch.map(({ body }) => sha256Hex(body)));
  expect(ledgerOf(ship.db, null).at(-1)).toMatchObject({ what: "event.set-aside", contentHash: sha256Hex("no JSON") });
  expect(mara.sends([]).ledgerHead).toBeNull();
});

test("the database refuses to change or delete what has come in", () => {
  mara.sends([mara.reads(mark, { value: 3.381 })]);
  for (const table of ["events", "ledger_entries"]) {
    expect(() => ship.db.$client.exec(`update ${table} set device = 'x'`)).toThrow("never changed");
    expect(() => ship.db.$client.exec(`delete from ${table}`)).toThrow("never deleted");
  }
});

describe("a correction", () => {
  test("replaces what it stands on, which stays readable", () => {
    const first = mara.reads(mark, { value: 3.381 });
    mara.sends([first, corrected(mara, first, 3.281)]);
    expect(standing(mark)?.readings.map(({ status, corrected: is }) => [status, is])).toEqual([
      ["superseded", false],
      ["accepted", true],
    ]);
  });

  test("waits for its base, and counts once that has come", () => {
    const first = mara.reads(mark, { value: 3.381 });
    const second = corrected(mara, first, 3.281);
    expect(outcomes(mara.sends([second]))).toEqual(["deferred"]);
    expect(standing(mark)?.state).toBe("empty");
    expect(outcomes(mara.sends([first]))).toEqual(["applied"]);
    expect(standing(mark)?.readings.filter(({ status }) => status === "accepted")).toMatchObject([{ value: { value: 3.281 } }]);
  });

  test("of one base twice is a disagreement", () => {
    const first = mara.reads(mark, { value: 3.381 });
    mara.sends([first, corrected(mara, first, 3.281), corrected(mara, first, 3.181)]);
    expect(standing(mark)?.state).toBe("disagrees");
  });

  test("of somebody else's reading is set aside, unless the lead makes it", () => {
    const first = mara.reads(mark, { value: 3.381 });
    mara.sends([first]);
    expect(codes(nils.sends([corrected(nils, first, 3.281)]))).toEqual(["role-not-held"]);
    expect(outcomes(lead.sends([corrected(lead, first, 3.281)]))).toEqual(["applied"]);
  });
});

test("a batten reading that comes after its move was closed is late, and counts", () => {
  const slot: Slot = { kind: "batten", move: 1, repeat: 1, station: "A", series: 1 };
  lead.sends([lead.orders("move.open", 1), lead.orders("move.close", 1)], hoursLater(1));
  mara.sends([mara.reads(slot, { mode: "settled", valuesMm: [101] }, { capturedAt: hoursLater(0.5) })], hoursLater(2));
  expect(standing(slot)?.readings).toMatchObject([{ status: "accepted", late: true }]);
});

test("what is sent for one test changes nothing in another of the same ship", () => {
  const other = testIn(ship.db, ship.vessel, ship.engineer.id);
  const before = JSON.stringify(liveSnapshot(ship.db, other, at));
  mara.sends([mara.reads(mark, { value: 3.381 })]);
  expect(JSON.stringify(liveSnapshot(ship.db, other, at))).toBe(before);
});

test("tells the phone its highest number and what is missing below it", () => {
  const events = [1, 2, 3, 4].map((i) => mara.reads(mark, { value: 3.38 + i / 1000 }));
  expect(mara.sends(events.filter((_, i) => i !== 1)).device).toEqual({ highestSeq: 4, missing: [2] });
  expect(mara.sends(events).device).toEqual({ highestSeq: 4, missing: [] });
});

test("a full database stores nothing of the batch and says so", () => {
  const pages = Number(ship.db.$client.pragma("page_count", { simple: true }));
  ship.db.$client.pragma(`max_page_count = ${pages}`);
  const many = Array.from({ length: 400 }, (_, i) => mara.reads(mark, { value: 3.38 + i / 100_000 }));
  expect(() => mara.sends(many)).toThrow(/full/);
  expect(count("events")).toBe(0);
  ship.db.$client.pragma("max_page_count = 1000000");
  expect(new Set(outcomes(mara.sends(many)))).toEqual(new Set(["applied"]));
});

function corrected(phone: Phone, base: ReturnType<Phone["says"]>, value: number) {
  return phone.says({ type: "correct", reading: readingOf(base), base: idOf(base), slot: mark, payload: { value }, source: "station" });
}

function standing(slot: Slot) {
  return liveSnapshot(ship.db, ship.test, at)?.due.find((due) => due.slotKey === slotKey(slot));
}

function outcomes({ results }: ReturnType<Phone["sends"]>) {
  return results.map(({ outcome }) => outcome);
}

function codes({ results }: ReturnType<Phone["sends"]>) {
  return results.map(({ code }) => code);
}

function count(table: string): unknown {
  return ship.db.$client.prepare(`select count(*) from ${table}`).pluck().get();
}
