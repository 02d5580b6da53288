import { createHash, randomInt, randomUUID } from "node:crypto";
import { and, desc, eq } from "drizzle-orm";
import { z } from "zod";
import { answer, promised, type Result, refuse } from "@/lib/result";
import { roleSchema } from "@/lib/sync/job-sheet";
import { enrolmentCodes } from "../schema/devices";
import { type Account, accountById, createAccount } from "./accounts";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { type Device, type DeviceRefusal, deviceRefusal, type NewDevice, registerDevice } from "./devices";
import { writeEntry } from "./ledger-entries";
import { grantRole, grantsOf } from "./role-grants";

// nothing that can be taken for something else when it is read aloud or in poor light: no 0 O, 1 I L, 8 B, 5 S, 2 Z
const alphabet = "34679ACDEFGHJKMNPQRTUVWXY";
const codeLength = 8;
const hoursOpen = 24;

export const newEnrolmentSchema = z.strictObject({
  role: roleSchema.exclude(["administrator"]),
  personName: z.string().trim().min(1).max(80),
  account: z.uuid().optional(),
});
export type NewEnrolment = z.infer<typeof newEnrolmentSchema>;

type Row = typeof enrolmentCodes.$inferSelect;
export type Enrolment = Omit<Row, "codeHash">;
export type Enrolled = { readonly account: Account; readonly device: Device; readonly test: string };
export type EnrolmentRefusal =
  | { type: "CodeUnknown" }
  | { type: "CodeExpired"; expiresAt: string }
  | { type: "CodeUsed"; usedAt: string }
  | { type: "CodeRevoked"; revokedAt: string }
  | { type: "AccountClosed" }
  | DeviceRefusal;

export type MadeEnrolment = { readonly id: string; readonly code: string; readonly expiresAt: string };

/**
 * A new code for one phone, shown once (`ABCD-EFGH`): the server keeps only its hash.
 *
 * Refused: a code for an account that is neither the maker's own nor that of somebody who reads in this test and does
 * nothing else. Whoever holds a code is signed in as its person: it must not open more than its maker may give.
 */
export function makeEnrolment(
  db: Database,
  test: string,
  given: NewEnrolment,
  act: Act & { by: string },
): Result<MadeEnrolment, { type: "AccountNotYours"; account: string }> {
  const { role, personName, account = null } = given;
  if (account !== null && account !== act.by && !isOnlyReader(db, account, test)) return refuse({ type: "AccountNotYours", account });
  const code = Array.from({ length: codeLength }, () => alphabet[randomInt(alphabet.length)]).join("");
  const id = randomUUID();
  const expiresAt = new Date(Date.parse(act.at) + hoursOpen * 3_600_000).toISOString();
  inTransaction(db, () => {
    const row = { id, codeHash: hashOf(code), test, role, personName, account, createdAt: act.at, createdBy: act.by, expiresAt };
    db.insert(enrolmentCodes).values(row).run();
    writeEntry(db, test, { ...act, what: "enrolment.make", after: { enrolment: id, role, person: personName, expiresAt } });
  });
  return answer({ id, code: `${code.slice(0, 4)}-${code.slice(4)}`, expiresAt });
}

function isOnlyReader(db: Database, id: string, test: string): boolean {
  const account = accountById(db, id);
  if (!account || account.passwordHash !== null || account.isAdministrator || account.isEngineer) return false;
  return grantsOf(db, id).every((grant) => grant.test === test && grant.role === "reader");
}

export function enrolmentsOf(db: Database, test: string): Enrolment[] {
  const rows = db.select().from(enrolmentCodes).where(eq(enrolmentCodes.test, test)).orderBy(desc(enrolmentCodes.createdAt)).all();
  return rows.map(({ codeHash, ...enrolment }) => enrolment);
}

export function revokeEnrolment(db: Database, test: string, id: string, act: Act): void {
  inTransaction(db, () => {
    db.update(enrolmentCodes)
      .set({ revokedAt: act.at })
      .where(and(eq(enrolmentCodes.id, id), eq(enrolmentCodes.test, test)))
      .run();
    writeEntry(db, test, { ...act, what: "enrolment.revoke", after: { enrolment: id } });
  });
}

/** Lets a phone in by its code: device known, person and role bound, code used up, all in one transaction. */
export function enrol(db: Database, code: string, given: NewDevice, at: string): Result<Enrolled, EnrolmentRefusal> {
  return inTransaction(db, () => {
    const found = db
      .select()
      .from(enrolmentCodes)
      .where(eq(enrolmentCodes.codeHash, hashOf(code)))
      .get();
    if (!found) return refuse({ type: "CodeUnknown" });
    const refusal = codeRefusal(db, found, at) ?? deviceRefusal(db, given);
    if (refusal) return refuse(refusal);
    const account = accountFor(db, found, at);
    const act = { by: account.id, at, device: given.device };
    const device = promised(registerDevice(db, given, account.id, act));
    grantRole(db, { test: found.test, account: account.id, role: found.role }, { ...act, by: found.createdBy });
    useUp(db, found, account, act);
    return answer({ account, device, test: found.test });
  });
}

function codeRefusal(db: Database, row: Row, at: string): EnrolmentRefusal | null {
  if (row.usedAt !== null) return { type: "CodeUsed", usedAt: row.usedAt };
  if (row.revokedAt !== null) return { type: "CodeRevoked", revokedAt: row.revokedAt };
  if (row.expiresAt <= at) return { type: "CodeExpired", expiresAt: row.expiresAt };
  if (row.account !== null && accountById(db, row.account)?.closedAt !== null) return { type: "AccountClosed" };
  return null;
}

function accountFor(db: Database, row: Row, at: string): Account {
  const known = row.account === null ? undefined : accountById(db, row.account);
  return known ?? promised(createAccount(db, { name: row.personName, email: null, passwordHash: null }, { by: row.createdBy, at }));
}

function useUp(db: Database, row: Row, account: Account, act: Act & { device: string }): void {
  db.update(enrolmentCodes).set({ usedAt: act.at, usedBy: act.device, account: account.id }).where(eq(enrolmentCodes.id, row.id)).run();
  writeEntry(db, row.test, {
    ...act,
    what: "enrolment.use",
    after: { enrolment: row.id, account: account.id, device: act.device, role: row.role },
  });
}

/** Upper or lower case, with or without the hyphen: people type what they see. */
function hashOf(code: string): string {
  const letters = code.toUpperCase().replace(/[^0-9A-Z]/g, "");
  return createHash("sha256").update(letters).digest("hex");
}
