import { mkdirSync, mkdtempSync, readdirSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { GET, POST } from "@/app/api/v1/backups/route";
import { database } from "@/db/server/connection";
import { endRole } from "@/db/server/role-grants";
import { personWith, yardIn } from "../../../../db/server/yard";
import { cookieOf } from "../../../visitors";

let base: string;
let copies: string;
let lead: ReturnType<typeof personWith>;
let ownTest: string;
let cookie: string;
beforeAll(async () => {
  base = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  copies = path.join(base, "copies");
  mkdirSync(copies);
  process.env.BATTENBOOK_DATA = path.join(base, "data");
  process.env.BATTENBOOK_BACKUP_FOLDER = copies;
  const yard = yardIn(database());
  ownTest = yard.test;
  lead = personWith(yard, "lead");
  cookie = await cookieOf(lead);
});
afterAll(() => {
  database().$client.close();
  rmSync(base, { recursive: true });
});

const asked = (handler: typeof GET) => handler(new Request("http://localhost/api/v1/backups", { headers: { cookie } }));

test("makes a backup on demand, and tells how it stands before and after", async () => {
  expect(await (await asked(GET)).json()).toMatchObject({ last: null, isDue: true, canBackUp: true });
  const made = await asked(POST);
  expect(made.status).toBe(201);
  const [file] = readdirSync(copies);
  expect(await made.json()).toMatchObject({ last: { file, bytes: expect.any(Number) }, isDue: false });
});

test("says in a sentence why there is none, and says it again to whoever asks how it stands", async () => {
  process.env.BATTENBOOK_BACKUP_FOLDER = path.join(base, "stick");
  const sentence = `There is no folder ${path.join(base, "stick")}: is its disk connected?`;
  const refused = await asked(POST);
  expect([refused.status, await refused.json()]).toEqual([503, { error: sentence }]);
  expect((await (await asked(GET)).json()).warnings).toEqual([sentence]);
});

test("is refused to a lead whose role has ended", async () => {
  endRole(database(), { test: ownTest, account: lead.id, role: "lead" }, { by: null, at: new Date(Date.now() - 1000).toISOString() });
  expect((await asked(GET)).status).toBe(403);
  expect((await asked(POST)).status).toBe(403);
});
