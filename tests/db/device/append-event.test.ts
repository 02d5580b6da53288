import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { appendEvent } from "@/db/device/append-event";
import { deviceDatabase, freshConnection } from "@/db/device/device-database";
import { deviceIdentity } from "@/db/device/device-identity";
import { StorageFailed } from "@/db/device/storage-failed";
import { keepUnfinishedEntry, unfinishedEntry } from "@/db/device/unfinished-entries";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import { eventBodySchema } from "@/lib/sync/event";
import { slotKey } from "@/lib/sync/slot-key";
import { atMove1, batten, freshPhone, test1 } from "./phone";
import { installBrokenLocks } from "./web-locks";

const refused = () => {
  throw new Error("the disk is full");
};

beforeEach(freshPhone);
afterEach(() => deviceDatabase().events.hook("creating").unsubscribe(refused));

describe("an event", () => {
  test("gets the next number, without gaps, however many are saved at once", async () => {
    const events = await Promise.all(Array.from({ length: 40 }, (_, value) => appendEvent(batten(value))));
    expect(events.map(({ seq }) => seq).sort((a, b) => a - b)).toEqual(Array.from({ length: 40 }, (_, i) => i + 1));
    expect(await deviceDatabase().events.count()).toBe(40);
  });

  test("keeps the numbers without gaps or doubles where the browser's locks do not hold", async () => {
    installBrokenLocks();
    const outcomes = await Promise.allSettled(Array.from({ length: 8 }, (_, value) => appendEvent(batten(value))));
    const saved = outcomes.filter((each) => each.status === "fulfilled").map(({ value }) => value.seq);
    expect(saved.length).toBeGreaterThan(0);
    expect(saved.sort((a, b) => a - b)).toEqual(saved.map((_, i) => i + 1));
    expect(await deviceDatabase().events.count()).toBe(saved.length);
  });

  test("is kept as canonical text that the server's schema takes", async () => {
    const { envelope, seq, id } = await appendEvent(batten(101.5));
    const body = eventBodySchema.parse(JSON.parse(envelope.body));
    expect(body).toMatchObject({ v: 1, id, seq, type: "record", payload: { mode: "settled", valuesMm: [101.5] } });
    expect(canonicalJson(body)).toBe(envelope.body);
  });

  test("is signed over exactly the bytes that are kept, by a key that cannot be taken out", async () => {
    const { envelope } = await appendEvent(batten(101.5));
    const keys = (await deviceIdentity())?.keys;
    expect(keys?.privateKey.extractable).toBe(false);
    const signature = Buffer.from(envelope.signature ?? "", "base64url");
    const verified = (text: string) =>
      crypto.subtle.verify({ name: "ECDSA", hash: "SHA-256" }, keys?.publicKey as CryptoKey, signature, new TextEncoder().encode(text));
    expect(await verified(envelope.body)).toBe(true);
    expect(await verified(envelope.body.replace("101.5", "101.6"))).toBe(false);
  });

  test("is saved on a fresh connection when the old one was killed", async () => {
    await appendEvent(batten(1));
    deviceDatabase().backendDB().close();
    expect((await appendEvent(batten(2))).seq).toBe(2);
  });

  test("asks the browser for strict durability", async () => {
    const asked = vi.spyOn(IDBDatabase.prototype, "transaction");
    await freshConnection();
    await appendEvent(batten(1));
    const writes = asked.mock.calls.filter(([stores, mode]) => mode === "readwrite" && [...stores].includes("events"));
    asked.mockRestore();
    expect(writes.map(([, , options]) => options)).toEqual([{ durability: "strict" }]);
  });
});

describe("a store that refuses", () => {
  test("is told as a failure after three tries, and leaves number and unfinished entry as they were", async () => {
    const key = slotKey(atMove1);
    await keepUnfinishedEntry(test1, key, { typing: "101,5" });
    let tries = 0;
    const counted = () => {
      tries += 1;
      return refused();
    };
    deviceDatabase().events.hook("creating", counted);
    await expect(appendEvent(batten(101.5))).rejects.toBeInstanceOf(StorageFailed);
    deviceDatabase().events.hook("creating").unsubscribe(counted);
    expect(tries).toBe(3);
    expect(await unfinishedEntry(test1, key)).toEqual({ typing: "101,5" });
    expect(await deviceDatabase().counters.count()).toBe(0);
    expect((await appendEvent(batten(101.5))).seq).toBe(1);
  });
});

describe("an unfinished entry", () => {
  test("goes in the same transaction that saves its reading", async () => {
    const key = slotKey(atMove1);
    await keepUnfinishedEntry(test1, key, { typing: "101,5" });
    await appendEvent(batten(101.5));
    expect(await unfinishedEntry(test1, key)).toBeNull();
  });
});
