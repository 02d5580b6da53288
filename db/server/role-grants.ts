import { and, eq, gt, inArray, isNull, lte, or } from "drizzle-orm";
import { type Role, roleSchema } from "@/lib/sync/job-sheet";
import { accounts, roleGrants } from "../schema/accounts";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { writeEntry } from "./ledger-entries";

export type Grant = { readonly test: string; readonly account: string; readonly role: Role };

/** The roles a person holds, or held, in a test at a time; an administrator of the server is one in every test. */
export function rolesOf(db: Database, account: string, test: string, at: string): Role[] {
  const granted = db
    .selectDistinct({ role: roleGrants.role })
    .from(roleGrants)
    .where(and(eq(roleGrants.account, account), eq(roleGrants.test, test), inForce(at)))
    .all()
    .map((grant) => grant.role);
  const everywhere = db.select().from(accounts).where(eq(accounts.id, account)).get()?.isAdministrator ? ["administrator" as const] : [];
  const held = new Set<Role>([...granted, ...everywhere]);
  return roleSchema.options.filter((role) => held.has(role));
}

export function isRoleHeldAt(db: Database, account: string, test: string, roles: readonly Role[], at: string): boolean {
  return rolesOf(db, account, test, at).some((role) => roles.includes(role));
}

/** Whether a person holds one of the roles at a time in any test at all. */
export function isRoleHeldAnywhere(db: Database, account: string, roles: readonly Role[], at: string): boolean {
  const held = and(eq(roleGrants.account, account), inArray(roleGrants.role, [...roles]), inForce(at));
  return db.select({ test: roleGrants.test }).from(roleGrants).where(held).limit(1).get() !== undefined;
}

/** Every role a person was ever given, in every test. */
export function grantsOf(db: Database, account: string): Grant[] {
  return db
    .select({ test: roleGrants.test, account: roleGrants.account, role: roleGrants.role })
    .from(roleGrants)
    .where(eq(roleGrants.account, account))
    .all();
}

/** Everybody who holds a role in the test, with each role. */
export function peopleOf(db: Database, test: string, at: string): { account: string; name: string; role: Role; fromAt: string }[] {
  return db
    .select({ account: accounts.id, name: accounts.name, role: roleGrants.role, fromAt: roleGrants.fromAt })
    .from(roleGrants)
    .innerJoin(accounts, eq(accounts.id, roleGrants.account))
    .where(and(eq(roleGrants.test, test), inForce(at)))
    .orderBy(accounts.name, roleGrants.role)
    .all();
}

/** Gives a role from now on; a role already held stays as it is. */
export function grantRole(db: Database, grant: Grant, act: Act): void {
  inTransaction(db, () => {
    const held = db
      .select()
      .from(roleGrants)
      .where(and(ofGrant(grant), inForce(act.at)))
      .get();
    if (held) return;
    db.insert(roleGrants)
      .values({ ...grant, fromAt: act.at, grantedBy: act.by })
      .run();
    writeEntry(db, grant.test, { ...act, what: "role.grant", after: { account: grant.account, role: grant.role } });
  });
}

/** Takes a role away from now on; what was done with it before stays done. */
export function endRole(db: Database, grant: Grant, act: Act): void {
  inTransaction(db, () => {
    const { changes } = db
      .update(roleGrants)
      .set({ untilAt: act.at })
      .where(and(ofGrant(grant), inForce(act.at)))
      .run();
    if (changes > 0) writeEntry(db, grant.test, { ...act, what: "role.end", before: { account: grant.account, role: grant.role } });
  });
}

function ofGrant({ test, account, role }: Grant) {
  return and(eq(roleGrants.test, test), eq(roleGrants.account, account), eq(roleGrants.role, role));
}

/** A grant that has begun and has not ended at a time. */
export function inForce(at: string) {
  return and(lte(roleGrants.fromAt, at), or(isNull(roleGrants.untilAt), gt(roleGrants.untilAt, at)));
}
