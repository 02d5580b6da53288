import { afterAll, beforeEach, describe, expect, test } from "vitest";
import { appendEvent } from "@/db/device/append-event";
import { deviceDatabase } from "@/db/device/device-database";
import { forgetSentinel, lostFromStore } from "@/db/device/storage-sentinel";
import { batten, freshPhone } from "./phone";

const kept = new Map<string, string>();
const localStorage = {
  getItem: (key: string) => kept.get(key) ?? null,
  setItem: (key: string, value: string) => void kept.set(key, value),
  removeItem: (key: string) => void kept.delete(key),
};

beforeEach(async () => {
  kept.clear();
  Object.defineProperty(globalThis, "localStorage", { value: localStorage, configurable: true, writable: true });
  await freshPhone();
});
afterAll(() => Object.defineProperty(globalThis, "localStorage", { value: undefined, configurable: true, writable: true }));

describe("the sentinel outside the store", () => {
  test("is silent while the store holds what it held", async () => {
    await appendEvent(batten(1));
    expect(await lostFromStore(deviceDatabase())).toBeNull();
  });

  test("names the events that an emptied store has lost, until somebody has seen it", async () => {
    const { device } = await appendEvent(batten(1));
    await appendEvent(batten(2));
    await deviceDatabase().delete();
    await deviceDatabase().open();
    expect(await lostFromStore(deviceDatabase())).toEqual({ device, from: 1, to: 2 });
    forgetSentinel();
    expect(await lostFromStore(deviceDatabase())).toBeNull();
  });
});
