import { expect, test } from "vitest";
import { batchesOf, phoneFileSchema } from "@/lib/sync/phone-file";

const event = (size: number) => ({ body: "x".repeat(size), signature: null });

test("cuts a file into batches that one request may carry, in order, and loses none", () => {
  const events = Array.from({ length: 120 }, (_, i) => event(100 + i));
  const batches = batchesOf(events);
  expect(batches.map(({ length }) => length)).toEqual([50, 50, 20]);
  expect(batches.flat()).toEqual(events);
});

test("cuts by size as well, and sends a large event alone", () => {
  const events = [event(60_000), event(60_000), event(60_000), event(60_000), event(60_000)];
  expect(batchesOf(events).map(({ length }) => length)).toEqual([4, 1]);
  expect(batchesOf([])).toEqual([]);
});

test("reads what a phone exports, and nothing else", () => {
  const file = {
    format: "battenbook-phone",
    version: 1,
    exportedAt: "2026-05-04T10:00:00.000Z",
    device: "0190a5d1-5d00-4000-8000-0000000000d1",
    deviceName: "Blue phone",
    publicKey: null,
    events: [event(10)],
    unsaved: null,
  };
  expect(phoneFileSchema.safeParse(file).success).toBe(true);
  expect(phoneFileSchema.safeParse({ ...file, format: "battenbook-record" }).success).toBe(false);
  expect(phoneFileSchema.safeParse({ ...file, device: null }).success).toBe(false);
});
