import { randomUUID } from "node:crypto";
import { expect, test } from "vitest";
import { onChange } from "@/db/server/changes";
import { deviceById, devicesEnrolledIn, publicKeySchema, registerDevice, revokeDevice, stopPhoneOf } from "@/db/server/devices";
import { noReading } from "@/db/server/event-writer";
import { liveSnapshot } from "@/db/server/live-snapshot";
import { idOf, Phone } from "./phone";
import { at, personWith, yard } from "./yard";

const key = { kty: "EC" as const, crv: "P-256" as const, x: "x".repeat(43), y: "y".repeat(43) };
const given = (publicKey: typeof key | null = key) => ({ device: randomUUID(), name: "Deck phone", publicKey });
const act = { by: null, at };

test("keeps a device's key for ever, and takes another name or holder", () => {
  const { db, test: id, engineer } = yard();
  const reader = personWith({ db, test: id }, "reader");
  const phone = given();
  registerDevice(db, phone, engineer.id, act);
  const again = registerDevice(db, { ...phone, name: "Aft phone" }, reader.id, act);
  expect(again).toMatchObject({ ok: true, value: { name: "Aft phone", account: reader.id, publicKey: key } });
  for (const other of [{ ...key, x: "z".repeat(43) }, null]) {
    const refused = registerDevice(db, { ...phone, publicKey: other }, reader.id, act);
    expect(refused).toEqual({ ok: false, refusal: { type: "DeviceHasAnotherKey", device: phone.device } });
  }
});

test("refuses a device that was revoked", () => {
  const { db, engineer } = yard();
  const phone = given(null);
  registerDevice(db, phone, engineer.id, act);
  revokeDevice(db, phone.device, act);
  expect(deviceById(db, phone.device)?.revokedAt).toBe(at);
  expect(registerDevice(db, phone, engineer.id, act)).toMatchObject({ ok: false, refusal: { type: "DeviceRevoked" } });
});

test("stops a phone that has sent something of the test: what it sent stands, what it sends now is set aside, and can be let in", () => {
  const ship = yard();
  const mara = new Phone(ship.db, ship.test, personWith(ship, "reader", "Mara").id);
  const lead = new Phone(ship.db, ship.test, personWith(ship, "lead", "Ragna").id);
  const mark = (name: string) => ({ kind: "draft" as const, mark: name, round: "before" as const });
  expect(stopPhoneOf(ship.db, mara.device, ship.test, act)).toBe(false);
  mara.sends([mara.reads(mark("AP"), { value: 3.381 })]);
  const told: string[] = [];
  const off = onChange(ship.test, () => told.push("changed"));
  expect(stopPhoneOf(ship.db, mara.device, ship.test, act)).toBe(true);
  off();
  expect(told).toEqual(["changed"]);
  const late = mara.reads(mark("FP"), { value: 3.2 });
  expect(mara.sends([late]).results).toMatchObject([{ outcome: "quarantined", code: "revoked-device" }]);
  lead.sends([
    lead.says({ type: "release", ...noReading, payload: { event: idOf(late) }, reason: "she read it before the phone was lost" }),
  ]);
  const due = liveSnapshot(ship.db, ship.test, at)?.due ?? [];
  const accepted = due.flatMap(({ readings }) => readings.filter(({ status }) => status === "accepted"));
  expect(accepted.map(({ value }) => value)).toEqual([{ value: 3.381 }, { value: 3.2 }]);
});

test("stores nothing of a key but its public half", () => {
  expect(publicKeySchema.parse({ ...key, d: "private", ext: true, key_ops: ["verify"] })).toEqual(key);
  expect(publicKeySchema.safeParse({ ...key, crv: "P-384" }).success).toBe(false);
});

test("lists no phone for a test that none was enrolled in", () => {
  const { db, test: id, engineer } = yard();
  registerDevice(db, given(), engineer.id, act);
  expect(devicesEnrolledIn(db, id)).toEqual([]);
});
