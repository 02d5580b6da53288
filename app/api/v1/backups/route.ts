import { personOrRefusal, refused } from "@/app/access";
import { backupNewsFor } from "@/app/backup-news";
import { backUpNow } from "@/db/server/backup-schedule";
import { backupFaultSentence } from "@/lib/report/backup-words";

/** How it stands with the backups of this server. */
export async function GET(request: Request): Promise<Response> {
  const person = await personOrRefusal(request);
  if (person instanceof Response) return person;
  const news = backupNewsFor(person);
  return news === null ? notTheirs() : Response.json(news, { headers: { "cache-control": "no-store" } });
}

/** Makes a backup at once; the answer comes when it is in the folder. */
export async function POST(request: Request): Promise<Response> {
  const person = await personOrRefusal(request);
  if (person instanceof Response) return person;
  if (backupNewsFor(person) === null) return notTheirs();
  const made = await backUpNow();
  if (!made.ok) return refused(503, backupFaultSentence(made.refusal));
  return Response.json(backupNewsFor(person), { status: 201, headers: { "cache-control": "no-store" } });
}

function notTheirs(): Response {
  return refused(403, "Backups are the business of the lead, an engineer or an administrator.");
}
