import { accessOrRefusal, refused } from "@/app/access";
import { database } from "@/db/server/connection";
import { chosenSchema, saveSettings } from "@/db/server/test-settings";

type Context = { params: Promise<{ id: string }> };

/** Chooses method, weights and limits of a test; what is left out, and null for all of it, falls back to the usual. */
export async function PUT(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const access = await accessOrRefusal(request, id, ["engineer"]);
  if (access instanceof Response) return access;
  const chosen = chosenSchema.nullable().safeParse(await request.json().catch(() => undefined));
  if (!chosen.success) return refused(400, "These settings can't be taken.", { at: chosen.error.issues[0]?.path.join(".") });
  const saved = saveSettings(database(), id, chosen.data, { by: access.person.id, at: new Date().toISOString() });
  if (!saved.ok) return refused(409, "The plan of this test can't be changed here any more.", { type: saved.refusal.type });
  return Response.json({ test: id });
}
