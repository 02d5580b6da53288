import { randomUUID } from "node:crypto";
import { desc, eq } from "drizzle-orm";
import { z } from "zod";
import { testRecordSchema } from "@/lib/record/test-record";
import { answer, type Result, refuse } from "@/lib/result";
import { type Role, type TestState, testStateSchema } from "@/lib/sync/job-sheet";
import { tests } from "../schema/tests";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { writeEntry } from "./ledger-entries";
import { rolesOf } from "./role-grants";
import { standAgain } from "./slot-standing";
import { vesselById } from "./vessels";

export type Test = typeof tests.$inferSelect;
export type TestListed = Pick<Test, "id" | "title" | "date" | "place" | "state" | "custody"> & {
  readonly vessel: string;
  readonly roles: Role[];
};

const { title, date, place, note } = testRecordSchema.shape.test.shape;
export const newTestSchema = z.strictObject({
  title,
  date,
  place,
  note,
  timeZone: z.string().refine(isTimeZone, "is no time zone, such as Europe/Oslo"),
});
export type NewTest = z.infer<typeof newTestSchema> & { readonly id?: string };

export function testById(db: Database, id: string): Test | undefined {
  return db.select().from(tests).where(eq(tests.id, id)).get();
}

/** Whether a test is here, without reading what is known of it. */
export function isTestKnown(db: Database, id: string): boolean {
  return db.select({ id: tests.id }).from(tests).where(eq(tests.id, id)).get() !== undefined;
}

/** Every test on this server, whoever has a part in it; the oldest first. */
export function everyTest(db: Database): Test[] {
  return db.select().from(tests).orderBy(tests.createdAt, tests.id).all();
}

/** The tests in which a person holds a role, the latest first. */
export function testsOf(db: Database, account: string, at: string): TestListed[] {
  const rows = db.select().from(tests).orderBy(desc(tests.date), desc(tests.createdAt)).all();
  return rows.map((row) => ({ ...listed(row), roles: rolesOf(db, account, row.id, at) })).filter((test) => test.roles.length > 0);
}

/** A new test of a vessel: it takes her particulars, hydrostatics, marks and tanks as they are now. */
export function createTest(
  db: Database,
  vessel: string,
  given: NewTest,
  act: Act,
): Result<Test, { type: "VesselUnknown"; vessel: string }> {
  return inTransaction(db, () => {
    const standing = vesselById(db, vessel);
    if (!standing) return refuse({ type: "VesselUnknown", vessel });
    const { id: _, changedAt, ...vesselCopy } = standing;
    const row = {
      ...given,
      id: given.id ?? randomUUID(),
      note: given.note ?? null,
      state: "planning" as const,
      vessel,
      vesselCopy,
      createdAt: act.at,
    };
    const test = db.insert(tests).values(row).returning().get();
    writeEntry(db, test.id, { ...act, what: "test.create", after: { title: test.title, vessel, vesselChangedAt: changedAt } });
    return answer(test);
  });
}

export type StateRefusal =
  | { type: "TestUnknown"; test: string }
  | { type: "TestHandedOver"; test: string }
  | { type: "StateOutOfOrder"; from: TestState; to: TestState }
  | { type: "ReasonMissing"; from: TestState; to: TestState };

/** Takes a test one state on, or back to an earlier one; going back needs a reason. */
export function changeState(db: Database, id: string, to: TestState, act: Act): Result<TestState, StateRefusal> {
  return inTransaction(db, () => {
    const test = testById(db, id);
    if (!test) return refuse({ type: "TestUnknown", test: id });
    const refusal = stateRefusal(test, to, act.reason ?? null);
    if (refusal) return refuse(refusal);
    db.update(tests).set({ state: to }).where(eq(tests.id, id)).run();
    writeEntry(db, id, { ...act, what: "test.state", before: test.state, after: to });
    standAgain(db, id);
    return answer(to);
  });
}

function stateRefusal(test: Test, to: TestState, reason: string | null): StateRefusal | null {
  const order = testStateSchema.options;
  const steps = order.indexOf(to) - order.indexOf(test.state);
  if (test.custody === "handed-over") return { type: "TestHandedOver", test: test.id };
  if (steps === 0 || steps > 1) return { type: "StateOutOfOrder", from: test.state, to };
  if (steps < 0 && !reason?.trim()) return { type: "ReasonMissing", from: test.state, to };
  return null;
}

function listed({ id, title, date, place, state, custody, vesselCopy }: Test) {
  return { id, title, date, place, state, custody, vessel: vesselCopy.vessel.name };
}

function isTimeZone(zone: string): boolean {
  try {
    return new Intl.DateTimeFormat("en", { timeZone: zone }).resolvedOptions().timeZone.length > 0;
  } catch {
    return false;
  }
}
