import { personOrRefusal } from "@/app/access";
import { database } from "@/db/server/connection";
import { testsOf } from "@/db/server/tests";

/** The tests that a phone of this person may hold a job sheet of. */
export async function GET(request: Request): Promise<Response> {
  const person = await personOrRefusal(request);
  if (person instanceof Response) return person;
  const jobs = testsOf(database(), person.id, new Date().toISOString()).filter(
    ({ state, custody }) => state !== "issued" && custody === "here",
  );
  return Response.json(
    jobs.map(({ id, title }) => ({ id, title })),
    { headers: { "cache-control": "no-store" } },
  );
}
