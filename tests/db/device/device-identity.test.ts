import { beforeEach, describe, expect, test } from "vitest";
import { appendEvent } from "@/db/device/append-event";
import { deviceDatabase } from "@/db/device/device-database";
import { enrolledIdentity, publicKeyOf, renewedIdentity } from "@/db/device/device-identity";
import { batten, freshPhone } from "./phone";

beforeEach(freshPhone);

describe("a phone's identity", () => {
  test("keeps its number and key when the phone is enrolled again under another name", async () => {
    const first = await enrolledIdentity("Blue phone, aft");
    const again = await enrolledIdentity("Blue phone, forward");
    expect(again).toMatchObject({ device: first.device, deviceName: "Blue phone, forward" });
    expect(await publicKeyOf(again)).toEqual(await publicKeyOf(first));
  });

  test("starts a new sequence under a new number after a fork, and keeps every event already made", async () => {
    const before = await appendEvent(batten(1));
    const renewed = await renewedIdentity();
    const after = await appendEvent(batten(2));
    expect(after).toMatchObject({ device: renewed?.device, seq: 1 });
    expect(after.device).not.toBe(before.device);
    expect(await deviceDatabase().events.count()).toBe(2);
  });
});
