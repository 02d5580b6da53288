import { accessOrRefusal, allButReaders } from "@/app/access";
import { database } from "@/db/server/connection";
import { liveStream } from "@/db/server/live-stream";

type Context = { params: Promise<{ id: string }> };
export const dynamic = "force-dynamic";

/** The running test as server-sent events; readers are refused, and whoever loses the part is cut off. */
export async function GET(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const access = await accessOrRefusal(request, id, allButReaders);
  if (access instanceof Response) return access;
  const mayStillSee = async () => !((await accessOrRefusal(request, id, allButReaders)) instanceof Response);
  const headers = {
    "content-type": "text/event-stream; charset=utf-8",
    "cache-control": "no-store, no-transform",
    "x-accel-buffering": "no",
    // a line kept alive would be asked for the next one, and keep the server from ending
    connection: "close",
  };
  return new Response(liveStream(database(), id, mayStillSee, request.signal), { headers });
}
