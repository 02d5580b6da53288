import { personOrRefusal, refused } from "@/app/access";
import { database } from "@/db/server/connection";
import { newDeviceSchema, registerDevice } from "@/db/server/devices";

/** Makes this browser a device of the person signed in with a password, so that what is done in the wheelhouse is signed too. */
export async function POST(request: Request): Promise<Response> {
  const person = await personOrRefusal(request);
  if (person instanceof Response) return person;
  const given = newDeviceSchema.safeParse(await request.json().catch(() => null));
  if (!given.success) return refused(400, "A device needs an id, a name and its public key (or null).");
  const known = registerDevice(database(), given.data, person.id, {
    by: person.id,
    at: new Date().toISOString(),
    device: given.data.device,
  });
  if (!known.ok) return refused(409, "This device can't be registered again: begin anew with another one.", { type: known.refusal.type });
  return Response.json({ device: known.value.id, signs: known.value.publicKey !== null }, { status: 201 });
}
