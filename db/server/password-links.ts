import { createHash, randomBytes, randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { answer, type Result, refuse } from "@/lib/result";
import { passwordLinks } from "../schema/accounts";
import { type Account, accountById, changePassword } from "./accounts";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { writeEntry } from "./ledger-entries";

const hour = 3_600_000;
/** An invitation may wait over a long weekend; a link that anybody can ask for may not. */
export const hoursOpen = { invited: 96, asked: 2 } as const;

export type PasswordLinkRefusal =
  | { type: "LinkUnknown" }
  | { type: "LinkExpired"; expiresAt: string }
  | { type: "LinkUsed"; usedAt: string }
  | { type: "AccountClosed" };

export type MadeLink = { readonly token: string; readonly expiresAt: string };

/** A token with which its person sets a password, once. It is told once: the server keeps only its hash. Earlier ones end. */
export function makePasswordLink(db: Database, account: string, hours: number, act: Act): MadeLink {
  const token = randomBytes(24).toString("base64url");
  const expiresAt = new Date(Date.parse(act.at) + hours * hour).toISOString();
  inTransaction(db, () => {
    db.delete(passwordLinks).where(eq(passwordLinks.account, account)).run();
    const row = { id: randomUUID(), tokenHash: hashOf(token), account, createdAt: act.at, createdBy: act.by, expiresAt };
    db.insert(passwordLinks).values(row).run();
    writeEntry(db, null, { ...act, what: "password.link", after: { account, expiresAt } });
  });
  return { token, expiresAt };
}

/** Sets the password that a link is for, uses the link up, and ends every session that began before. */
export function setPasswordByLink(db: Database, token: string, passwordHash: string, at: string): Result<Account, PasswordLinkRefusal> {
  return inTransaction(db, () => {
    const link = db
      .select()
      .from(passwordLinks)
      .where(eq(passwordLinks.tokenHash, hashOf(token)))
      .get();
    const account = link ? accountById(db, link.account) : undefined;
    if (!link || !account) return refuse({ type: "LinkUnknown" });
    if (link.usedAt !== null) return refuse({ type: "LinkUsed", usedAt: link.usedAt });
    if (link.expiresAt <= at) return refuse({ type: "LinkExpired", expiresAt: link.expiresAt });
    if (account.closedAt !== null) return refuse({ type: "AccountClosed" });
    db.update(passwordLinks).set({ usedAt: at }).where(eq(passwordLinks.id, link.id)).run();
    changePassword(db, account.id, passwordHash, { by: account.id, at });
    return answer(account);
  });
}

function hashOf(token: string): string {
  return createHash("sha256").update(token).digest("hex");
}
