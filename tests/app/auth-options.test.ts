// Next looks for its storage of requests when it is first loaded: this must come before anything of it
import "next/dist/server/node-environment-baseline";
import { generateKeyPairSync, randomUUID, sign } from "node:crypto";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { NextRequest } from "next/server";
import { afterAll, beforeAll, expect, test } from "vitest";
import { skerryTern } from "@/db/seed/skerry-tern";
import { createAccount } from "@/db/server/accounts";
import { database } from "@/db/server/connection";
import { publicKeySchema, registerDevice, revokeDevice } from "@/db/server/devices";
import { makeEnrolment } from "@/db/server/enrolments";
import { passwordHash } from "@/db/server/passwords";
import { createTest } from "@/db/server/tests";
import { createVessel } from "@/db/server/vessels";
import { promised } from "@/lib/result";
import { signInText } from "@/lib/sync/key-sign-in";
import { inRequest } from "./request-scope";

const origin = "http://localhost:3000";
let folder: string;
let id: string;
let engineer: string;

beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  process.env.BATTENBOOK_DATA = folder;
  process.env.NEXTAUTH_URL = origin;
  const act = { by: null, at: new Date().toISOString() };
  const hash = await passwordHash("batten-and-bob");
  engineer = promised(
    createAccount(database(), { name: "Ellen Moe", email: "ellen@yard.example", passwordHash: hash, isEngineer: true }, act),
  ).id;
  const { vessel, hydrostatics, draftMarks, tanks } = skerryTern().record;
  const ship = createVessel(database(), { vessel, hydrostatics, draftMarks, tanks }, act);
  id = promised(createTest(database(), ship, { title: "Test", date: "2026-05-04", place: "Quay", timeZone: "UTC" }, act)).id;
});
afterAll(() => {
  database().$client.close();
  rmSync(folder, { recursive: true });
});

test("signs in with e-mail and password, and tells the browser no more than the name", async () => {
  const browser = new Browser();
  const answer = await browser.post("callback/credentials", { email: "ellen@yard.example", password: "batten-and-bob" });
  expect(answer.status).toBe(200);
  expect((await browser.session()).user).toEqual({ id: engineer, name: "Ellen Moe" });
  expect(await browser.jobs()).toBe(200);
});

test("refuses a wrong password with 401, and guessing with 429", async () => {
  const browser = new Browser();
  const guess = async () => (await browser.post("callback/credentials", { email: "guessed@yard.example", password: "guess" })).status;
  for (let i = 0; i < 10; i++) expect(await guess()).toBe(401);
  expect(await guess()).toBe(429);
  expect(await browser.jobs()).toBe(401);
});

test("lets a phone in by its code once, and out at once when it is revoked", async () => {
  const { code } = promised(
    makeEnrolment(database(), id, { role: "reader", personName: "Rolf" }, { by: engineer, at: new Date().toISOString() }),
  );
  const phone = new Browser();
  const device = randomUUID();
  const given = { code, device, deviceName: "Deck phone", publicKey: "null" };
  expect((await phone.post("callback/enrolment", given)).status).toBe(200);
  expect((await phone.session()).user).toMatchObject({ name: "Rolf" });
  const second = await new Browser().post("callback/enrolment", { ...given, device: randomUUID() });
  expect(second.status).toBe(401);
  expect(new URL((await second.json()).url).searchParams.get("error")).toContain("has let a phone in before");
  revokeDevice(database(), device, { by: engineer, at: new Date().toISOString() });
  expect(await phone.jobs()).toBe(401);
  expect((await phone.session()).user).toBeUndefined();
});

test("lets an enrolled phone in again by its key, with no other signature, and not once it is revoked", async () => {
  const { publicKey, privateKey } = generateKeyPairSync("ec", { namedCurve: "P-256" });
  const device = randomUUID();
  const act = { by: engineer, at: new Date().toISOString() };
  const key = publicKeySchema.parse(publicKey.export({ format: "jwk" }));
  promised(registerDevice(database(), { device, name: "Deck phone", publicKey: key }, engineer, act));
  const signed = (text: string) => sign("sha256", Buffer.from(text), { key: privateKey, dsaEncoding: "ieee-p1363" }).toString("base64url");
  const signIn = async (signature: (token: string) => string) => {
    const phone = new Browser();
    const answer = await phone.post("callback/device", (token) => ({ device, signature: signature(token) }));
    return { phone, status: answer.status };
  };
  const { phone, status } = await signIn((token) => signed(signInText(device, token)));
  expect(status).toBe(200);
  expect((await phone.session()).user).toEqual({ id: engineer, name: "Ellen Moe" });
  expect((await signIn(() => signed(signInText(device, "another token")))).status).toBe(401);
  expect((await signIn(() => "")).status).toBe(401);
  revokeDevice(database(), device, act);
  expect((await signIn((token) => signed(signInText(device, token)))).status).toBe(401);
});

test("refuses a sign-in that no page of ours has begun", async () => {
  const { POST } = await import("@/app/api/auth/[...nextauth]/route");
  const body = new URLSearchParams({ email: "ellen@yard.example", password: "batten-and-bob", csrfToken: "forged", json: "true" });
  const request = new NextRequest(`${origin}/api/auth/callback/credentials`, { method: "POST", body });
  const answer = await inRequest("", () => POST(request, { params: Promise.resolve({ nextauth: ["callback", "credentials"] }) }));
  expect(answer.headers.getSetCookie().some((cookie) => cookie.startsWith("next-auth.session-token="))).toBe(false);
});

type Fields = Record<string, string>;

/** Holds cookies as a browser does. */
class Browser {
  private readonly jar = new Map<string, string>();

  async post(action: string, given: Fields | ((token: string) => Fields)): Promise<Response> {
    const { csrfToken } = await (await this.sent("GET", "csrf")).json();
    const fields = typeof given === "function" ? given(csrfToken) : given;
    return this.sent("POST", action, new URLSearchParams({ ...fields, csrfToken, json: "true" }));
  }

  async session(): Promise<{ user?: unknown }> {
    return (await this.sent("GET", "session")).json();
  }

  async jobs(): Promise<number> {
    const { GET } = await import("@/app/api/v1/jobs/route");
    return (await GET(new Request(`${origin}/api/v1/jobs`, { headers: { cookie: this.cookie } }))).status;
  }

  private async sent(method: "GET" | "POST", action: string, body?: URLSearchParams): Promise<Response> {
    const route = await import("@/app/api/auth/[...nextauth]/route");
    const request = new NextRequest(`${origin}/api/auth/${action}`, {
      method,
      headers: { cookie: this.cookie },
      ...(body ? { body } : {}),
    });
    const answer = await inRequest(this.cookie, () => route[method](request, { params: Promise.resolve({ nextauth: action.split("/") }) }));
    for (const set of answer.headers.getSetCookie()) {
      const [, name = "", value = ""] = /^([^=]+)=([^;]*)/.exec(set) ?? [];
      this.jar.set(name, value);
    }
    return answer;
  }

  private get cookie(): string {
    return [...this.jar].map(([name, value]) => `${name}=${value}`).join("; ");
  }
}
