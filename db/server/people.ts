import { and, desc, eq, inArray } from "drizzle-orm";
import type { Role } from "@/lib/sync/job-sheet";
import { accounts, roleGrants } from "../schema/accounts";
import { deviceHolders, devices } from "../schema/devices";
import { tests } from "../schema/tests";
import { type Account, accountById, accountsByName } from "./accounts";
import type { Database } from "./connection";
import { inForce } from "./role-grants";

/** An account as the administrator sees it: what it may do here, and in which tests it has a part. */
export type PersonListed = Pick<Account, "id" | "name" | "email" | "isAdministrator" | "isEngineer"> & {
  readonly isClosed: boolean;
  readonly hasPassword: boolean;
  readonly parts: readonly Part[];
  readonly phones: number;
};
export type Part = { readonly test: string; readonly title: string; readonly role: Role };

export type PhoneOfPerson = {
  readonly device: string;
  readonly name: string;
  readonly enrolledAt: string;
  readonly lastHeardAt: string | null;
  readonly revokedAt: string | null;
  readonly holds: number;
};
export type PersonShown = PersonListed & { readonly devices: readonly PhoneOfPerson[] };

/** Everybody who has an account on this server, by name. */
export function everybodyHere(db: Database, at: string): PersonListed[] {
  const all = accountsByName(db);
  const parts = partsOf(
    db,
    all.map(({ id }) => id),
    at,
  );
  const phones = new Map<string, number>();
  for (const { account } of db.select({ account: deviceHolders.account }).from(deviceHolders).all()) {
    phones.set(account, (phones.get(account) ?? 0) + 1);
  }
  return all.map((account) => ({ ...listed(account), parts: parts.get(account.id) ?? [], phones: phones.get(account.id) ?? 0 }));
}

/** One person with their phones; undefined where the account is not known. */
export function personShown(db: Database, id: string, at: string): PersonShown | undefined {
  const account = accountById(db, id);
  if (!account) return undefined;
  const held = db
    .select({ device: devices })
    .from(deviceHolders)
    .innerJoin(devices, eq(devices.id, deviceHolders.device))
    .where(eq(deviceHolders.account, id))
    .orderBy(desc(devices.enrolledAt))
    .all();
  const shown = held.map(({ device: { id: device, name, enrolledAt, lastHeardAt, revokedAt, holds } }) => ({
    device,
    name,
    enrolledAt,
    lastHeardAt,
    revokedAt,
    holds,
  }));
  return { ...listed(account), parts: partsOf(db, [id], at).get(id) ?? [], phones: shown.length, devices: shown };
}

function listed({ id, name, email, isAdministrator, isEngineer, closedAt, passwordHash }: Account) {
  return { id, name, email, isAdministrator, isEngineer, isClosed: closedAt !== null, hasPassword: passwordHash !== null };
}

function partsOf(db: Database, people: readonly string[], at: string): Map<string, Part[]> {
  const rows = db
    .select({ account: roleGrants.account, test: tests.id, title: tests.title, role: roleGrants.role })
    .from(roleGrants)
    .innerJoin(tests, eq(tests.id, roleGrants.test))
    .innerJoin(accounts, eq(accounts.id, roleGrants.account))
    .where(and(inArray(roleGrants.account, [...people]), inForce(at)))
    .orderBy(desc(tests.date), roleGrants.role)
    .all();
  const parts = new Map<string, Part[]>();
  for (const { account, ...part } of rows) parts.set(account, [...(parts.get(account) ?? []), part]);
  return parts;
}
