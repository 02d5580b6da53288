import { accessOrRefusal, allButReaders } from "@/app/access";
import { database } from "@/db/server/connection";
import { exportedRecord } from "@/db/server/record-export";

type Context = { params: Promise<{ id: string }> };

/** The record file of a test, to be reopened by any office; that it was taken stands in the ledger. */
export async function GET(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const access = await accessOrRefusal(request, id, allButReaders);
  if (access instanceof Response) return access;
  const { person, test } = access;
  const record = exportedRecord(database(), id, { by: person.id, at: new Date().toISOString(), device: person.device });
  const name = `${test.vesselCopy.vessel.name} ${test.date}`.replace(/[^A-Za-z0-9]+/g, "-").toLowerCase();
  const headers = { "cache-control": "no-store", "content-disposition": `attachment; filename="${name}.battenbook.json"` };
  return Response.json(record, { headers });
}
