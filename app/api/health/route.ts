import { database } from "@/db/server/connection";
import { identityOf } from "@/db/server/server-identity";

export const dynamic = "force-dynamic";

/** Whether the server and its database answer; the id tells a phone that it is this server and no captive portal. */
export function GET(): Response {
  return Response.json({ server: identityOf(database()) }, { headers: { "cache-control": "no-store" } });
}
