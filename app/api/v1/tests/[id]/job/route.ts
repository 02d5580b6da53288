import { accessOrRefusal, everybody, refused } from "@/app/access";
import { database } from "@/db/server/connection";
import { jobSheetOf } from "@/db/server/job-sheet";

type Context = { params: Promise<{ id: string }> };

/** The sender's own job sheet of a test; 304 where the phone has it already. */
export async function GET(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const access = await accessOrRefusal(request, id, everybody);
  if (access instanceof Response) return access;
  const issued = jobSheetOf(database(), id, access.person.id, new Date().toISOString());
  if (!issued) return refused(404, "There is no job sheet for this test.");
  const headers = { etag: issued.etag, "cache-control": "private, no-cache" };
  if (request.headers.get("if-none-match") === issued.etag) return new Response(null, { status: 304, headers });
  return Response.json(issued.sheet, { headers });
}
