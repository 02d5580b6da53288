import { z } from "zod";
import { accessOrRefusal, refused } from "@/app/access";
import { accountById } from "@/db/server/accounts";
import { database } from "@/db/server/connection";
import { endRole, grantRole } from "@/db/server/role-grants";
import { roleSchema } from "@/lib/sync/job-sheet";

type Context = { params: Promise<{ id: string }> };
const givenSchema = z.strictObject({ account: z.uuid(), role: roleSchema.exclude(["administrator"]), isHeld: z.boolean() });

/** Gives a person a role in the test from now on, or takes it away; what was done with it stays done. */
export async function PUT(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const access = await accessOrRefusal(request, id, ["engineer", "administrator"]);
  if (access instanceof Response) return access;
  const given = givenSchema.safeParse(await request.json().catch(() => null));
  if (!given.success) return refused(422, "Say whose role, which of reader, lead, engineer and witness, and whether it is held.");
  const { account, role, isHeld } = given.data;
  const known = accountById(database(), account);
  if (!known || known.closedAt !== null) return refused(404, "There is no such open account here.");
  const grant = { test: id, account, role };
  const act = { by: access.person.id, at: new Date().toISOString() };
  if (isHeld) grantRole(database(), grant, act);
  else endRole(database(), grant, act);
  return new Response(null, { status: 204 });
}
