import { randomUUID } from "node:crypto";
import { expect, test } from "vitest";
import { createAccount } from "@/db/server/accounts";
import { makeEnrolment } from "@/db/server/enrolments";
import { passwordHash } from "@/db/server/passwords";
import { standingPerson } from "@/db/server/sessions";
import { sessionOfAccount, sessionOfEnrolment, tooManyAttempts } from "@/db/server/sign-in";
import { promised } from "@/lib/result";
import { at, hoursLater, yard } from "./yard";

test("gives a day to a password and a month to a phone", async () => {
  const { db, test: id, engineer } = yard();
  const hash = await passwordHash("batten-and-bob");
  promised(createAccount(db, { name: "Ann", email: "ann@yard.example", passwordHash: hash }, { by: null, at }));
  const byPassword = await sessionOfAccount(db, { email: "Ann@yard.example", password: "batten-and-bob" }, at);
  expect(byPassword).toMatchObject({ name: "Ann", seal: { device: null, endsAt: hoursLater(24) } });
  const { code } = promised(makeEnrolment(db, id, { role: "reader", personName: "Rolf" }, { by: engineer.id, at }));
  const device = randomUUID();
  const byCode = sessionOfEnrolment(db, { code, device, deviceName: "Deck phone", publicKey: "null" }, at);
  expect(byCode).toMatchObject({ name: "Rolf", seal: { device, endsAt: hoursLater(30 * 24) } });
  expect(standingPerson(db, { sub: byCode.id, ...byCode.seal }, hoursLater(700))?.name).toBe("Rolf");
});

test("refuses what is no pair of address and password", async () => {
  const { db } = yard();
  for (const given of [undefined, {}, { email: "ann@yard.example" }, { email: "ann@yard.example", password: "" }]) {
    expect(await sessionOfAccount(db, given, at)).toBeNull();
  }
});

test("makes whoever guesses a password wait", async () => {
  const { db } = yard();
  const guess = () => sessionOfAccount(db, { email: "guessed@yard.example", password: "guess" }, at);
  for (let i = 0; i < 10; i++) expect(await guess()).toBeNull();
  await expect(guess()).rejects.toThrow(tooManyAttempts);
});

test("says in a sentence why a phone was not let in", () => {
  const { db } = yard();
  const phone = { device: randomUUID(), deviceName: "Deck phone", publicKey: "" };
  expect(() => sessionOfEnrolment(db, { ...phone, code: "3333-3333" }, at)).toThrow("does not know this code");
  expect(() => sessionOfEnrolment(db, { ...phone, code: "3333-3333", device: "no uuid" }, at)).toThrow("did not say who it is");
  expect(() => sessionOfEnrolment(db, { ...phone, code: "3333-3333", publicKey: "{broken" }, at)).toThrow("did not say who it is");
});
