import { z } from "zod";
import { refused } from "@/app/access";
import { Attempts } from "@/db/server/attempts";
import { database } from "@/db/server/connection";
import { type PasswordLinkRefusal, setPasswordByLink } from "@/db/server/password-links";
import { passwordHash } from "@/db/server/passwords";
import { tooManyAttempts } from "@/db/server/sign-in";
import { newPasswordSchema } from "@/lib/people/new-password";

const givenSchema = z.strictObject({ token: z.string().min(1).max(100), password: newPasswordSchema });
const attempts = new Attempts(20);

const sentences: Record<PasswordLinkRefusal["type"], string> = {
  LinkUnknown: "This link is not known here, or a newer one was sent. Ask for another.",
  LinkExpired: "This link is too old. Ask for another.",
  LinkUsed: "This link was used before. Ask for another.",
  AccountClosed: "This account is closed. Ask the administrator.",
};

/** Sets the password that a link is for. */
export async function POST(request: Request): Promise<Response> {
  const at = new Date().toISOString();
  if (attempts.isTooMany("link", at)) return refused(429, tooManyAttempts);
  const given = givenSchema.safeParse(await request.json().catch(() => null));
  if (!given.success) return refused(422, given.error.issues[0]?.message ?? "A password needs its link.");
  const set = setPasswordByLink(database(), given.data.token, await passwordHash(given.data.password), at);
  if (set.ok) return Response.json({ email: set.value.email }, { headers: { "cache-control": "no-store" } });
  attempts.failed("link", at);
  return refused(410, sentences[set.refusal.type]);
}
