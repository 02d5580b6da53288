import { expect, test } from "vitest";
import { accountByEmail, accountById, accountSigningIn, changePassword, changeStanding, createAccount } from "@/db/server/accounts";
import { ledgerOf } from "@/db/server/ledger-entries";
import { passwordHash } from "@/db/server/passwords";
import { promised } from "@/lib/result";
import { at, yard } from "./yard";

const act = { by: null, at };

test("finds an account by its address however it is typed", () => {
  const { db, engineer } = yard();
  expect(accountByEmail(db, " Ellen@Yard.example ")?.id).toBe(engineer.id);
});

test("refuses a second account with an address that is taken", () => {
  const { db } = yard();
  const second = createAccount(db, { name: "Other", email: "ELLEN@yard.example", passwordHash: null }, act);
  expect(second).toEqual({ ok: false, refusal: { type: "EmailTaken", email: "ellen@yard.example" } });
});

test("signs in with the right password only, and not after the account was closed", async () => {
  const { db } = yard();
  const hash = await passwordHash("batten-and-bob");
  const ann = promised(createAccount(db, { name: "Ann", email: "ann@yard.example", passwordHash: hash }, act));
  expect((await accountSigningIn(db, "ann@yard.example", "batten-and-bob"))?.id).toBe(ann.id);
  expect(await accountSigningIn(db, "ann@yard.example", "batten")).toBeUndefined();
  expect(await accountSigningIn(db, "nobody@yard.example", "batten-and-bob")).toBeUndefined();
  changeStanding(db, ann.id, { isAdministrator: false, isEngineer: false, isClosed: true }, act);
  expect(await accountSigningIn(db, "ann@yard.example", "batten-and-bob")).toBeUndefined();
});

test("ends every session when the password changes, and writes no password into the ledger", () => {
  const { db, engineer } = yard();
  changePassword(db, engineer.id, "scrypt$secret", act);
  expect(accountById(db, engineer.id)?.sessionVersion).toBe(engineer.sessionVersion + 1);
  const entries = ledgerOf(db, null);
  expect(entries.at(-1)).toMatchObject({ what: "account.password", after: { account: engineer.id } });
  expect(JSON.stringify(entries)).not.toContain("scrypt$secret");
});

test("changes what a person may do, closes and reopens the account, and writes each into the ledger", () => {
  const { db, engineer } = yard();
  const to = { isAdministrator: true, isEngineer: false, isClosed: false };
  expect(promised(changeStanding(db, engineer.id, to, act))).toMatchObject({ isAdministrator: true, isEngineer: false, closedAt: null });
  expect(ledgerOf(db, null).at(-1)).toMatchObject({
    what: "account.standing",
    before: { isAdministrator: false, isEngineer: true, isClosed: false },
    after: to,
  });
  promised(createAccount(db, { name: "Odd", email: null, passwordHash: null, isAdministrator: true }, act));
  const closed = promised(changeStanding(db, engineer.id, { ...to, isClosed: true }, act));
  expect(closed).toMatchObject({ closedAt: at, sessionVersion: engineer.sessionVersion + 1 });
  expect(promised(changeStanding(db, engineer.id, to, act)).closedAt).toBeNull();
});

test("keeps the last administrator", () => {
  const { db } = yard();
  const odd = promised(createAccount(db, { name: "Odd", email: null, passwordHash: null, isAdministrator: true }, act));
  const without = { isAdministrator: false, isEngineer: false, isClosed: false };
  expect(changeStanding(db, odd.id, without, act)).toEqual({ ok: false, refusal: { type: "LastAdministrator", account: odd.id } });
  expect(changeStanding(db, odd.id, { ...without, isAdministrator: true, isClosed: true }, act).ok).toBe(false);
  promised(createAccount(db, { name: "Eva", email: null, passwordHash: null, isAdministrator: true }, act));
  expect(changeStanding(db, odd.id, without, act).ok).toBe(true);
  expect(changeStanding(db, "nobody", without, act)).toEqual({ ok: false, refusal: { type: "AccountUnknown", account: "nobody" } });
});
