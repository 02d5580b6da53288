import { createHash } from "node:crypto";
import Dexie from "dexie";
import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { appendEvent } from "@/db/device/append-event";
import { DeviceDatabase, deviceDatabase, freshConnection } from "@/db/device/device-database";
import { keepStates } from "@/db/device/event-queue";
import { exportFile } from "@/db/device/export-file";
import {
  announcedPhotograph,
  notePhotographSent,
  oweAllPhotographs,
  photographsToLetGo,
  photographsToSend,
} from "@/db/device/photograph-sending";
import { dropPhotograph, keepPhotograph, photographsBeside, photographsOwed } from "@/db/device/photographs";
import { unfinishedKey } from "@/db/device/unfinished-entries";
import { eventBodySchema } from "@/lib/sync/event";
import { phoneFileSchema } from "@/lib/sync/phone-file";
import { slotKey } from "@/lib/sync/slot-key";
import { atMove1, batten, freshPhone, test1 } from "./phone";

const entry = unfinishedKey(test1, slotKey(atMove1));
const refused = () => {
  throw new Error("the disk is full");
};

beforeEach(freshPhone);
afterEach(() => deviceDatabase().events.hook("creating").unsubscribe(refused));

/** Some bytes under their name, as the page hands them over. */
function taken(shade: number, size = 100_000) {
  const bytes = new Uint8Array(size).fill(shade);
  return { bytes, type: "image/jpeg", sha256: createHash("sha256").update(bytes).digest("hex") };
}

const read = (...photographs: string[]) => appendEvent({ ...batten(101.5), photographs } as ReturnType<typeof batten>);
const states = async () => (await deviceDatabase().photographs.toArray()).map(({ state }) => state);

describe("a photograph", () => {
  test("stands beside its unfinished entry, byte for byte, and is owed once its reading is saved", async () => {
    const mark = taken(1);
    expect(await keepPhotograph(mark, entry)).toBe(true);
    expect((await photographsBeside(entry)).map(({ bytes }) => bytes)).toEqual([mark.bytes]);
    expect(await photographsOwed()).toBe(0);
    const { envelope, id } = await read(mark.sha256);
    expect(eventBodySchema.parse(JSON.parse(envelope.body))).toMatchObject({ id, photographs: [mark.sha256] });
    expect([await photographsBeside(entry), await photographsOwed()]).toEqual([[], 1]);
  });

  test("waits for the disk, as its event does", async () => {
    const asked = vi.spyOn(IDBDatabase.prototype, "transaction");
    await freshConnection();
    const mark = taken(1);
    await keepPhotograph(mark, entry);
    await read(mark.sha256);
    const writing = asked.mock.calls.filter(([, mode]) => mode === "readwrite");
    asked.mockRestore();
    expect(writing.map(([stores]) => [...stores].includes("photographs"))).toEqual([true, true]);
    expect(writing.map(([, , options]) => options)).toEqual(writing.map(() => ({ durability: "strict" })));
  });

  test("is owed only if its event is saved: both are in one transaction", async () => {
    const mark = taken(1);
    await keepPhotograph(mark, entry);
    deviceDatabase().events.hook("creating", refused);
    await expect(read(mark.sha256)).rejects.toThrow();
    expect(await states()).toEqual(["unfinished"]);
  });

  test("that was lost does not hold its reading up", async () => {
    expect((await read(taken(1).sha256)).seq).toBe(1);
  });

  test("can be taken off before its reading is saved, and not after", async () => {
    const [off, stays] = [taken(1), taken(2)];
    await keepPhotograph(off, entry);
    await keepPhotograph(stays, entry);
    await read(stays.sha256);
    for (const { sha256 } of [off, stays]) await dropPhotograph(sha256);
    expect(await states()).toEqual(["saved"]);
    expect(await keepPhotograph(stays, entry)).toBe(false);
  });

  test("is sent after the server has answered for its event, and again to a server that was restored", async () => {
    const mark = taken(1);
    await keepPhotograph(mark, entry);
    const { id } = await read(mark.sha256);
    expect([await photographsToSend(), await announcedPhotograph(mark.sha256)]).toEqual([[mark.sha256], null]);
    await keepStates([{ id, state: "on-server", receipt: null }]);
    expect(await announcedPhotograph(mark.sha256)).toMatchObject({ sha256: mark.sha256, events: [id] });
    await notePhotographSent(mark.sha256, 0);
    expect(await photographsToSend()).toEqual([]);
    await oweAllPhotographs();
    expect(await photographsToSend()).toEqual([mark.sha256]);
  });

  test("is let go of thirty days after it was sent, and only when a backup is younger than it", async () => {
    const mark = taken(1);
    const month = 30 * 24 * 3_600_000;
    await keepPhotograph(mark, entry);
    const { id } = await read(mark.sha256);
    await notePhotographSent(mark.sha256, 0);
    await keepStates([{ id, state: "confirmed", receipt: null }]);
    expect(await photographsToLetGo(month)).toEqual([]);
    const later = await appendEvent(batten(102));
    await keepStates([{ id: later.id, state: "confirmed", receipt: null }]);
    expect([await photographsToLetGo(month - 1), await photographsToLetGo(month)]).toEqual([[], [mark.sha256]]);
  });
});

describe("the export file", () => {
  test("carries what no server has, and says how many had no room", async () => {
    const marks = [1, 2].map((shade) => taken(shade, 17 * 1024 * 1024));
    for (const mark of marks) await keepPhotograph(mark, entry);
    await read(...marks.map(({ sha256 }) => sha256));
    const file = phoneFileSchema.parse(JSON.parse(await (await exportFile()).text()));
    expect(file.photographsLeft).toBe(1);
    expect(file.photographs?.map(({ sha256 }) => marks.some((mark) => mark.sha256 === sha256))).toEqual([true]);
    const [first] = file.photographs ?? [];
    const hash = createHash("sha256").update(Buffer.from(first?.base64 ?? "", "base64"));
    expect(hash.digest("hex")).toBe(first?.sha256);
  });

  test("of a phone of before there were photographs is read as it was", () => {
    const file = { format: "battenbook-phone", version: 1, device: test1, deviceName: null, events: [], unsaved: null };
    expect(phoneFileSchema.parse(file)).toEqual(file);
  });
});

test("a phone's store of before there were photographs is opened with everything in it", async () => {
  const before = new Dexie("before");
  before.version(1).stores({ events: "id, &[device+seq], state, test, [test+slotKey]", counters: "device", notes: "key" });
  await before.table("counters").put({ device: test1, last: 41 });
  before.close();
  const now = new DeviceDatabase("before");
  expect(await now.counters.get(test1)).toEqual({ device: test1, last: 41 });
  expect(await now.photographs.count()).toBe(0);
  await now.delete();
});
