import { z } from "zod";
import { signInText } from "@/lib/sync/key-sign-in";
import { type Account, accountById, accountSigningIn } from "./accounts";
import { isSignatureGood } from "./admission-facts";
import { Attempts } from "./attempts";
import type { Database } from "./connection";
import { deviceById, newDeviceSchema } from "./devices";
import { type EnrolmentRefusal, enrol } from "./enrolments";
import type { Seal } from "./sessions";

const hour = 3_600_000;
/** A password lasts a working day aboard and the night after it; an enrolled phone a whole voyage. */
const passwordHours = 24;
const phoneHours = 30 * 24;

export type SignedIn = { readonly id: string; readonly name: string; readonly seal: Omit<Seal, "sub"> };

const enrolmentSentences: Record<EnrolmentRefusal["type"], string> = {
  CodeUnknown: "The server does not know this code. Look at each letter again, or ask the lead for a new one.",
  CodeExpired: "This code is too old. Ask the lead for a new one.",
  CodeUsed: "This code has let a phone in before, and each does so once. Ask the lead for a new one.",
  CodeRevoked: "This code was taken back. Ask the lead for a new one.",
  AccountClosed: "The account this code is for is closed. Ask the lead.",
  DeviceRevoked: "This phone was taken out of the test. Ask the lead; another phone can be let in.",
  DeviceHasAnotherKey: "This phone has lost its key since it was let in. Clear this page's storage, then enrol it anew.",
};

const passwordSchema = z.object({ email: z.string().max(320), password: z.string().min(1).max(1000) });
const enrolmentSchema = z.object({ code: z.string().max(40), device: z.string(), deviceName: z.string(), publicKey: z.string().max(2000) });

const passwordAttempts = new Attempts(10);
const codeAttempts = new Attempts(30);

/** The session library carries a thrown message to the page: a sentence for the person. */
export const tooManyAttempts = "Too many attempts. Wait a minute and try again.";

/** A session for e-mail and password; null where they don't belong together; throws a sentence where somebody guesses. */
export async function sessionOfAccount(db: Database, given: unknown, at: string): Promise<SignedIn | null> {
  const read = passwordSchema.safeParse(given);
  if (!read.success) return null;
  const key = read.data.email.trim().toLowerCase();
  if (passwordAttempts.isTooMany(key, at)) throw new Error(tooManyAttempts);
  const account = await accountSigningIn(db, read.data.email, read.data.password);
  if (!account) passwordAttempts.failed(key, at);
  return account ? signedIn(account, null, passwordHours, at) : null;
}

/** A session for a phone and its code; throws the sentence that says why not. */
export function sessionOfEnrolment(db: Database, given: unknown, at: string): SignedIn {
  if (codeAttempts.isTooMany("code", at)) throw new Error(tooManyAttempts);
  const read = enrolmentSchema.safeParse(given);
  const device = newDeviceSchema.safeParse(read.success ? deviceOf(read.data) : null);
  if (!read.success || !device.success) throw new Error("This phone did not say who it is. Load the page again.");
  const enrolled = enrol(db, read.data.code, device.data, at);
  if (enrolled.ok) return signedIn(enrolled.value.account, device.data.device, phoneHours, at);
  codeAttempts.failed("code", at);
  throw new Error(enrolmentSentences[enrolled.refusal.type]);
}

const deviceSchema = z.object({ device: z.uuid(), csrfToken: z.string().max(200), signature: z.string().max(200) });

/** A session for a phone that signs the server's own token with its key; null where it is unknown, revoked, or can't. */
export function sessionOfDevice(db: Database, given: unknown, at: string): SignedIn | null {
  const read = deviceSchema.safeParse(given);
  if (!read.success) return null;
  const { device: id, csrfToken, signature } = read.data;
  const device = deviceById(db, id);
  if (!device || device.revokedAt !== null) return null;
  if (!isSignatureGood(device, { body: signInText(id, csrfToken), signature })) return null;
  const account = accountById(db, device.account);
  return account && account.closedAt === null ? signedIn(account, id, phoneHours, at) : null;
}

function deviceOf({ device, deviceName, publicKey }: z.infer<typeof enrolmentSchema>): unknown {
  return { device, name: deviceName, publicKey: publicKey === "" ? null : parsed(publicKey) };
}

// neither a key nor empty: the schema refuses it
function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

function signedIn(account: Account, device: string | null, hours: number, at: string): SignedIn {
  const endsAt = new Date(Date.parse(at) + hours * hour).toISOString();
  return { id: account.id, name: account.name, seal: { version: account.sessionVersion, device, endsAt } };
}
