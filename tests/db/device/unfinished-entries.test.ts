import { beforeEach, describe, expect, test } from "vitest";
import { DeviceDatabase, deviceDatabase } from "@/db/device/device-database";
import { keepUnfinishedEntry, unfinishedCount, unfinishedEntry } from "@/db/device/unfinished-entries";
import { freshPhone, test1 } from "./phone";

beforeEach(freshPhone);

describe("an unfinished entry", () => {
  test("is there again after the page was closed in the middle of a number", async () => {
    await keepUnfinishedEntry(test1, "batten/1/1/A/1", { typing: "10" });
    await keepUnfinishedEntry(test1, "batten/1/1/A/1", { typing: "101," });
    deviceDatabase().close();
    const reopened = new DeviceDatabase();
    expect((await reopened.unfinished.toArray()).map(({ entry }) => entry)).toEqual([{ typing: "101," }]);
    reopened.close();
    await deviceDatabase().open();
  });

  test("belongs to its slot and its test alone", async () => {
    await keepUnfinishedEntry(test1, "batten/1/1/A/1", { typing: "1" });
    expect(await unfinishedEntry(test1, "batten/1/1/B/1")).toBeNull();
    expect(await unfinishedEntry("another test", "batten/1/1/A/1")).toBeNull();
    expect(await unfinishedCount()).toBe(1);
  });
});
