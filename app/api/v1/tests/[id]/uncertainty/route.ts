import { accessOrRefusal, refused } from "@/app/access";
import { database } from "@/db/server/connection";
import { saveUncertainty } from "@/db/server/test-uncertainty";
import { testRecordSchema } from "@/lib/record/test-record";

type Context = { params: Promise<{ id: string }> };

const given = testRecordSchema.shape.uncertainty.unwrap().nullable();

/** States the standard uncertainties of a test; null takes them back, and the program's assumptions hold. */
export async function PUT(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const access = await accessOrRefusal(request, id, ["engineer"]);
  if (access instanceof Response) return access;
  const stated = given.safeParse(await request.json().catch(() => undefined));
  if (!stated.success)
    return refused(400, "Each standard uncertainty is a number from 0 up.", { at: stated.error.issues[0]?.path.join(".") });
  const saved = saveUncertainty(database(), id, stated.data, { by: access.person.id, at: new Date().toISOString() });
  if (!saved.ok) return refused(409, "The plan of this test can't be changed here any more.", { type: saved.refusal.type });
  return Response.json({ test: id });
}
