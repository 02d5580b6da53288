import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { POST } from "@/app/api/v1/records/route";
import { GET } from "@/app/api/v1/tests/[id]/record/route";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { createAccount } from "@/db/server/accounts";
import { database } from "@/db/server/connection";
import { parseRecord } from "@/lib/record/parse-record";
import { promised } from "@/lib/result";
import { cookieOf } from "../../../visitors";

const record = { ...skerryTern().record, readings: skerryTernReadings(1) };
let folder: string;
let cookie: string;

beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  process.env.BATTENBOOK_DATA = folder;
  const given = { name: "Ellen Moe", email: null, passwordHash: null, isEngineer: true };
  cookie = await cookieOf(promised(createAccount(database(), given, { by: null, at: "2026-05-04T07:00:00.000Z" })));
});
afterAll(() => {
  database().$client.close();
  rmSync(folder, { recursive: true });
});

test("takes a record in, answers the same test when it comes again, and gives it out as a record", async () => {
  const first = await sent(JSON.stringify(record));
  expect([first.status, await first.json()]).toEqual([201, { test: record.test.id, isNew: true }]);
  const second = await sent(JSON.stringify(record));
  expect([second.status, await second.json()]).toEqual([200, { test: record.test.id, isNew: false }]);
  const out = await GET(new Request("http://localhost/", { headers: { cookie } }), { params: Promise.resolve({ id: record.test.id }) });
  expect(out.headers.get("content-disposition")).toBe('attachment; filename="mv-skerry-tern-2026-05-04.battenbook.json"');
  expect(parseRecord(await out.text()).ok).toBe(true);
});

test("names every fault of a file with its place, and takes nothing of it", async () => {
  const { lbp, ...vessel } = record.vessel;
  const answer = await sent(JSON.stringify({ ...record, vessel, colour: "red" }));
  expect(answer.status).toBe(422);
  const { error, faults } = await answer.json();
  expect(error).toBe("The record was not taken in.");
  expect(faults).toEqual(expect.arrayContaining([expect.stringMatching(/^vessel\.lbp: /), expect.stringMatching(/colour/)]));
  expect((await sent("{ not JSON")).status).toBe(422);
});

function sent(body: string): Promise<Response> {
  return POST(new Request("http://localhost/api/v1/records", { method: "POST", body, headers: { cookie } }));
}
