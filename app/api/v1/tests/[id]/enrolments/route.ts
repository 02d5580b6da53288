import { accessOrRefusal, refused } from "@/app/access";
import { database } from "@/db/server/connection";
import { enrolmentsOf, makeEnrolment, newEnrolmentSchema } from "@/db/server/enrolments";
import type { Role } from "@/lib/sync/job-sheet";

type Context = { params: Promise<{ id: string }> };
const mayEnrol: readonly Role[] = ["lead", "engineer", "administrator"];

/** The codes made for a test: for whom, whether used, never the code itself. */
export async function GET(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const access = await accessOrRefusal(request, id, mayEnrol);
  if (access instanceof Response) return access;
  return Response.json(enrolmentsOf(database(), id), { headers: { "cache-control": "no-store" } });
}

/** Makes a code for one phone; this answer is the only place where it ever stands. */
export async function POST(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const access = await accessOrRefusal(request, id, mayEnrol);
  if (access instanceof Response) return access;
  const given = newEnrolmentSchema.safeParse(await request.json().catch(() => null));
  if (!given.success) return refused(400, "A code needs the person's name and one of the roles reader, lead, engineer, witness.");
  if (!mayGive(access.roles, given.data.role)) return refused(403, "Only an engineer or an administrator lets an engineer in.");
  const made = makeEnrolment(database(), id, given.data, { by: access.person.id, at: new Date().toISOString() });
  if (!made.ok) return refused(403, "A code for another person's account is not yours to make.");
  const url = `${process.env.NEXTAUTH_URL ?? new URL(request.url).origin}/join#code=${made.value.code}`;
  return Response.json({ ...made.value, url, personName: given.data.personName, role: given.data.role }, { status: 201 });
}

// nobody gives away more than he has
function mayGive(held: readonly Role[], role: Role): boolean {
  return role !== "engineer" || held.includes("engineer") || held.includes("administrator");
}
