import { administratorOrRefusal, refused } from "@/app/access";
import { site } from "@/app/site";
import { accountById } from "@/db/server/accounts";
import { database } from "@/db/server/connection";
import { inviteAgain } from "@/db/server/invitations";

type Context = { params: Promise<{ person: string }> };

/** Sends a person a new link to set a password; the one before ends, the old password stays until the link is used. */
export async function POST(request: Request, { params }: Context): Promise<Response> {
  const administrator = await administratorOrRefusal(request);
  if (administrator instanceof Response) return administrator;
  const account = accountById(database(), (await params).person);
  if (!account) return refused(404, "There is no such account here.");
  if (account.email === null || account.closedAt !== null)
    return refused(409, "Only an open account with an e-mail address has a password.");
  const invited = await inviteAgain(database(), account, site(request), { by: administrator.id, at: new Date().toISOString() });
  return Response.json(invited, { status: 201, headers: { "cache-control": "no-store" } });
}
