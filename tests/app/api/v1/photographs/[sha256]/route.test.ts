import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { GET, HEAD, PUT } from "@/app/api/v1/photographs/[sha256]/route";
import type { Account } from "@/db/server/accounts";
import { database } from "@/db/server/connection";
import { PHOTOGRAPH_BYTES } from "@/lib/sync/photograph";
import { Phone } from "../../../../../db/server/phone";
import { named, type Picture, picture } from "../../../../../db/server/pictures";
import { personWith, yardIn } from "../../../../../db/server/yard";
import { cookieOf } from "../../../../visitors";

const mark = picture(120);
const large = named(Buffer.concat([picture(1).bytes, Buffer.alloc(PHOTOGRAPH_BYTES)]));
let folder: string;
let cookies: Record<"reader" | "neighbour" | "lead", string>;

beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  process.env.BATTENBOOK_DATA = folder;
  const here = yardIn(database());
  const reader = personWith(here, "reader");
  const phone = new Phone(here.db, here.test, reader.id);
  const slot = { kind: "sounding", tank: "GW", round: "before" } as const;
  phone.sends([phone.reads(slot, { value: 1.2 }, { photographs: [mark.name, large.name] })]);
  const people: readonly Account[] = [reader, personWith(here, "reader"), personWith(here, "lead")];
  const [own = "", neighbour = "", lead = ""] = await Promise.all(people.map(cookieOf));
  cookies = { reader: own, neighbour, lead };
});
afterAll(() => {
  database().$client.close();
  rmSync(folder, { recursive: true });
});

const given = ({ name }: Picture, more: RequestInit) =>
  [new Request(`http://localhost/api/v1/photographs/${name}`, more), { params: Promise.resolve({ sha256: name }) }] as const;

const put = (of: Picture, body: Uint8Array<ArrayBuffer> = new Uint8Array(of.bytes), cookie = cookies.reader) =>
  PUT(...given(of, { method: "PUT", body, headers: { cookie } }));
const asked = (who: keyof typeof cookies, of = mark) => GET(...given(of, { headers: { cookie: cookies[who] } }));

test("takes a photograph in, once, and answers with its name", async () => {
  expect((await put(mark, new Uint8Array(mark.bytes.subarray(0, 60)))).status).toBe(422);
  const first = await put(mark);
  expect([first.status, await first.json()]).toEqual([201, { sha256: mark.name }]);
  expect((await put(mark)).status).toBe(200);
});

test("gives it out as a picture and nothing else, to be kept by one browser only", async () => {
  const answer = await asked("lead");
  expect(answer.status).toBe(200);
  expect(Object.fromEntries(answer.headers)).toMatchObject({
    "content-type": "image/png",
    "content-disposition": expect.stringMatching(/^inline/),
    "content-security-policy": "sandbox; default-src 'none'",
    "x-content-type-options": "nosniff",
    "cache-control": "private, max-age=31536000, immutable",
    etag: `"${mark.name}"`,
  });
  expect(Buffer.from(await answer.arrayBuffer())).toEqual(mark.bytes);
});

test("gives a reader back their own, and tells another reader not even that it is here", async () => {
  expect((await asked("reader")).status).toBe(200);
  expect((await asked("neighbour")).status).toBe(404);
  const head = await HEAD(...given(mark, { method: "HEAD", headers: { cookie: cookies.neighbour } }));
  expect([head.status, head.headers.get("etag")]).toEqual([404, null]);
});

test("says without the bytes whether it is here", async () => {
  const head = await HEAD(...given(mark, { method: "HEAD", headers: { cookie: cookies.reader } }));
  expect([head.status, head.headers.get("etag"), await head.text()]).toEqual([200, `"${mark.name}"`, ""]);
});

test("refuses what nobody has named, what is too large, and names that are none, each in a sentence", async () => {
  const answers = [
    await put(picture(3)),
    await put(large),
    await put({ ...mark, name: "../battenbook.db" }),
    await asked("lead", picture(3)),
  ];
  expect(answers.map(({ status }) => status)).toEqual([409, 413, 400, 404]);
  for (const answer of answers) expect((await answer.json()).error).toMatch(/\.$/);
});
