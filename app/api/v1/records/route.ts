import { isOffice, personOrRefusal, refused } from "@/app/access";
import { database } from "@/db/server/connection";
import { importRecord } from "@/db/server/record-import";
import { faultsOf } from "@/lib/inclining/faults";
import { parseRecord } from "@/lib/record/parse-record";
import { refusalLine } from "@/lib/report/refusal-sentence";

const largest = 32 * 1024 * 1024;
const mostFaults = 50;

/** Takes a record file in as a test; the same file again changes nothing and answers the same test. */
export async function POST(request: Request): Promise<Response> {
  const person = await personOrRefusal(request);
  if (person instanceof Response) return person;
  if (!isOffice(person)) return refused(403, "Only an engineer or an administrator reads records in.");
  const text = await request.text();
  if (text.length > largest) return refusedFile(413, [`A record file may hold ${largest} characters; this one has ${text.length}.`]);
  const read = parseRecord(text);
  if (!read.ok) return refusedFile(422, faultsOf(read).map(refusalLine));
  const imported = importRecord(database(), read.value, { by: person.id, at: new Date().toISOString() });
  if (!imported.ok)
    return refusedFile(
      422,
      imported.refusal.faults.map(({ path, message }) => inWords(path, message)),
    );
  return Response.json(imported.value, { status: imported.value.isNew ? 201 : 200 });
}

function refusedFile(status: number, faults: readonly string[]): Response {
  return refused(status, "The record was not taken in.", { faults: faults.slice(0, mostFaults) });
}

function inWords(path: string, message: string): string {
  return `${path || "document"}: ${message}`;
}
