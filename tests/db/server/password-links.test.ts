import { expect, test } from "vitest";
import { accountById, changeStanding } from "@/db/server/accounts";
import { ledgerOf } from "@/db/server/ledger-entries";
import { hoursOpen, makePasswordLink, setPasswordByLink } from "@/db/server/password-links";
import { promised } from "@/lib/result";
import { at, hoursLater, yard } from "./yard";

test("a link sets a password once, ends the sessions before, and stands nowhere but with its person", () => {
  const { db, engineer } = yard();
  const { token, expiresAt } = makePasswordLink(db, engineer.id, hoursOpen.invited, { by: null, at });
  expect(expiresAt).toBe(hoursLater(96));
  expect(JSON.stringify([db.$client.prepare("select * from password_links").all(), ledgerOf(db, null)])).not.toContain(token);
  expect(promised(setPasswordByLink(db, token, "a hash", at)).id).toBe(engineer.id);
  expect(accountById(db, engineer.id)).toMatchObject({ passwordHash: "a hash", sessionVersion: engineer.sessionVersion + 1 });
  expect(setPasswordByLink(db, token, "another", at)).toEqual({ ok: false, refusal: { type: "LinkUsed", usedAt: at } });
  expect(accountById(db, engineer.id)?.passwordHash).toBe("a hash");
});

test("a newer link ends the one before", () => {
  const { db, engineer } = yard();
  const first = makePasswordLink(db, engineer.id, 1, { by: null, at });
  const second = makePasswordLink(db, engineer.id, 1, { by: null, at });
  expect(setPasswordByLink(db, first.token, "a hash", at)).toEqual({ ok: false, refusal: { type: "LinkUnknown" } });
  expect(setPasswordByLink(db, second.token, "a hash", at).ok).toBe(true);
});

test("a link that is too old, unknown, or for a closed account sets nothing", () => {
  const { db, engineer } = yard();
  const { token, expiresAt } = makePasswordLink(db, engineer.id, 2, { by: null, at });
  expect(setPasswordByLink(db, token, "a hash", hoursLater(2))).toEqual({ ok: false, refusal: { type: "LinkExpired", expiresAt } });
  expect(setPasswordByLink(db, "guessed", "a hash", at)).toEqual({ ok: false, refusal: { type: "LinkUnknown" } });
  promised(changeStanding(db, engineer.id, { isAdministrator: false, isEngineer: true, isClosed: true }, { by: null, at }));
  expect(setPasswordByLink(db, token, "a hash", at)).toEqual({ ok: false, refusal: { type: "AccountClosed" } });
  expect(accountById(db, engineer.id)?.passwordHash).toBeNull();
});
