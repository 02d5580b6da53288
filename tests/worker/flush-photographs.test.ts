import { createHash } from "node:crypto";
import { beforeEach, describe, expect, test } from "vitest";
import { appendEvent } from "@/db/device/append-event";
import { deviceDatabase } from "@/db/device/device-database";
import { keepPhotograph, photographsOwed } from "@/db/device/photographs";
import { unfinishedKey } from "@/db/device/unfinished-entries";
import { slotKey } from "@/lib/sync/slot-key";
import { flush } from "@/worker/flush";
import { flushPhotographs } from "@/worker/flush-photographs";
import { atMove1, batten, freshPhone, test1 } from "../db/device/phone";
import { simulatedServer } from "./simulated-server";

const now = Date.parse("2026-05-04T10:00:00Z");
const around = (fetch: typeof globalThis.fetch, at = now) => ({ fetch, now: () => at, chance: () => 0.5 });
const asks = { urgent: true };

beforeEach(freshPhone);

/** A reading with a photograph, on the server already unless it is said to wait. */
async function readWithPhotograph(shade: number, isEventSent = true): Promise<string> {
  const bytes = new Uint8Array(2000).fill(shade);
  const sha256 = createHash("sha256").update(bytes).digest("hex");
  await keepPhotograph({ bytes, type: "image/jpeg", sha256 }, unfinishedKey(test1, slotKey(atMove1)));
  await appendEvent({ ...batten(shade), photographs: [sha256] } as ReturnType<typeof batten>);
  if (isEventSent) await flush(asks, around(simulatedServer().fetch));
  return sha256;
}

/** A server of photographs: what it holds, what it was sent, and the answer it gives instead when it is told to. */
function photographServer() {
  const held = new Map<string, Uint8Array>();
  const sent: string[] = [];
  const instead: (() => Response)[] = [];
  let open = 0;
  let mostAtOnce = 0;
  const fetch: typeof globalThis.fetch = async (address, init) => {
    const name = String(address).split("/").at(-1) ?? "";
    open += 1;
    mostAtOnce = Math.max(open, mostAtOnce);
    await Promise.resolve();
    open -= 1;
    if (init?.method === "HEAD") return new Response(null, held.has(name) ? { headers: { etag: `"${name}"` } } : { status: 404 });
    sent.push(name);
    const other = instead.shift();
    if (other) return other();
    const bytes = new Uint8Array(init?.body as ArrayBuffer);
    if (createHash("sha256").update(bytes).digest("hex") !== name) return Response.json({ error: "Broken." }, { status: 422 });
    held.set(name, bytes);
    return Response.json({ sha256: name }, { status: 201 });
  };
  return { fetch, held, sent, instead, mostAtOnce: () => mostAtOnce };
}

const silences: readonly (readonly [string, () => Response])[] = [
  ["a captive portal's page", () => new Response("<html>Welcome</html>", { headers: { "content-type": "text/html" } })],
  ["a portal's JSON that names nothing", () => Response.json({ ok: true })],
  ["the name of another photograph", () => Response.json({ sha256: "0".repeat(64) })],
  ["an error", () => Response.json({ error: "fault" }, { status: 500 })],
  ["a full disk", () => Response.json({ error: "full" }, { status: 507 })],
  [
    "a cut in the middle",
    () => {
      throw new TypeError("the connection was cut");
    },
  ],
];

describe("photographs", () => {
  test("are sent one at a time, each byte as it was taken, until none is owed", async () => {
    const names = [await readWithPhotograph(1), await readWithPhotograph(2), await readWithPhotograph(3)];
    const server = photographServer();
    expect(await flushPhotographs(asks, around(server.fetch))).toBe("reached");
    expect([...server.held.keys()].sort()).toEqual(names.sort());
    expect([server.mostAtOnce(), await photographsOwed()]).toEqual([1, 0]);
    await flushPhotographs(asks, around(server.fetch));
    expect(server.sent).toHaveLength(3);
  });

  test("wait while an event waits", async () => {
    await readWithPhotograph(1, false);
    const server = photographServer();
    expect(await flushPhotographs(asks, around(server.fetch))).toBe("unknown");
    expect([server.sent, await photographsOwed()]).toEqual([[], 1]);
  });

  test.each(silences)("stay on the phone after %s, wait their turn, and are sent again", async (_, answer) => {
    await readWithPhotograph(1);
    const server = photographServer();
    server.instead.push(answer);
    expect(await flushPhotographs({ urgent: false }, around(server.fetch))).toBe("no-answer");
    expect(await photographsOwed()).toBe(1);
    expect(await flushPhotographs({ urgent: false }, around(server.fetch, now + 499))).toBe("no-answer");
    expect(server.sent).toHaveLength(1);
    expect(await flushPhotographs({ urgent: false }, around(server.fetch, now + 500))).toBe("reached");
    expect([server.held.size, await photographsOwed()]).toEqual([1, 0]);
  });

  test("are held back until Retry-After is over, and not beyond when a person asks", async () => {
    await readWithPhotograph(1);
    const server = photographServer();
    server.instead.push(() => Response.json({ error: "later" }, { status: 503, headers: { "retry-after": "30" } }));
    await flushPhotographs(asks, around(server.fetch));
    expect(await flushPhotographs({ urgent: false }, around(server.fetch, now + 29_000))).toBe("no-answer");
    expect(await flushPhotographs(asks, around(server.fetch, now + 29_000))).toBe("reached");
  });

  test.each([409, 413, 415, 422])(
    "that are refused with %i stay, block no other, and are offered again when a person asks",
    async (status) => {
      await readWithPhotograph(1);
      await readWithPhotograph(2);
      const server = photographServer();
      server.instead.push(() => Response.json({ error: "Not this one." }, { status }));
      expect(await flushPhotographs({ urgent: false }, around(server.fetch))).toBe("reached");
      expect([server.held.size, await photographsOwed()]).toEqual([1, 1]);
      expect((await deviceDatabase().photographs.toArray()).map(({ refusal }) => refusal).sort()).toEqual(["Not this one.", null].sort());
      await flushPhotographs({ urgent: false }, around(server.fetch));
      expect(server.sent).toHaveLength(2);
      await flushPhotographs(asks, around(server.fetch));
      expect([server.held.size, await photographsOwed()]).toEqual([2, 0]);
    },
  );

  test("stay while the server wants to know who sends", async () => {
    await readWithPhotograph(1);
    const server = photographServer();
    server.instead.push(() => Response.json({ error: "Sign in first." }, { status: 401 }));
    expect(await flushPhotographs(asks, around(server.fetch))).toBe("sign-in-needed");
    expect(await photographsOwed()).toBe(1);
  });

  test("are offered again to a server that was restored", async () => {
    await readWithPhotograph(1);
    const server = photographServer();
    await flushPhotographs(asks, around(server.fetch));
    server.held.clear();
    const restored = simulatedServer();
    const newEpoch: typeof fetch = async (...request) => {
      const answer = await (await restored.fetch(...request)).json();
      return Response.json({ ...answer, server: { ...answer.server, epoch: "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c91" } });
    };
    await flush(asks, around(newEpoch));
    await flushPhotographs(asks, around(server.fetch));
    expect(server.held.size).toBe(1);
  });

  test("are let go of only when the server says once more that it has them", async () => {
    const name = await readWithPhotograph(1);
    const server = photographServer();
    await flushPhotographs(asks, around(server.fetch));
    await appendEvent(batten(9));
    await deviceDatabase().events.toCollection().modify({ state: "confirmed" });
    const later = around(server.fetch, now + 31 * 24 * 3_600_000);
    const bytes = server.held.get(name);
    server.held.clear();
    await flushPhotographs(asks, later);
    expect(await deviceDatabase().photographs.count()).toBe(1);
    if (bytes) server.held.set(name, bytes);
    await flushPhotographs(asks, later);
    expect(await deviceDatabase().photographs.count()).toBe(0);
  });
});
