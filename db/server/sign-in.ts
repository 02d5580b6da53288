import { z } from "zod";
import type { Account } from "./accounts";
import { accountSigningIn } from "./accounts";
import { Attempts } from "./attempts";
import type { Database } from "./connection";
import { newDeviceSchema } from "./devices";
import { enrol } from "./enrolments";
import type { Seal } from "./sessions";

const hour = 3_600_000;
/** A password lasts a working day aboard and the night after it; an enrolled phone a whole voyage. */
const passwordHours = 24;
const phoneHours = 30 * 24;

export type SignedIn = { readonly id: string; readonly name: string; readonly seal: Omit<Seal, "sub"> };

const passwordSchema = z.object({ email: z.string().max(320), password: z.string().min(1).max(1000) });
const enrolmentSchema = z.object({ code: z.string().max(40), device: z.string(), deviceName: z.string(), publicKey: z.string().max(2000) });

const passwordAttempts = new Attempts(10);
const codeAttempts = new Attempts(30);

/** A session for e-mail and password; null where they don't belong together. Refused by throwing `TooManyAttempts`. */
export async function sessionOfAccount(db: Database, given: unknown, at: string): Promise<SignedIn | null> {
  const read = passwordSchema.safeParse(given);
  if (!read.success) return null;
  const key = read.data.email.trim().toLowerCase();
  if (passwordAttempts.isTooMany(key, at)) throw new Error("TooManyAttempts");
  const account = await accountSigningIn(db, read.data.email, read.data.password);
  if (!account) passwordAttempts.failed(key, at);
  return account ? signedIn(account, null, passwordHours, at) : null;
}

/** A session for a phone and its code. Refused by throwing the refusal's name (`CodeUsed`, `CodeExpired`, …), which the page puts into words. */
export function sessionOfEnrolment(db: Database, given: unknown, at: string): SignedIn {
  if (codeAttempts.isTooMany("code", at)) throw new Error("TooManyAttempts");
  const read = enrolmentSchema.safeParse(given);
  const device = newDeviceSchema.safeParse(read.success ? deviceOf(read.data) : null);
  if (!read.success || !device.success) throw new Error("PhoneNotDescribed");
  const enrolled = enrol(db, read.data.code, device.data, at);
  if (enrolled.ok) return signedIn(enrolled.value.account, device.data.device, phoneHours, at);
  codeAttempts.failed("code", at);
  throw new Error(enrolled.refusal.type);
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
