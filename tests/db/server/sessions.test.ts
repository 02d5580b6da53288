import { randomUUID } from "node:crypto";
import { expect, test } from "vitest";
import { changePassword, changeStanding } from "@/db/server/accounts";
import { registerDevice, revokeDevice } from "@/db/server/devices";
import { standingPerson } from "@/db/server/sessions";
import { at, hoursLater, yard } from "./yard";

const act = { by: null, at };

function signedIn(device: string | null = null) {
  const here = yard();
  if (device) registerDevice(here.db, { device, name: "Phone", publicKey: null }, here.engineer.id, act);
  const { id: sub, sessionVersion: version } = here.engineer;
  return { ...here, seal: { sub, version, device, endsAt: hoursLater(24) } };
}

test("knows the person of a session, and the phone", () => {
  const device = randomUUID();
  const { db, seal } = signedIn(device);
  expect(standingPerson(db, seal, at)).toEqual({
    id: seal.sub,
    name: "Ellen Moe",
    locale: "en",
    device,
    isAdministrator: false,
    isEngineer: true,
  });
});

test("ends at its time", () => {
  const { db, seal } = signedIn();
  expect(standingPerson(db, seal, hoursLater(23.99))).not.toBeNull();
  expect(standingPerson(db, seal, hoursLater(24))).toBeNull();
});

test("ends at once when the account is closed, the password changed or the phone revoked", () => {
  const closed = signedIn();
  changeStanding(closed.db, closed.seal.sub, { isAdministrator: false, isEngineer: false, isClosed: true }, act);
  expect(standingPerson(closed.db, closed.seal, at)).toBeNull();
  const changed = signedIn();
  changePassword(changed.db, changed.seal.sub, "hash", act);
  expect(standingPerson(changed.db, changed.seal, at)).toBeNull();
  const device = randomUUID();
  const revoked = signedIn(device);
  revokeDevice(revoked.db, device, act);
  expect(standingPerson(revoked.db, revoked.seal, at)).toBeNull();
});

test("is nobody's without a seal, with a strange one or for an unknown phone", () => {
  const { db, seal } = signedIn();
  for (const other of [null, "seal", {}, { ...seal, version: "1" }, { ...seal, sub: randomUUID() }, { ...seal, device: randomUUID() }]) {
    expect(standingPerson(db, other, at)).toBeNull();
  }
});
