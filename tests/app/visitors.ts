import { encode } from "next-auth/jwt";
import { type Account, createAccount } from "@/db/server/accounts";
import type { Database } from "@/db/server/connection";
import { grantRole } from "@/db/server/role-grants";
import { sessionSecret } from "@/db/server/secrets";
import { promised } from "@/lib/result";
import { type Role, roleSchema } from "@/lib/sync/job-sheet";

export type Visitor = Role | "nobody";
export const visitors: readonly Visitor[] = [...roleSchema.options, "nobody"];

/** One person for each role, who holds it in one test only; an administrator is one everywhere. */
export function peopleIn(db: Database, test: string, at: string): Map<Visitor, Account> {
  const people = new Map<Visitor, Account>();
  for (const role of roleSchema.options) {
    const given = {
      name: `A ${role}`,
      email: null,
      passwordHash: null,
      isAdministrator: role === "administrator",
      isEngineer: role === "engineer",
    };
    const account = promised(createAccount(db, given, { by: null, at }));
    if (role !== "administrator") grantRole(db, { test, account: account.id, role }, { by: null, at });
    people.set(role, account);
  }
  return people;
}

/** The cookie of a session that stands for an hour; nobody has none. */
export async function cookieOf(account: Account | undefined): Promise<string> {
  if (!account) return "";
  const endsAt = new Date(Date.now() + 3_600_000).toISOString();
  const token = await encode({
    token: { sub: account.id, version: account.sessionVersion, device: null, endsAt },
    secret: sessionSecret(),
  });
  return `next-auth.session-token=${token}`;
}
