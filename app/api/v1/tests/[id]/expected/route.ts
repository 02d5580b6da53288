import { accessOrRefusal, refused } from "@/app/access";
import { database } from "@/db/server/connection";
import { saveExpected } from "@/db/server/test-settings";
import { expectedShipSchema } from "@/lib/record/settings-schema";

type Context = { params: Promise<{ id: string }> };

/** States the ship as she is expected to be, from which the plan is predicted; null: no longer. */
export async function PUT(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const access = await accessOrRefusal(request, id, ["engineer"]);
  if (access instanceof Response) return access;
  const given = expectedShipSchema.nullable().safeParse(await request.json().catch(() => undefined));
  if (!given.success) return refused(400, "The expected ship can't be taken.", { at: given.error.issues[0]?.path.join(".") });
  const saved = saveExpected(database(), id, given.data, { by: access.person.id, at: new Date().toISOString() });
  if (!saved.ok) return refused(409, "The plan of this test can't be changed here any more.", { type: saved.refusal.type });
  return Response.json({ test: id });
}
