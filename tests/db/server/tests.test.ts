import { randomUUID } from "node:crypto";
import { expect, test } from "vitest";
import { ledgerOf } from "@/db/server/ledger-entries";
import { changeState, createTest, newTestSchema, testById, testsOf } from "@/db/server/tests";
import { changeVessel, vesselById } from "@/db/server/vessels";
import { promised } from "@/lib/result";
import { at, hoursLater, personWith, testIn, yard } from "./yard";

const given = { title: "Second test", date: "2026-06-01", place: "Quay", timeZone: "Europe/Oslo" };

test("lists to a person the tests in which he has a part, the latest first", () => {
  const here = yard();
  const later = promised(createTest(here.db, here.vessel, given, { by: null, at })).id;
  const reader = personWith(here, "reader");
  expect(testsOf(here.db, reader.id, hoursLater(1)).map(({ id }) => id)).toEqual([here.test]);
  const lead = personWith({ db: here.db, test: later }, "lead");
  expect(testsOf(here.db, lead.id, hoursLater(1))).toMatchObject([
    { id: later, vessel: "MV Skerry Tern", roles: ["lead"], state: "planning" },
  ]);
  const both = testIn(here.db, here.vessel, here.engineer.id);
  expect(
    testsOf(here.db, here.engineer.id, hoursLater(1))
      .map(({ id }) => id)
      .sort(),
  ).toEqual([here.test, both].sort());
});

test("keeps the vessel as she was when the test was made", () => {
  const { db, vessel, test: id, engineer } = yard();
  const { id: _, changedAt, ...ship } = vesselById(db, vessel) ?? expect.fail("no vessel");
  promised(changeVessel(db, vessel, { ...ship, vessel: { ...ship.vessel, lbp: 99 } }, { by: engineer.id, at: hoursLater(1) }));
  expect(vesselById(db, vessel)?.vessel.lbp).toBe(99);
  expect(testById(db, id)?.vesselCopy.vessel.lbp).toBe(54);
});

test("goes on one state at a time", () => {
  const { db, test: id, engineer } = yard();
  const act = { by: engineer.id, at };
  expect(changeState(db, id, "closed", act)).toEqual({ ok: false, refusal: { type: "StateOutOfOrder", from: "planning", to: "closed" } });
  for (const state of ["open", "closed", "reconciled", "issued"] as const)
    expect(changeState(db, id, state, act)).toEqual({ ok: true, value: state });
  expect(changeState(db, id, "issued", act).ok).toBe(false);
});

test("goes back only with a reason, which stands in the ledger", () => {
  const { db, test: id, engineer } = yard();
  const act = { by: engineer.id, at };
  promised(changeState(db, id, "open", act));
  expect(changeState(db, id, "planning", act)).toMatchObject({ ok: false, refusal: { type: "ReasonMissing" } });
  expect(changeState(db, id, "planning", { ...act, reason: "  " }).ok).toBe(false);
  promised(changeState(db, id, "planning", { ...act, reason: "wrong tank table" }));
  expect(ledgerOf(db, id).at(-1)).toMatchObject({ what: "test.state", before: "open", after: "planning", reason: "wrong tank table" });
});

test("refuses a state for a test that is not here, and a test of a vessel that is not", () => {
  const { db } = yard();
  const nobody = randomUUID();
  expect(changeState(db, nobody, "open", { by: null, at })).toEqual({ ok: false, refusal: { type: "TestUnknown", test: nobody } });
  expect(createTest(db, nobody, given, { by: null, at })).toEqual({ ok: false, refusal: { type: "VesselUnknown", vessel: nobody } });
});

test("takes only a time zone that exists", () => {
  expect(newTestSchema.safeParse(given).success).toBe(true);
  expect(newTestSchema.safeParse({ ...given, timeZone: "Europe/Atlantis" }).success).toBe(false);
});
