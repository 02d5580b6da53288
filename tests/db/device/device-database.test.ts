import { beforeEach, describe, expect, test, vi } from "vitest";
import { appendEvent } from "@/db/device/append-event";
import { DeviceDatabase, deviceDatabase, freshConnection } from "@/db/device/device-database";
import { keepStates } from "@/db/device/event-queue";
import { keepUnfinishedEntry } from "@/db/device/unfinished-entries";
import { batten, freshPhone, test1 } from "./phone";

beforeEach(freshPhone);

describe("every transaction that writes on the phone", () => {
  const writes = {
    "a reading": () => appendEvent(batten(101.5)),
    "a receipt": async () => keepStates([{ id: (await appendEvent(batten(101.5))).id, state: "on-server", receipt: null }]),
    "a digit being typed": () => keepUnfinishedEntry(test1, "batten|1", { typed: "1" }),
  };

  test.each(Object.entries(writes))("asks the browser to wait for the disk: %s", async (_, write) => {
    const asked = vi.spyOn(IDBDatabase.prototype, "transaction");
    // a connection keeps the function it was opened with
    await freshConnection();
    await write();
    const writing = asked.mock.calls.filter(([, mode]) => mode === "readwrite");
    asked.mockRestore();
    expect(writing.length).toBeGreaterThan(0);
    expect(writing.map(([, , options]) => options)).toEqual(writing.map(() => ({ durability: "strict" })));
  });
});

test("one store serves page and worker, with its rows on the disk and not in a cache", () => {
  expect(deviceDatabase()).toBe(deviceDatabase());
  expect(new DeviceDatabase("other")._options).toMatchObject({ chromeTransactionDurability: "strict", cache: "disabled" });
});
