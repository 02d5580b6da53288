import { accessOrRefusal } from "@/app/access";
import { database } from "@/db/server/connection";
import { revokeEnrolment } from "@/db/server/enrolments";

type Context = { params: Promise<{ id: string; enrolment: string }> };

/** Makes a code worthless before it is used. */
export async function DELETE(request: Request, { params }: Context): Promise<Response> {
  const { id, enrolment } = await params;
  const access = await accessOrRefusal(request, id, ["lead", "engineer", "administrator"]);
  if (access instanceof Response) return access;
  revokeEnrolment(database(), id, enrolment, { by: access.person.id, at: new Date().toISOString() });
  return new Response(null, { status: 204 });
}
