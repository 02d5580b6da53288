import { personOrRefusal, refused } from "@/app/access";
import { database } from "@/db/server/connection";
import { takeEvents } from "@/db/server/take-events";
import { BATCH_BYTES, BATCH_EVENTS } from "@/lib/sync/batch-limits";
import { syncRequestSchema } from "@/lib/sync/protocol";

/** Around the events: escapes in their text, and the request's own words. */
const largest = 2 * BATCH_BYTES;

/**
 * Takes in what a phone holds. Whatever is wrong with one event is answered for that event; a refusal of the whole means
 * that nothing was stored and the phone keeps everything.
 */
export async function POST(request: Request): Promise<Response> {
  const person = await personOrRefusal(request);
  if (person instanceof Response) return person;
  const text = await request.text();
  if (text.length > largest) return refused(413, `At most ${BATCH_EVENTS} events or ${BATCH_BYTES} bytes at a time.`);
  const given = syncRequestSchema.safeParse(parsedJson(text));
  if (!given.success) return refused(400, "This is no request of the sync protocol.", { at: given.error.issues[0]?.path.join(".") });
  try {
    const answer = takeEvents(database(), given.data, { account: person.id, at: new Date().toISOString() });
    return Response.json(answer, { headers: { "cache-control": "no-store" } });
  } catch (error) {
    return notStored(error);
  }
}

function notStored(error: unknown): Response {
  const code = error instanceof Error && "code" in error ? String(error.code) : "";
  if (code === "SQLITE_FULL") return refused(507, "The server's disk is full: nothing was stored, the phone keeps everything.");
  if (code.startsWith("SQLITE_BUSY")) return refused(503, "The server is busy: nothing was stored, try again.");
  throw error;
}

function parsedJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
