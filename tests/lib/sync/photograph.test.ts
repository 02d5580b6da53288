import { describe, expect, test } from "vitest";
import { keptSize, mayLetGo, pictureType } from "@/lib/sync/photograph";
import { photographNamesSchema } from "@/lib/sync/photograph-names";

const bytes = (...given: number[]) => new Uint8Array(given);

describe("a picture's first bytes", () => {
  test("tell JPEG, PNG and WebP apart", () => {
    expect(pictureType(bytes(0xff, 0xd8, 0xff, 0xe0))).toBe("image/jpeg");
    expect(pictureType(bytes(0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a))).toBe("image/png");
    expect(pictureType(new TextEncoder().encode("RIFF\x24\x00\x00\x00WEBPVP8 "))).toBe("image/webp");
  });

  test.each(["<svg xmlns='http://www.w3.org/2000/svg'>", "GIF89a", "RIFF\x24\x00\x00\x00WAVE", "%PDF-1.7", ""])(
    "take %j for none",
    (text) => {
      expect(pictureType(new TextEncoder().encode(text))).toBeNull();
    },
  );
});

describe("the size kept", () => {
  test("has the longer side at 1600 and the shape of the picture", () => {
    expect(keptSize({ width: 4032, height: 3024 })).toEqual({ width: 1600, height: 1200 });
    expect(keptSize({ width: 3024, height: 4032 })).toEqual({ width: 1200, height: 1600 });
  });

  test("is never larger than the picture, and never nothing", () => {
    expect(keptSize({ width: 640, height: 480 })).toEqual({ width: 640, height: 480 });
    expect(keptSize({ width: 100_000, height: 3 })).toEqual({ width: 1600, height: 1 });
  });
});

test("a reading names one to four photographs, each by its hash", () => {
  const name = "0123456789abcdef".repeat(4);
  const taken = [[], [name], Array(4).fill(name), Array(5).fill(name), [name.toUpperCase()], [name.slice(1)]];
  expect(taken.map((names) => photographNamesSchema.safeParse(names).success)).toEqual([false, true, true, false, false, false]);
});

describe("a photograph may be let go", () => {
  const day = 24 * 3_600_000;
  const settled = {
    state: "on-server",
    sentAt: 0,
    sentAtSeq: 7,
    events: [{ state: "confirmed" }, { state: "confirmed" }],
    confirmedSeq: 8,
  } as const;

  test("thirty days after it was sent, when it and its events are in a backup", () => {
    expect(mayLetGo(settled, 30 * day)).toBe(true);
    expect(mayLetGo(settled, 30 * day - 1)).toBe(false);
  });

  test.each([
    ["it is not on the server", { ...settled, state: "saved" }],
    ["one of its events is in no backup", { ...settled, events: [{ state: "confirmed" }, { state: "on-server" }] }],
    ["an event that names it was set aside", { ...settled, events: [{ state: "quarantined" }] }],
    ["no event names it", { ...settled, events: [] }],
    ["no backup is known to be younger than its arrival", { ...settled, confirmedSeq: 7 }],
  ] as const)("never while %s", (_, keeping) => {
    expect(mayLetGo(keeping, 365 * day)).toBe(false);
  });
});
