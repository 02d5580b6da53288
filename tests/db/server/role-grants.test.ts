import { expect, test } from "vitest";
import { createAccount } from "@/db/server/accounts";
import { ledgerOf } from "@/db/server/ledger-entries";
import { endRole, grantRole, isRoleHeldAt, peopleOf, rolesOf } from "@/db/server/role-grants";
import { promised } from "@/lib/result";
import { at, hoursLater, personWith, testIn, yard } from "./yard";

test("knows which role a person held at a time, also after it was taken away", () => {
  const { db, test: id } = yard();
  const reader = personWith({ db, test: id }, "reader");
  endRole(db, { test: id, account: reader.id, role: "reader" }, { by: null, at: hoursLater(4) });
  expect(rolesOf(db, reader.id, id, hoursLater(-1))).toEqual([]);
  expect(rolesOf(db, reader.id, id, at)).toEqual(["reader"]);
  expect(isRoleHeldAt(db, reader.id, id, ["reader", "lead"], hoursLater(3.99))).toBe(true);
  expect(isRoleHeldAt(db, reader.id, id, ["lead"], hoursLater(1))).toBe(false);
  expect(rolesOf(db, reader.id, id, hoursLater(4))).toEqual([]);
});

test("holds a role in one test and not in another", () => {
  const { db, test: id, vessel, engineer } = yard();
  const other = testIn(db, vessel, engineer.id);
  const lead = personWith({ db, test: id }, "lead");
  expect(rolesOf(db, lead.id, other, hoursLater(1))).toEqual([]);
});

test("makes an administrator one in every test", () => {
  const { db, test: id } = yard();
  const chief = promised(createAccount(db, { name: "Chief", email: null, passwordHash: null, isAdministrator: true }, { by: null, at }));
  expect(rolesOf(db, chief.id, id, at)).toEqual(["administrator"]);
});

test("gives a role once, however often it is given, and writes each change into the test's chain", () => {
  const { db, test: id, engineer } = yard();
  const reader = personWith({ db, test: id }, "reader", "Rolf");
  grantRole(db, { test: id, account: reader.id, role: "reader" }, { by: engineer.id, at: hoursLater(1) });
  expect(peopleOf(db, id, hoursLater(2)).filter(({ name }) => name === "Rolf")).toHaveLength(1);
  endRole(db, { test: id, account: reader.id, role: "reader" }, { by: engineer.id, at: hoursLater(2) });
  endRole(db, { test: id, account: reader.id, role: "reader" }, { by: engineer.id, at: hoursLater(3) });
  const written = ledgerOf(db, id).filter(({ what }) => what.startsWith("role."));
  // the engineer's own grant, then this reader's
  expect(written.map(({ what }) => what)).toEqual(["role.grant", "role.grant", "role.end"]);
});

test("can be held again after it was taken away", () => {
  const { db, test: id } = yard();
  const reader = personWith({ db, test: id }, "reader");
  const grant = { test: id, account: reader.id, role: "reader" as const };
  endRole(db, grant, { by: null, at: hoursLater(1) });
  grantRole(db, grant, { by: null, at: hoursLater(2) });
  expect([0, 1, 2].map((hours) => rolesOf(db, reader.id, id, hoursLater(hours)).length)).toEqual([1, 0, 1]);
});
