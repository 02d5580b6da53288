import { z } from "zod";
import { accessOrRefusal, refused } from "@/app/access";
import { tellChange } from "@/db/server/changes";
import { database } from "@/db/server/connection";
import { advanceTest } from "@/db/server/test-state";
import { testStateSchema } from "@/lib/sync/job-sheet";

type Context = { params: Promise<{ id: string }> };

const wished = z.strictObject({ to: testStateSchema, reason: z.string().trim().max(2000).nullable() });

/** Takes a test one state on, or back with a reason. */
export async function POST(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const access = await accessOrRefusal(request, id, ["lead", "engineer"]);
  if (access instanceof Response) return access;
  const wish = wished.safeParse(await request.json().catch(() => null));
  if (!wish.success) return refused(400, "A state and, to go back, a reason are needed.");
  const { to, reason } = wish.data;
  if (isOfOffice(to) && !access.roles.includes("engineer"))
    return refused(403, "Only the engineer reconciles a test or issues its report.");
  const taken = advanceTest(database(), id, to, { by: access.person.id, at: new Date().toISOString(), reason });
  if (!taken.ok) return refused(409, "The test stays as it is.", { refusal: taken.refusal });
  tellChange(id);
  return Response.json({ state: taken.value });
}

function isOfOffice(state: string): boolean {
  return state === "reconciled" || state === "issued";
}
