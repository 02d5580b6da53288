import type { NewPerson } from "@/lib/people/new-person";
import { answer, type Result } from "@/lib/result";
import { type Account, accountByEmail, createAccount } from "./accounts";
import type { Act } from "./act";
import type { Database } from "./connection";
import { type MailSent, sendMail } from "./mail";
import { hoursOpen, makePasswordLink } from "./password-links";

/** How a link reached its person, or did not: then whoever made it hands it on. */
export type Invited = { readonly link: string; readonly expiresAt: string; readonly mail: MailSent | "refused" };

/** A new account for a person, and a link by mail with which they set their password. */
export async function invite(
  db: Database,
  given: NewPerson,
  site: string,
  act: Act,
): Promise<Result<Invited & { readonly account: Account }, { type: "EmailTaken"; email: string }>> {
  const account = createAccount(db, { ...given, passwordHash: null }, act);
  if (!account.ok) return account;
  return answer({ account: account.value, ...(await inviteAgain(db, account.value, site, act)) });
}

/** A new link for somebody who has an account; the ones before it end. */
export async function inviteAgain(db: Database, account: Account, site: string, act: Act): Promise<Invited> {
  const { token, expiresAt } = makePasswordLink(db, account.id, hoursOpen.invited, act);
  const link = linkOf(site, token);
  const mail = await mailed(account, "Your way into Battenbook", letter(account.name, link, expiresAt), act.at);
  return { link, expiresAt, mail };
}

/** Sends a link to whoever has an account with this address; nobody is told whether there is one. */
export async function mailForgottenPassword(db: Database, email: string, site: string, at: string): Promise<void> {
  const account = accountByEmail(db, email);
  if (!account || account.closedAt !== null) return;
  const { token, expiresAt } = makePasswordLink(db, account.id, hoursOpen.asked, { by: null, at });
  await mailed(account, "A new password for Battenbook", letter(account.name, linkOf(site, token), expiresAt), at);
}

async function mailed({ email }: Account, subject: string, text: string, at: string): Promise<MailSent | "refused"> {
  if (email === null) return "refused";
  const sent = await sendMail({ to: email, subject, text }, at);
  return sent.ok ? sent.value : "refused";
}

// in the fragment: it never reaches a server's log
function linkOf(site: string, token: string): string {
  return `${site}/password#token=${token}`;
}

function letter(name: string, link: string, expiresAt: string): string {
  const until = `${expiresAt.slice(0, 16).replace("T", " at ")} UTC`;
  return [
    `${name},`,
    "",
    "open this page to set your password for Battenbook. It works once, until",
    `${until}.`,
    "",
    link,
    "",
    "If you did not expect this mail, leave it: nothing changes until somebody opens the page.",
    "",
  ].join("\n");
}
