import { skerryTern } from "@/db/seed/skerry-tern";
import { type Account, createAccount } from "@/db/server/accounts";
import { type Database, openDatabase } from "@/db/server/connection";
import { grantRole } from "@/db/server/role-grants";
import { planOf, savePlan } from "@/db/server/test-plan";
import { createTest } from "@/db/server/tests";
import { createVessel } from "@/db/server/vessels";
import { promised } from "@/lib/result";
import type { Role } from "@/lib/sync/job-sheet";

export const at = "2026-05-04T07:00:00.000Z";
export const plan = planOf(skerryTern().record);

/** A server in memory with one engineer, one vessel and one test of hers with a plan. */
export type Yard = { readonly db: Database; readonly engineer: Account; readonly vessel: string; readonly test: string };

export function yard(): Yard {
  return yardIn(openDatabase(":memory:"));
}

/** The same in a database that is there already. */
export function yardIn(db: Database): Yard {
  const engineer = promised(
    createAccount(db, { name: "Ellen Moe", email: "ellen@yard.example", passwordHash: null, isEngineer: true }, { by: null, at }),
  );
  const { vessel, hydrostatics, draftMarks, tanks } = skerryTern().record;
  const id = createVessel(db, { vessel, hydrostatics, draftMarks, tanks }, { by: engineer.id, at });
  const test = testIn(db, id, engineer.id);
  return { db, engineer, vessel: id, test };
}

/** One more test of the vessel, with the same plan. */
export function testIn(db: Database, vessel: string, engineer: string): string {
  const given = { title: "Inclining test", date: "2026-05-04", place: "Quay", timeZone: "Europe/Oslo" };
  const { id } = promised(createTest(db, vessel, given, { by: engineer, at }));
  grantRole(db, { test: id, account: engineer, role: "engineer" }, { by: engineer, at });
  promised(savePlan(db, id, plan, null, { by: engineer, at }));
  return id;
}

export function personWith({ db, test }: Pick<Yard, "db" | "test">, role: Role, name = `A ${role}`): Account {
  const account = promised(createAccount(db, { name, email: null, passwordHash: null }, { by: null, at }));
  grantRole(db, { test, account: account.id, role }, { by: null, at });
  return account;
}

/** A moment some hours after the yard was opened. */
export function hoursLater(hours: number): string {
  return new Date(Date.parse(at) + hours * 3_600_000).toISOString();
}
