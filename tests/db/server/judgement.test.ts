import { beforeEach, describe, expect, test } from "vitest";
import { revokeDevice } from "@/db/server/devices";
import { noReading } from "@/db/server/event-writer";
import { liveSnapshot } from "@/db/server/live-snapshot";
import { rebuildProjection } from "@/db/server/rebuild-projection";
import { endRole } from "@/db/server/role-grants";
import { changeState } from "@/db/server/tests";
import { promised } from "@/lib/result";
import type { Envelope } from "@/lib/sync/protocol";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { idOf, Phone, readingOf } from "./phone";
import { at, hoursLater, personWith, type Yard, yard } from "./yard";

const mark: Slot = { kind: "draft", mark: "AP", round: "before" };
const nowhere: Slot = { kind: "draft", mark: "XX", round: "before" };
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

describe("what can't take part is kept with its code, and the rest of the batch is taken in", () => {
  const cases: Record<string, () => Envelope> = {
    "malformed-body": () => ({ body: "{}", signature: null }),
    "unknown-test": () => new Phone(ship.db, "0190a5d1-0000-4000-8000-00000000dead", mara.person).reads(mark, { value: 3.4 }),
    "unknown-slot": () => mara.reads(nowhere, { value: 3.4 }),
    "value-does-not-fit-slot": () => mara.reads(mark, { mode: "settled", valuesMm: [3] }),
    "role-not-held": () => mara.reads(mark, { value: 3.4 }, { source: "radio" }),
    "bad-signature": () => ({ ...mara.reads(mark, { value: 3.4 }), signature: null }),
  };

  test.each(Object.entries(cases))("%s", (code, made) => {
    const events = [made(), mara.reads(mark, { value: 3.381 })];
    expect(mara.sends(events).results).toMatchObject([{ outcome: "quarantined", code }, { outcome: "applied" }]);
    expect(stored()).toEqual(events.map(({ body }) => body));
    expect(standing()?.readings).toHaveLength(1);
  });

  test("unknown-device", () => {
    const stranger = new Phone(ship.db, ship.test, mara.person);
    const event = stranger.reads(mark, { value: 3.4 });
    const body = event.body.replaceAll(stranger.device, "0190a5d1-0000-4000-8000-00000000beef");
    expect(mara.sends([{ body, signature: stranger.signed(body) }]).results).toMatchObject([{ code: "unknown-device" }]);
  });

  test("revoked-device", () => {
    revokeDevice(ship.db, mara.device, { by: lead.person, at });
    expect(mara.sends([mara.reads(mark, { value: 3.4 })]).results).toMatchObject([{ code: "revoked-device" }]);
  });

  test("forked-device: two events with one number are both kept", () => {
    const twin = mara.reads(mark, { value: 3.4 });
    const body = twin.body.replace(idOf(twin), "0190a5d1-0000-7000-8000-0000000000aa");
    expect(mara.sends([twin, { body, signature: mara.signed(body) }]).results).toMatchObject([
      { outcome: "applied" },
      { code: "forked-device" },
    ]);
  });

  test("same-id-other-bytes: two events with one id are both kept", () => {
    const twin = mara.reads(mark, { value: 3.4 });
    const body = twin.body.replace('"seq":1', '"seq":2');
    expect(mara.sends([twin, { body, signature: mara.signed(body) }]).results).toMatchObject([
      { outcome: "applied" },
      { code: "same-id-other-bytes" },
    ]);
  });
});

describe("a flipped bit", () => {
  test.each([
    ["in the body", ({ body, signature }: Envelope) => ({ body: body.replace("3.381", "3.391"), signature })],
    [
      "in the signature",
      ({ body, signature }: Envelope) => ({ body, signature: `${signature?.startsWith("A") ? "B" : "A"}${signature?.slice(1)}` }),
    ],
  ])("%s is set aside, and the right bytes are taken in after it as if nothing had been", (_, broken) => {
    const event = mara.reads(mark, { value: 3.381 });
    expect(mara.sends([broken(event)]).results).toMatchObject([{ code: "bad-signature" }]);
    expect(mara.sends([event]).results).toMatchObject([{ outcome: "applied" }]);
    expect(standing()?.readings).toMatchObject([{ value: { value: 3.381 }, status: "accepted" }]);
  });
});

describe("the role that counts is the one held when it was read", () => {
  test("a role ended since then still counts, one ended before does not", () => {
    endRole(ship.db, { test: ship.test, account: mara.person, role: "reader" }, { by: lead.person, at: hoursLater(1) });
    const early = mara.reads(mark, { value: 3.381 }, { capturedAt: hoursLater(0.5) });
    const late = mara.reads(mark, { value: 3.382 }, { capturedAt: hoursLater(1.5) });
    expect(mara.sends([early, late], hoursLater(2)).results).toMatchObject([{ outcome: "applied" }, { code: "role-not-held" }]);
  });
});

describe("a correction that came before its base", () => {
  const early = (phone: Phone, base: Envelope) =>
    phone.says({ type: "correct", reading: readingOf(base), base: idOf(base), slot: mark, payload: { value: 3.281 }, source: "station" });

  test("is judged when that comes: somebody else's may not be corrected by a reader", () => {
    const base = mara.reads(mark, { value: 3.381 });
    const change = early(nils, base);
    expect(nils.sends([change]).results).toMatchObject([{ outcome: "deferred" }]);
    mara.sends([base]);
    expect(standing()?.readings.map(({ value, status }) => [value, status])).toEqual([[{ value: 3.381 }, "accepted"]]);
    expect(liveSnapshot(ship.db, ship.test, at)?.quarantined).toMatchObject([{ event: idOf(change), code: "role-not-held" }]);
    const before = standing();
    rebuildProjection(ship.db, ship.test);
    expect(standing()).toEqual(before);
  });

  test("and can be released by the lead", () => {
    const base = mara.reads(mark, { value: 3.381 });
    const change = early(nils, base);
    nils.sends([change]);
    mara.sends([base]);
    const release = lead.says({ type: "release", ...noReading, payload: { event: idOf(change) }, reason: "Nils stood beside her" });
    expect(lead.sends([release]).results).toMatchObject([{ outcome: "applied" }]);
    expect(standing()?.readings.map(({ value, status }) => [value, status])).toEqual([
      [{ value: 3.281 }, "accepted"],
      [{ value: 3.381 }, "superseded"],
    ]);
    const before = standing();
    rebuildProjection(ship.db, ship.test);
    expect(standing()).toEqual(before);
  });
});

test("a test taken back from reconciled has its slots worked out anew, as a rebuild would", () => {
  const by = { by: lead.person, at };
  for (const state of ["open", "closed", "reconciled"] as const) promised(changeState(ship.db, ship.test, state, by));
  mara.sends([mara.reads(mark, { value: 3.381 })], hoursLater(1));
  expect(standing()?.state).toBe("disagrees");
  promised(changeState(ship.db, ship.test, "closed", { ...by, at: hoursLater(2), reason: "one more reading" }));
  expect(standing()?.state).toBe("read");
});

describe("in whose name a phone may speak", () => {
  test("not in that of somebody who never held it, though the phone signs it", () => {
    const forged = mara.reads(mark, { value: 3.4 }, { author: lead.person });
    expect(mara.sends([forged]).results).toMatchObject([{ code: "role-not-held", message: "The author never held this phone" }]);
  });

  test("what a phone holds may be sent by whoever is signed in", () => {
    const event = mara.reads(mark, { value: 3.4 });
    expect(nils.sends([event]).results).toMatchObject([{ outcome: "applied" }]);
  });
});

describe("letting in", () => {
  const lostReading = () => {
    const event = mara.reads(nowhere, { value: 3.381 });
    const correction = { type: "correct", reading: readingOf(event), base: idOf(event), slot: nowhere, source: "station" } as const;
    return { event, change: mara.says({ ...correction, payload: { value: 3.281 } }) };
  };
  const assigned = (event: Envelope, slot: Slot) => lead.says({ type: "assign", ...noReading, slot, payload: { event: idOf(event) } });

  test("an orphan gets the place the lead gives it, and what stands on it follows", () => {
    const { event, change } = lostReading();
    expect(mara.sends([event, change]).results).toMatchObject([{ code: "unknown-slot" }, { code: "base-quarantined" }]);
    expect(lead.sends([assigned(event, mark)]).results).toMatchObject([{ outcome: "applied" }]);
    expect(standing()?.readings.map(({ status, value }) => [status, value])).toEqual([
      ["superseded", { value: 3.381 }],
      ["accepted", { value: 3.281 }],
    ]);
    expect(liveSnapshot(ship.db, ship.test, at)?.quarantined).toEqual([]);
  });

  test("an act that lets in may come before what it lets in", () => {
    const { event } = lostReading();
    expect(lead.sends([assigned(event, mark)]).results).toMatchObject([{ outcome: "deferred" }]);
    mara.sends([event]);
    expect(standing()?.readings).toMatchObject([{ status: "accepted" }]);
  });

  test("is refused a second time, to a place of another kind, and to a reader", () => {
    const { event } = lostReading();
    mara.sends([event]);
    const tank: Slot = { kind: "batten", move: 0, repeat: 1, station: "A", series: 1 };
    expect(lead.sends([assigned(event, tank)]).results).toMatchObject([{ code: "value-does-not-fit-slot" }]);
    const own = mara.says({ type: "assign", ...noReading, slot: mark, payload: { event: idOf(event) } });
    expect(mara.sends([own]).results).toMatchObject([{ code: "role-not-held" }]);
    expect(lead.sends([assigned(event, mark), assigned(event, mark)]).results).toMatchObject([
      { outcome: "applied" },
      { code: "not-set-aside" },
    ]);
  });

  test("a revoked phone's reading can be released to the place it asked for", () => {
    revokeDevice(ship.db, mara.device, { by: lead.person, at });
    const event = mara.reads(mark, { value: 3.381 });
    mara.sends([event]);
    const release = lead.says({ type: "release", ...noReading, payload: { event: idOf(event) }, reason: "her phone was drowned" });
    expect(lead.sends([release]).results).toMatchObject([{ outcome: "applied" }]);
    expect(standing()?.readings).toMatchObject([{ status: "accepted" }]);
  });
});

function standing() {
  return liveSnapshot(ship.db, ship.test, at)?.due.find((due) => due.slotKey === slotKey(mark));
}

function stored(): unknown {
  return ship.db.$client.prepare("select body from events order by server_seq").pluck().all();
}
