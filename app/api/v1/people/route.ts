import { administratorOrRefusal, refused } from "@/app/access";
import { site } from "@/app/site";
import { database } from "@/db/server/connection";
import { invite } from "@/db/server/invitations";
import { newPersonSchema } from "@/lib/people/new-person";

/** Makes an account and invites its person by mail; the answer carries the link too, for where no mail goes. */
export async function POST(request: Request): Promise<Response> {
  const person = await administratorOrRefusal(request);
  if (person instanceof Response) return person;
  const given = newPersonSchema.safeParse(await request.json().catch(() => null));
  if (!given.success) return refused(422, given.error.issues[0]?.message ?? "An account needs a name and an e-mail address.");
  const invited = await invite(database(), given.data, site(request), { by: person.id, at: new Date().toISOString() });
  if (!invited.ok) return refused(409, `${invited.refusal.email} belongs to another account already.`);
  const { account, ...rest } = invited.value;
  return Response.json({ account: account.id, ...rest }, { status: 201, headers: { "cache-control": "no-store" } });
}
