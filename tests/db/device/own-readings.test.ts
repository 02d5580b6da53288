import { beforeEach, describe, expect, test } from "vitest";
import { appendEvent } from "@/db/device/append-event";
import { ownReadings } from "@/db/device/own-readings";
import { batten, correction, freshPhone, takenBack, test1 } from "./phone";

const second = "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c44";

beforeEach(freshPhone);

const standing = async () => (await ownReadings(test1)).map(({ value, head, corrected }) => ({ value, head, corrected }));
const settled = (valueMm: number) => ({ mode: "settled", valuesMm: [valueMm] });

describe("the readings of this phone", () => {
  test("stand as they were last corrected", async () => {
    const { id } = await appendEvent(batten(101.5));
    const corrected = await appendEvent(correction(110.5, id));
    expect(await standing()).toEqual([{ value: settled(110.5), head: corrected.id, corrected: true }]);
  });

  test("no longer hold one that was taken back, and keep its record", async () => {
    const { id } = await appendEvent(batten(101.5));
    await appendEvent(takenBack(id));
    expect(await standing()).toEqual([]);
  });

  test("hold both where the same place was looked at twice", async () => {
    await appendEvent(batten(101.5));
    await appendEvent(batten(102, undefined, second));
    expect((await standing()).map(({ value }) => value)).toEqual([settled(101.5), settled(102)]);
  });
});
