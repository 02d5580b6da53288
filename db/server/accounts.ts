import { randomUUID } from "node:crypto";
import { and, eq, isNull, sql } from "drizzle-orm";
import { answer, type Result, refuse } from "@/lib/result";
import { accounts } from "../schema/accounts";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { writeEntry } from "./ledger-entries";
import { isPassword } from "./passwords";

export type Account = typeof accounts.$inferSelect;

export type NewAccount = {
  readonly id?: string;
  readonly name: string;
  readonly email: string | null;
  readonly passwordHash: string | null;
  readonly isAdministrator?: boolean;
  readonly isEngineer?: boolean;
  readonly locale?: string;
  /** closed from the start: a name in a record, not somebody who signs in */
  readonly closedAt?: string;
};

export function accountById(db: Database, id: string): Account | undefined {
  return db.select().from(accounts).where(eq(accounts.id, id)).get();
}

export function accountByEmail(db: Database, email: string): Account | undefined {
  return db
    .select()
    .from(accounts)
    .where(eq(accounts.email, addressOf(email)))
    .get();
}

export function accountsByName(db: Database): Account[] {
  return db.select().from(accounts).orderBy(accounts.name, accounts.id).all();
}

/** A new account; an e-mail address belongs to one account only. */
export function createAccount(db: Database, given: NewAccount, act: Act): Result<Account, { type: "EmailTaken"; email: string }> {
  return inTransaction(db, () => {
    const email = given.email === null ? null : addressOf(given.email);
    if (email !== null && accountByEmail(db, email)) return refuse({ type: "EmailTaken", email });
    const account = { ...given, id: given.id ?? randomUUID(), email, createdAt: act.at };
    const made = db.insert(accounts).values(account).returning().get();
    writeEntry(db, null, { ...act, what: "account.create", after: shown(made) });
    return answer(made);
  });
}

/** The account of this address and password; undefined for a wrong one, an unknown one and a closed one alike. */
export async function accountSigningIn(db: Database, email: string, password: string): Promise<Account | undefined> {
  const account = accountByEmail(db, email);
  const isRight = await isPassword(password, account?.passwordHash ?? null);
  return isRight && account?.closedAt === null ? account : undefined;
}

/** Sets another password and ends every session that began with the old one. */
export function changePassword(db: Database, id: string, passwordHash: string, act: Act): void {
  inTransaction(db, () => {
    db.update(accounts).set({ passwordHash }).where(eq(accounts.id, id)).run();
    endSessions(db, id);
    writeEntry(db, null, { ...act, what: "account.password", after: { account: id } });
  });
}

export type Standing = { readonly isAdministrator: boolean; readonly isEngineer: boolean; readonly isClosed: boolean };
export type StandingRefusal = { type: "AccountUnknown"; account: string } | { type: "LastAdministrator"; account: string };

/**
 * What a person may do on this server from now on; closed, they are signed out at once on every device, and what they did stays.
 *
 * Refused: to take away the last open administrator, after whom nobody could let anybody in.
 */
export function changeStanding(db: Database, id: string, to: Standing, act: Act): Result<Account, StandingRefusal> {
  return inTransaction(db, () => {
    const before = accountById(db, id);
    if (!before) return refuse({ type: "AccountUnknown", account: id });
    const stays = to.isAdministrator && !to.isClosed;
    if (!stays && isLastAdministrator(db, before)) return refuse({ type: "LastAdministrator", account: id });
    const { isAdministrator, isEngineer, isClosed } = to;
    const closedAt = isClosed ? (before.closedAt ?? act.at) : null;
    if (isClosed && before.closedAt === null) endSessions(db, id);
    const after = db.update(accounts).set({ isAdministrator, isEngineer, closedAt }).where(eq(accounts.id, id)).returning().get();
    writeEntry(db, null, { ...act, what: "account.standing", before: standing(before), after: standing(after) });
    return answer(after);
  });
}

function isLastAdministrator(db: Database, account: Account): boolean {
  const open = db
    .select()
    .from(accounts)
    .where(and(eq(accounts.isAdministrator, true), isNull(accounts.closedAt)))
    .all();
  return open.length === 1 && open[0]?.id === account.id;
}

function standing({ id, isAdministrator, isEngineer, closedAt }: Account) {
  return { account: id, isAdministrator, isEngineer, isClosed: closedAt !== null };
}

function endSessions(db: Database, id: string): void {
  db.update(accounts)
    .set({ sessionVersion: sql`${accounts.sessionVersion} + 1` })
    .where(eq(accounts.id, id))
    .run();
}

function addressOf(email: string): string {
  return email.trim().toLowerCase();
}

function shown({ id, name, email, isAdministrator, isEngineer }: Account) {
  return { account: id, name, email, isAdministrator, isEngineer };
}
