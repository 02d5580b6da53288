import { beforeEach, describe, expect, test } from "vitest";
import { appendEvent } from "@/db/device/append-event";
import { exportFile } from "@/db/device/export-file";
import { batten, freshPhone } from "./phone";

beforeEach(freshPhone);

describe("the export file", () => {
  test("holds every event of the phone with exactly the bytes that were signed", async () => {
    const events = [await appendEvent(batten(1)), await appendEvent(batten(2))];
    const file = JSON.parse(await (await exportFile()).text());
    expect(file).toMatchObject({ format: "battenbook-phone", version: 1, device: events[0]?.device, unsaved: null });
    expect(file.events).toEqual(events.map(({ envelope }) => envelope));
    expect(file.publicKey).toMatchObject({ kty: "EC", crv: "P-256" });
    expect(file.publicKey).not.toHaveProperty("d");
  });

  test("carries the reading that the store refused", async () => {
    const file = JSON.parse(await (await exportFile(batten(101.5))).text());
    expect(file.unsaved).toMatchObject({ type: "record", payload: { valuesMm: [101.5] } });
  });
});
