// Next looks for its storage of requests when it is first loaded: this must come before anything of it
import "next/dist/server/node-environment-baseline";
import { randomUUID } from "node:crypto";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { NextRequest } from "next/server";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { skerryTern } from "@/db/seed/skerry-tern";
import { type Account, changeStanding } from "@/db/server/accounts";
import { database } from "@/db/server/connection";
import { createTest } from "@/db/server/tests";
import { createVessel } from "@/db/server/vessels";
import { promised } from "@/lib/result";
import { inRequest } from "./request-scope";
import { type RouteModule, routeFiles, routeModule } from "./route-files";
import { handlers, pages, type Row, signInRoute } from "./route-table";
import { cookieOf, peopleIn, type Visitor, visitors } from "./visitors";

const at = "2026-05-04T07:00:00.000Z";
const methods = ["GET", "HEAD", "POST", "PUT", "PATCH", "DELETE"];
let folder: string;
let own: string;
let other: string;
let people: Map<Visitor, Account>;

beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  process.env.BATTENBOOK_DATA = folder;
  // Next sets this when the application is built with `authInterrupts`
  process.env.__NEXT_EXPERIMENTAL_AUTH_INTERRUPTS = "true";
  const { vessel, hydrostatics, draftMarks, tanks } = skerryTern().record;
  const ship = createVessel(database(), { vessel, hydrostatics, draftMarks, tanks }, { by: null, at });
  const given = { title: "Inclining test", date: "2026-05-04", place: "Quay", timeZone: "UTC" };
  own = promised(createTest(database(), ship, given, { by: null, at })).id;
  other = promised(createTest(database(), ship, given, { by: null, at })).id;
  people = peopleIn(database(), own, at);
});
afterAll(() => {
  database().$client.close();
  rmSync(folder, { recursive: true });
});

const files = routeFiles();
const pageFiles = files.filter((file) => file.endsWith("page.tsx"));
const handlerFiles = files.filter((file) => file.endsWith("route.ts") && file !== signInRoute);
const isOfTest = (file: string) => file.includes("/tests/[id]/");

test("every page and every method of every route handler stands in the table", async () => {
  expect(pageFiles.filter((file) => !(file in pages))).toEqual([]);
  for (const file of handlerFiles) {
    const exported = Object.keys(await routeModule(file)).filter((name) => methods.includes(name));
    expect(Object.keys(handlers[file] ?? {}).sort(), file).toEqual(exported.sort());
  }
});

describe.each(visitors)("as %s", (visitor) => {
  test.each(pageFiles)("%s opens or is refused as the table says", async (file) => {
    expect(await pageOutcome(file, own, visitor)).toBe(expectedOfPage(pages[file] ?? [], visitor));
  });

  test.each(pageFiles.filter(isOfTest))("%s of another test opens only to an administrator", async (file) => {
    const allowed = (pages[file] ?? []).includes(visitor) && visitor === "administrator";
    expect(await pageOutcome(file, other, visitor)).toBe(expectedOfPage(allowed ? [visitor] : [], visitor));
  });

  test.each(handlerFiles)("%s answers or refuses as the table says", async (file) => {
    for (const [method, row] of Object.entries(handlers[file] ?? {})) {
      expect(await handlerStatus(file, method, row, own, visitor), method).toBe(expectedStatus(row, visitor));
    }
  });

  test.each(handlerFiles.filter(isOfTest))("%s of another test answers only an administrator", async (file) => {
    for (const [method, row] of Object.entries(handlers[file] ?? {})) {
      const allowed = row.allowed.includes(visitor) && visitor === "administrator";
      const expected = expectedStatus({ ...row, allowed: allowed ? [visitor] : [] }, visitor);
      expect(await handlerStatus(file, method, row, other, visitor), method).toBe(expected);
    }
  });
});

test("the job sheet of a test names the person who asks and nobody else", async () => {
  for (const [, account] of people) {
    const response = await called("app/api/v1/tests/[id]/job/route.ts", "GET", {}, own, await cookieOf(account));
    expect((await response.json()).person).toMatchObject({ id: account.id });
  }
});

test("a refusal is JSON with a sentence, also for a test that does not exist", async () => {
  const response = await called("app/api/v1/tests/[id]/job/route.ts", "GET", {}, randomUUID(), await cookieOf(people.get("lead")));
  expect(response.status).toBe(403);
  expect(await response.json()).toEqual({ error: expect.stringMatching(/\.$/) });
  const missing = await called("app/api/v1/tests/[id]/job/route.ts", "GET", {}, randomUUID(), await cookieOf(people.get("administrator")));
  expect(missing.status).toBe(404);
});

test("a forged cookie and a closed account are nobody's", async () => {
  const file = "app/api/v1/jobs/route.ts";
  expect((await called(file, "GET", {}, own, "next-auth.session-token=forged")).status).toBe(401);
  const leaver = promised({ ok: true, value: peopleIn(database(), own, at).get("lead") });
  const cookie = await cookieOf(leaver);
  expect((await called(file, "GET", {}, own, cookie)).status).toBe(200);
  changeStanding(database(), leaver?.id ?? "", { isAdministrator: false, isEngineer: false, isClosed: true }, { by: null, at });
  expect((await called(file, "GET", {}, own, cookie)).status).toBe(401);
});

test("nobody but an engineer or an administrator makes a code for an engineer", async () => {
  const file = "app/api/v1/tests/[id]/enrolments/route.ts";
  const body = () => ({ role: "engineer", personName: "Ellen" });
  const statuses = await Promise.all(
    (["lead", "engineer", "administrator"] as const).map(
      async (visitor) => (await called(file, "POST", { body }, own, await cookieOf(people.get(visitor)))).status,
    ),
  );
  expect(statuses).toEqual([403, 201, 201]);
});

test("the start page and the pages for readings are static, so that they never ask the server and never redirect", async () => {
  const shells = pageFiles.filter((file) => pages[file] === "all" && file !== "app/sign-in/page.tsx");
  for (const file of shells) expect((await routeModule(file)).dynamic, file).toBe("force-static");
});

function expectedOfPage(allowed: Row["allowed"], visitor: Visitor): string {
  if (allowed === "all" || allowed.includes(visitor)) return "opens";
  return visitor === "nobody" ? "asks to sign in" : "refused";
}

function expectedStatus({ allowed, status = 200 }: Row, visitor: Visitor): number {
  if (allowed === "all" || allowed.includes(visitor)) return status;
  return visitor === "nobody" ? 401 : 403;
}

async function pageOutcome(file: string, id: string, visitor: Visitor): Promise<string> {
  const { default: page } = (await routeModule(file)) as RouteModule & { default: (props: unknown) => unknown };
  const cookie = await cookieOf(people.get(visitor));
  try {
    await inRequest(cookie, async () =>
      page({ params: Promise.resolve({ id, person: people.get("reader")?.id }), searchParams: Promise.resolve({}) }),
    );
    return "opens";
  } catch (error) {
    return outcomeOf(error);
  }
}

/** Next carries its refusals as errors with a digest. */
function outcomeOf(error: unknown): string {
  const digest = String((error as { digest?: unknown }).digest);
  if (digest.startsWith("NEXT_REDIRECT;") && digest.includes(";/sign-in?next=")) return "asks to sign in";
  if (digest === "NEXT_HTTP_ERROR_FALLBACK;403") return "refused";
  throw error;
}

async function handlerStatus(file: string, method: string, row: Row, id: string, visitor: Visitor): Promise<number> {
  const response = await called(file, method, row, id, await cookieOf(people.get(visitor)));
  await response.body?.cancel();
  return response.status;
}

async function called(file: string, method: string, { body }: Pick<Row, "body">, id: string, cookie: string): Promise<Response> {
  const module = (await routeModule(file)) as Record<string, (request: Request, context: unknown) => Promise<Response>>;
  const url = `http://localhost:3000/${file.replace(/^app\/|\/route\.ts$/g, "")}`;
  const given = body ? { body: JSON.stringify(body()) } : {};
  const request = new NextRequest(url, { method, headers: { cookie, "content-type": "application/json" }, ...given });
  const answer = module[method]?.(request, {
    params: Promise.resolve({ id, enrolment: randomUUID(), person: randomUUID(), device: randomUUID(), sha256: "0".repeat(64) }),
  });
  return (await answer) ?? expect.fail(`${file} has no ${method}`);
}
