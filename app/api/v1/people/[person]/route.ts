import { z } from "zod";
import { administratorOrRefusal, refused } from "@/app/access";
import { changeStanding } from "@/db/server/accounts";
import { database } from "@/db/server/connection";

type Context = { params: Promise<{ person: string }> };
const standingSchema = z.strictObject({ isAdministrator: z.boolean(), isEngineer: z.boolean(), isClosed: z.boolean() });

/** Changes what a person may do on this server, or closes and reopens the account. */
export async function PUT(request: Request, { params }: Context): Promise<Response> {
  const administrator = await administratorOrRefusal(request);
  if (administrator instanceof Response) return administrator;
  const given = standingSchema.safeParse(await request.json().catch(() => null));
  if (!given.success) return refused(422, "Say of the account whether it is an administrator's, an engineer's, and closed.");
  const { person } = await params;
  const changed = changeStanding(database(), person, given.data, { by: administrator.id, at: new Date().toISOString() });
  if (changed.ok) return new Response(null, { status: 204 });
  if (changed.refusal.type === "AccountUnknown") return refused(404, "There is no such account here.");
  return refused(409, "This is the last administrator: make another one first.");
}
