import { randomUUID } from "node:crypto";
import { expect, test } from "vitest";
import { accountsByName, changeStanding, createAccount } from "@/db/server/accounts";
import { deviceById, devicesEnrolledIn, registerDevice, revokeDevice } from "@/db/server/devices";
import { enrol, enrolmentsOf, makeEnrolment, revokeEnrolment } from "@/db/server/enrolments";
import { ledgerOf } from "@/db/server/ledger-entries";
import { rolesOf } from "@/db/server/role-grants";
import { promised } from "@/lib/result";
import { at, hoursLater, personWith, testIn, type Yard, yard } from "./yard";

const phone = () => ({ device: randomUUID(), name: "Deck phone", publicKey: null });

function codeFor({ db, test: id, engineer }: Yard, account?: string) {
  return promised(makeEnrolment(db, id, { role: "reader", personName: "Rolf", account }, { by: engineer.id, at }));
}

test("lets one phone in, with its person and role, from that moment on", () => {
  const here = yard();
  const { db, test: id } = here;
  const deck = phone();
  const { account, device, test: joined } = promised(enrol(db, codeFor(here).code, deck, hoursLater(1)));
  expect(joined).toBe(id);
  expect(account).toMatchObject({ name: "Rolf", email: null, passwordHash: null });
  expect(device).toMatchObject({ id: deck.device, account: account.id, enrolledAt: hoursLater(1) });
  expect(rolesOf(db, account.id, id, at)).toEqual([]);
  expect(rolesOf(db, account.id, id, hoursLater(1))).toEqual(["reader"]);
  expect(devicesEnrolledIn(db, id).map(({ id }) => id)).toEqual([deck.device]);
  expect(ledgerOf(db, id).at(-1)).toMatchObject({ what: "enrolment.use", who: account.id, device: deck.device });
});

test("works once", () => {
  const here = yard();
  const { code } = codeFor(here);
  expect(enrol(here.db, code, phone(), hoursLater(1)).ok).toBe(true);
  expect(enrol(here.db, code, phone(), hoursLater(2))).toEqual({ ok: false, refusal: { type: "CodeUsed", usedAt: hoursLater(1) } });
});

test("expires after a day", () => {
  const here = yard();
  const { code, expiresAt } = codeFor(here);
  expect(expiresAt).toBe(hoursLater(24));
  expect(enrol(here.db, code, phone(), hoursLater(24))).toEqual({ ok: false, refusal: { type: "CodeExpired", expiresAt } });
  expect(enrol(here.db, code, phone(), hoursLater(23.99)).ok).toBe(true);
});

test("is worthless once it was taken back, or when nobody made it", () => {
  const here = yard();
  const { code, id } = codeFor(here);
  revokeEnrolment(here.db, here.test, id, { by: here.engineer.id, at: hoursLater(1) });
  expect(enrol(here.db, code, phone(), hoursLater(2))).toEqual({ ok: false, refusal: { type: "CodeRevoked", revokedAt: hoursLater(1) } });
  expect(enrol(here.db, "3333-3333", phone(), hoursLater(2))).toEqual({ ok: false, refusal: { type: "CodeUnknown" } });
});

test("can't be taken back from another test", () => {
  const here = yard();
  const { code, id } = codeFor(here);
  const other = testIn(here.db, here.vessel, here.engineer.id);
  revokeEnrolment(here.db, other, id, { by: here.engineer.id, at: hoursLater(1) });
  expect(enrol(here.db, code, phone(), hoursLater(2)).ok).toBe(true);
});

test("is taken as it is typed: small letters, without the hyphen", () => {
  const here = yard();
  const typed = codeFor(here).code.toLowerCase().replace("-", " ");
  expect(enrol(here.db, typed, phone(), hoursLater(1)).ok).toBe(true);
});

test("has eight characters that can't be taken for one another, and is kept nowhere", () => {
  const here = yard();
  for (let i = 0; i < 50; i++) {
    const { code } = codeFor(here);
    expect(code).toMatch(/^[34679ACDEFGHJKMNPQRTUVWXY]{4}-[34679ACDEFGHJKMNPQRTUVWXY]{4}$/);
    const kept = JSON.stringify([enrolmentsOf(here.db, here.test), ledgerOf(here.db, here.test)]);
    expect(kept).not.toContain(code);
    expect(kept).not.toContain(code.replace("-", ""));
  }
});

test("leaves no account, role or used code behind when the phone itself is refused", () => {
  const here = yard();
  const lost = phone();
  promised(registerDevice(here.db, lost, here.engineer.id, { by: here.engineer.id, at }));
  revokeDevice(here.db, lost.device, { by: here.engineer.id, at });
  const { code } = codeFor(here);
  const before = accountsByName(here.db).length;
  expect(enrol(here.db, code, lost, hoursLater(1))).toEqual({ ok: false, refusal: { type: "DeviceRevoked", device: lost.device } });
  expect(accountsByName(here.db)).toHaveLength(before);
  expect(enrol(here.db, code, phone(), hoursLater(1)).ok).toBe(true);
});

test("opens only the maker's own account or that of somebody who reads in this test and does nothing else", () => {
  const here = yard();
  const { db, test: id, engineer } = here;
  const reader = personWith(here, "reader");
  const lead = personWith(here, "lead");
  const chief = promised(createAccount(db, { name: "Chief", email: null, passwordHash: null, isAdministrator: true }, { by: null, at }));
  const codeBy = (by: string, account: string) => makeEnrolment(db, id, { role: "reader", personName: "x", account }, { by, at });
  expect(codeBy(lead.id, lead.id).ok).toBe(true);
  expect(codeBy(lead.id, reader.id).ok).toBe(true);
  for (const account of [chief.id, engineer.id, randomUUID()]) {
    expect(codeBy(lead.id, account)).toEqual({ ok: false, refusal: { type: "AccountNotYours", account } });
  }
  const elsewhere = personWith({ db, test: testIn(db, here.vessel, engineer.id) }, "reader");
  expect(codeBy(lead.id, elsewhere.id).ok).toBe(false);
});

test("lets nobody in on a closed account", () => {
  const here = yard();
  const reader = personWith(here, "reader");
  const { code } = codeFor(here, reader.id);
  changeStanding(here.db, reader.id, { isAdministrator: false, isEngineer: false, isClosed: true }, { by: null, at });
  expect(enrol(here.db, code, phone(), hoursLater(1))).toEqual({ ok: false, refusal: { type: "AccountClosed" } });
});

test("binds a second phone to the same person", () => {
  const here = yard();
  const reader = personWith(here, "reader");
  const deck = phone();
  const { account } = promised(enrol(here.db, codeFor(here, reader.id).code, deck, hoursLater(1)));
  expect(account.id).toBe(reader.id);
  expect(deviceById(here.db, deck.device)?.account).toBe(reader.id);
});
