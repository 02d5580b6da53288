import { accessOrRefusal, refused } from "@/app/access";
import { database } from "@/db/server/connection";
import { stopPhoneOf } from "@/db/server/devices";

type Context = { params: Promise<{ id: string; device: string }> };

/** Stops a phone of the test at once; what it has sent stands, what it still sends is set aside and can be let in. */
export async function DELETE(request: Request, { params }: Context): Promise<Response> {
  const { id, device } = await params;
  const access = await accessOrRefusal(request, id, ["lead", "engineer", "administrator"]);
  if (access instanceof Response) return access;
  const act = { by: access.person.id, at: new Date().toISOString() };
  if (!stopPhoneOf(database(), device, id, act)) return refused(404, "There is no such phone in this test.");
  return new Response(null, { status: 204 });
}
