import { beforeEach, expect, test } from "vitest";
import { noReading } from "@/db/server/event-writer";
import { advanceTest } from "@/db/server/test-state";
import { testById } from "@/db/server/tests";
import { promised } from "@/lib/result";
import type { Slot } from "@/lib/sync/slot";
import { idOf, Phone } from "./phone";
import { at, hoursLater, personWith, type Yard, yard } from "./yard";

const mark: Slot = { kind: "draft", mark: "AP", round: "before" };
let ship: Yard;
let mara: Phone;
let lead: Phone;

beforeEach(() => {
  ship = yard();
  mara = new Phone(ship.db, ship.test, personWith(ship, "reader", "Mara").id);
  lead = new Phone(ship.db, ship.test, personWith(ship, "lead", "Ragna").id);
  for (const state of ["open", "closed"] as const) promised(advanceTest(ship.db, ship.test, state, { by: lead.person, at }));
});

const reconciled = () => advanceTest(ship.db, ship.test, "reconciled", { by: ship.engineer.id, at: hoursLater(1) });

test("a test is reconciled where nothing is owed", () => {
  mara.sends([mara.reads(mark, { value: 3.381 })]);
  expect(reconciled()).toEqual({ ok: true, value: "reconciled" });
  expect(testById(ship.db, ship.test)?.state).toBe("reconciled");
});

test("not while readings disagree, until that is settled", () => {
  const given = [mara.reads(mark, { value: 3.381 }), mara.reads(mark, { value: 3.481 })];
  mara.sends(given);
  expect(reconciled()).toMatchObject({ ok: false, refusal: { type: "NotReconciled", owed: [{ type: "OpenDisagreement" }] } });
  const settled = { reading: null, base: given.map(idOf), slot: mark, source: null, payload: { choice: "mean" } } as const;
  lead.sends([lead.says({ type: "resolve", ...settled, reason: "a swell" })]);
  expect(reconciled().ok).toBe(true);
});

test("not while a number of a phone has not come, until the phone is written off with a reason", () => {
  const events = [mara.reads(mark, { value: 3.381 }), mara.reads(mark, { value: 3.382 })];
  mara.sends(events.slice(1));
  expect(reconciled()).toMatchObject({ ok: false, refusal: { owed: [{ type: "UnexplainedGap", device: mara.device, missing: 1 }] } });
  const off = { type: "device.writeOff", ...noReading, payload: { device: mara.device } } as const;
  lead.sends([lead.says({ ...off, reason: "fell overboard" })]);
  expect(reconciled().ok).toBe(true);
});
