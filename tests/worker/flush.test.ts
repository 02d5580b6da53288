import { beforeEach, describe, expect, test } from "vitest";
import { appendEvent } from "@/db/device/append-event";
import { deviceDatabase } from "@/db/device/device-database";
import { deviceIdentity } from "@/db/device/device-identity";
import { keepStates, lastSending } from "@/db/device/event-queue";
import { signInText } from "@/lib/sync/key-sign-in";
import { flush } from "@/worker/flush";
import { batten, freshPhone } from "../db/device/phone";
import { simulatedServer } from "./simulated-server";

const now = Date.parse("2026-05-04T10:00:00Z");
const around = (fetch: typeof globalThis.fetch, at = now) => ({ fetch, now: () => at, chance: () => 0.5 });
const answering = (response: () => Response) => async () => response();

beforeEach(freshPhone);

const states = async () => (await deviceDatabase().events.orderBy("[device+seq]").toArray()).map(({ state }) => state);

describe("the flush", () => {
  test("sends everything in order, at most fifty at a time, and keeps each receipt", async () => {
    for (let value = 0; value < 120; value++) await appendEvent(batten(value));
    const server = simulatedServer();
    expect(await flush({ urgent: true }, around(server.fetch))).toBe("reached");
    expect(server.batches.map((seqs) => seqs.length)).toEqual([50, 50, 20]);
    expect(server.batches.flat()).toEqual(Array.from({ length: 120 }, (_, i) => i + 1));
    expect(new Set(await states())).toEqual(new Set(["on-server"]));
  });

  test("sends exactly the bytes that were signed", async () => {
    const { envelope } = await appendEvent(batten(101.5));
    const server = simulatedServer();
    await flush({ urgent: true }, around(server.fetch));
    expect(server.envelopes).toEqual([envelope]);
  });

  test("takes a crash while sending for saved, and sends again", async () => {
    const { id } = await appendEvent(batten(101.5));
    await keepStates([{ id, state: "sending", receipt: null }]);
    const server = simulatedServer();
    await flush({ urgent: true }, around(server.fetch));
    expect(server.batches).toEqual([[1]]);
    expect(await states()).toEqual(["on-server"]);
  });

  test("sends once more what was stored while its answer was lost, and takes the duplicate for received", async () => {
    await appendEvent(batten(101.5));
    const server = simulatedServer();
    const losing: typeof fetch = async (...request) => {
      await server.fetch(...request);
      throw new TypeError("the connection was cut");
    };
    expect(await flush({ urgent: true }, around(losing))).toBe("no-answer");
    expect(await states()).toEqual(["saved"]);
    expect(await flush({ urgent: true }, around(server.fetch))).toBe("reached");
    expect((await deviceDatabase().events.toArray()).map(({ receipt }) => receipt?.outcome)).toEqual(["duplicate"]);
  });

  test("is done by one alone, however many ask", async () => {
    await appendEvent(batten(101.5));
    const server = simulatedServer();
    const reached = await Promise.all([1, 2, 3].map(() => flush({ urgent: true }, around(server.fetch))));
    expect(reached.filter((each) => each !== null)).toEqual(["reached"]);
    expect(server.batches).toEqual([[1]]);
  });

  test("sends again what a server restored from an older backup no longer has", async () => {
    for (const value of [1, 2, 3]) await appendEvent(batten(value));
    const server = simulatedServer();
    await flush({ urgent: true }, around(server.fetch));
    server.restore([1]);
    await flush({ urgent: true }, around(server.fetch));
    expect(server.held()).toEqual([1, 2, 3]);
    expect(await states()).toEqual(["on-server", "on-server", "on-server"]);
  });

  test("takes what is in a backup for confirmed, and sends it again where the server has lost it all the same", async () => {
    for (const value of [1, 2]) await appendEvent(batten(value));
    const server = simulatedServer();
    await flush({ urgent: true }, around(server.fetch));
    server.backUp();
    await appendEvent(batten(3));
    await flush({ urgent: true }, around(server.fetch));
    expect(await states()).toEqual(["confirmed", "confirmed", "on-server"]);
    server.restore([1]);
    await flush({ urgent: true }, around(server.fetch));
    expect(server.held()).toEqual([1, 2, 3]);
  });

  test("lets one event set aside by the server not block the others, and does not send it for ever", async () => {
    for (const value of [1, 2, 3]) await appendEvent(batten(value));
    const server = simulatedServer({ quarantines: [2] });
    await flush({ urgent: true }, around(server.fetch));
    expect(await states()).toEqual(["on-server", "quarantined", "on-server"]);
    expect(server.batches).toHaveLength(1);
  });

  test("halves a batch that is too large for something on the way", async () => {
    for (let value = 0; value < 10; value++) await appendEvent(batten(value));
    const server = simulatedServer({ mostEvents: 3 });
    expect(await flush({ urgent: true }, around(server.fetch))).toBe("reached");
    expect(server.held()).toHaveLength(10);
  });

  test("measures the phone's clock against the server's", async () => {
    const server = simulatedServer();
    await flush({ urgent: true }, around(server.fetch, Date.parse(server.time) - 3 * 3_600_000));
    expect((await deviceIdentity())?.clockOffsetMs).toBe(3 * 3_600_000);
  });
});

describe("what is no answer", () => {
  test.each([
    ["a page of HTML", () => new Response("<h1>Welcome to the harbour</h1>", { headers: { "content-type": "text/html" } })],
    ["a page of HTML that says 403", () => new Response("<h1>Pay</h1>", { status: 403, headers: { "content-type": "text/html" } })],
    ["a redirect", () => Response.redirect("http://portal.example/", 302)],
    ["an error of the server", () => Response.json({ error: "broken" }, { status: 500 })],
    ["a full disk", () => Response.json({ error: "full" }, { status: 507 })],
    ["JSON of something else", () => Response.json({ ok: true })],
    ["half an answer", () => new Response('{"server":', { headers: { "content-type": "application/json" } })],
  ])("%s leaves every event saved here, and is tried again later", async (_, response) => {
    await appendEvent(batten(101.5));
    expect(await flush({ urgent: true }, around(answering(response)))).toBe("no-answer");
    expect(await states()).toEqual(["saved"]);
    // the first wait lies between nothing and a second, here drawn at its middle
    expect(await lastSending()).toMatchObject({ reach: "no-answer", failures: 1, notBefore: now + 500 });
  });

  test("waits twice as long after each failure, unless a person asks", async () => {
    await appendEvent(batten(101.5));
    let asked = 0;
    const broken = answering(() => {
      asked += 1;
      return Response.json({}, { status: 500 });
    });
    await flush({ urgent: true }, around(broken));
    await flush({ urgent: false }, around(broken, now + 499));
    expect(asked).toBe(1);
    await flush({ urgent: false }, around(broken, now + 501));
    expect(await lastSending()).toMatchObject({ failures: 2, notBefore: now + 501 + 1000 });
    await flush({ urgent: true }, around(broken, now + 502));
    expect(asked).toBe(3);
  });

  test("waits as long as the server asked for", async () => {
    await appendEvent(batten(101.5));
    const busy = answering(() => Response.json({}, { status: 429, headers: { "retry-after": "120" } }));
    await flush({ urgent: true }, around(busy));
    expect((await lastSending()).notBefore).toBe(now + 120_000);
  });

  test("another server under the same name gets nothing taken for received", async () => {
    await appendEvent(batten(1));
    await flush({ urgent: true }, around(simulatedServer().fetch));
    await appendEvent(batten(2));
    const stranger = simulatedServer({ id: "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c99" });
    expect(await flush({ urgent: true }, around(stranger.fetch))).toBe("no-answer");
    expect(await states()).toEqual(["on-server", "saved"]);
    expect((await lastSending()).isStranger).toBe(true);
  });
});

describe("a server that wants to know who is sending", () => {
  test("is answered by the phone's own key, and then takes everything", async () => {
    await appendEvent(batten(101.5));
    const server = simulatedServer();
    const forms: URLSearchParams[] = [];
    const asking: typeof fetch = async (input, init) => {
      if (String(input) === "/api/auth/csrf") return Response.json({ csrfToken: "token" });
      if (String(input) === "/api/v1/sync") return forms.length > 0 ? server.fetch(input, init) : Response.json({}, { status: 401 });
      forms.push(init?.body as URLSearchParams);
      return Response.json({ url: "http://localhost/readings" });
    };
    expect(await flush({ urgent: true }, around(asking))).toBe("reached");
    expect(await states()).toEqual(["on-server"]);
    const identity = await deviceIdentity();
    const [form] = forms;
    expect(form?.get("device")).toBe(identity?.device);
    const text = new TextEncoder().encode(signInText(identity?.device ?? "", "token"));
    const signature = Buffer.from(form?.get("signature") ?? "", "base64url");
    const key = identity?.keys?.publicKey as CryptoKey;
    expect(await crypto.subtle.verify({ name: "ECDSA", hash: "SHA-256" }, key, signature, text)).toBe(true);
  });

  test.each([401, 403])("pauses the sending by %s, and keeps the queue until somebody has signed in", async (status) => {
    await appendEvent(batten(101.5));
    const server = simulatedServer();
    const refusing = answering(() => Response.json({ error: "sign in" }, { status }));
    expect(await flush({ urgent: true }, around(refusing))).toBe("sign-in-needed");
    await flush({ urgent: false }, around(server.fetch));
    expect(server.batches).toEqual([]);
    expect(await states()).toEqual(["saved"]);
    expect(await flush({ urgent: true }, around(server.fetch))).toBe("reached");
    expect(await states()).toEqual(["on-server"]);
  });
});
