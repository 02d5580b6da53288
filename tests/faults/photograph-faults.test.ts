import { createHash } from "node:crypto";
import { readdirSync, rmSync } from "node:fs";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { PUT } from "@/app/api/v1/photographs/[sha256]/route";
import { appendEvent } from "@/db/device/append-event";
import { deviceDatabase } from "@/db/device/device-database";
import { enrolledIdentity, publicKeyOf } from "@/db/device/device-identity";
import { keepPhotograph, photographsOwed } from "@/db/device/photographs";
import { unfinishedKey } from "@/db/device/unfinished-entries";
import { filesFolder } from "@/db/server/data-folder";
import { publicKeySchema, registerDevice } from "@/db/server/devices";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { promised } from "@/lib/result";
import { slotKey } from "@/lib/sync/slot-key";
import { flush } from "@/worker/flush";
import { flushPhotographs } from "@/worker/flush-photographs";
import { cookieOf } from "../app/visitors";
import { atMove1, batten, freshPhone } from "../db/device/phone";
import { picture } from "../db/server/pictures";
import { at, personWith, type Yard, yardIn } from "../db/server/yard";
import { FaultServer } from "./fault-server";

type Passing = (address: string, body: Uint8Array<ArrayBuffer>) => Promise<Response>;

let server: FaultServer;
let yard: Yard;
let author: string;
let cookie: string;

/** A real phone's store and sender, enrolled at a real server. */
beforeEach(async () => {
  await freshPhone();
  server = new FaultServer();
  yard = yardIn(server.db);
  const person = personWith(yard, "reader");
  author = person.id;
  cookie = await cookieOf(person);
  const identity = await enrolledIdentity("Blue phone, aft");
  const publicKey = publicKeySchema.parse(await publicKeyOf(identity));
  promised(registerDevice(server.db, { device: identity.device, name: "Blue phone, aft", publicKey }, author, { by: author, at }));
});
afterEach(() => server.remove());

const arrives: Passing = (address, body) => {
  const sha256 = address.split("/").at(-1) ?? "";
  const request = new Request(`http://localhost${address}`, { method: "PUT", body, headers: { cookie } });
  return PUT(request, { params: Promise.resolve({ sha256 }) });
};
const json = (status: number) => Response.json({ error: "not now" }, { status });

/** What can happen to a photograph on its way. */
const faults: Readonly<Record<string, (chance: ReturnType<typeof seededNoise>) => Passing>> = {
  "request lost": () => async () => Promise.reject(new TypeError("the connection was cut")),
  "cut off in the middle": (chance) => (address, body) => arrives(address, body.slice(0, Math.floor(chance.uniform() * body.length))),
  "bit flipped": (chance) => (address, body) => {
    const place = Math.floor(chance.uniform() * body.length);
    return arrives(
      address,
      body.map((byte, i) => (i === place ? byte ^ 1 : byte)),
    );
  },
  "answer lost": () => async (address, body) => {
    await arrives(address, body);
    throw new TypeError("the connection was cut");
  },
  "delivered twice at once": () => async (address, body) => (await Promise.all([arrives(address, body), arrives(address, body)]))[0],
  "captive portal": () => async () => new Response("<html>Welcome</html>", { headers: { "content-type": "text/html" } }),
  "disk full": () => async () => json(507),
  "server error": () => async () => json(500),
  "sign-in needed": () => async () => json(401),
};

function around(passing: () => Passing) {
  const fetch: typeof globalThis.fetch = async (address, init) => {
    const path = String(address);
    if (path === "/api/v1/sync") return server.receives(String(init?.body), cookie);
    if (path.startsWith("/api/auth/")) return json(401);
    return passing()(path, new Uint8Array(init?.body as Uint8Array<ArrayBuffer>));
  };
  return { fetch, now: () => Date.parse(at), chance: () => 0 };
}

async function reads(shade: number): Promise<string> {
  const bytes = new Uint8Array(picture(shade, 64).bytes);
  const sha256 = createHash("sha256").update(bytes).digest("hex");
  await keepPhotograph({ bytes, type: "image/png", sha256 }, unfinishedKey(yard.test, slotKey(atMove1)));
  const reading = batten(100 + shade / 100, atMove1, crypto.randomUUID());
  await appendEvent({ ...reading, test: yard.test, author, photographs: [sha256] } as typeof reading);
  return sha256;
}

describe("photographs on a bad line", () => {
  test.each([1, 2, 3])("all arrive whole, each once, and none is called sent before it is there (seed %i)", async (seed) => {
    const chance = seededNoise(seed);
    const names = Object.keys(faults);
    const seen = new Set<string>();
    const faulty = around(() => {
      if (chance.uniform() < 0.2) return arrives;
      const name = names[Math.floor(chance.uniform() * names.length)] ?? "";
      seen.add(name);
      return faults[name]?.(chance) ?? arrives;
    });
    const taken: string[] = [];
    for (let step = 0; step < 12; step++) {
      taken.push(await reads(step));
      await flush({ urgent: true }, faulty);
      await flushPhotographs({ urgent: true }, faulty);
      const sent = await deviceDatabase().photographs.where("state").equals("on-server").primaryKeys();
      expect(onDisk()).toEqual(expect.arrayContaining(sent));
    }
    await flushPhotographs(
      { urgent: true },
      around(() => arrives),
    );
    expect(await photographsOwed()).toBe(0);
    expect(onDisk()).toEqual(taken.sort());
    expect(seen.size).toBeGreaterThan(3);
  });

  test("a server restored from a copy without them gets them again, with the readings that name them", async () => {
    await server.backUp();
    const clear = around(() => arrives);
    const name = await reads(1);
    await flush({ urgent: true }, clear);
    await flushPhotographs({ urgent: true }, clear);
    await server.restore();
    rmSync(path.join(filesFolder(), name));
    const named = () => server.db.$client.prepare("select sha256 from event_photographs").pluck().all();
    expect([named(), onDisk()]).toEqual([[], []]);
    await flush({ urgent: true }, clear);
    await flushPhotographs({ urgent: true }, clear);
    expect([named(), onDisk(), await photographsOwed()]).toEqual([[name], [name], 0]);
  });
});

function onDisk(): string[] {
  try {
    return readdirSync(filesFolder()).sort();
  } catch {
    return [];
  }
}
