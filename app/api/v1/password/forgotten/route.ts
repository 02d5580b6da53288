import { z } from "zod";
import { refused } from "@/app/access";
import { site } from "@/app/site";
import { Attempts } from "@/db/server/attempts";
import { database } from "@/db/server/connection";
import { mailForgottenPassword } from "@/db/server/invitations";
import { tooManyAttempts } from "@/db/server/sign-in";

const givenSchema = z.strictObject({ email: z.email().max(320) });
// each asking counts, whether there is such an account or not
const perAddress = new Attempts(2);
const inAll = new Attempts(30);

/** Mails a link to whoever has this address; the answer is the same where nobody has. */
export async function POST(request: Request): Promise<Response> {
  const at = new Date().toISOString();
  const given = givenSchema.safeParse(await request.json().catch(() => null));
  if (!given.success) return refused(422, "Write the whole address, as name@yard.example.");
  const address = given.data.email.trim().toLowerCase();
  if (perAddress.isTooMany(address, at) || inAll.isTooMany("all", at)) return refused(429, tooManyAttempts);
  perAddress.failed(address, at);
  inAll.failed("all", at);
  // not waited for: the time of the answer would tell whether there is an account
  void mailForgottenPassword(database(), address, site(request), at).catch((error: unknown) => console.error(String(error)));
  return new Response(null, { status: 202 });
}
