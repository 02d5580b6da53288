import { describe, expect, test } from "vitest";
import {
  type BattenEntry,
  battenValue,
  emptyBattenEntry,
  entryOfBatten,
  type Station,
  withKey,
  withMarkTaken,
  withoutMark,
} from "@/components/readings/batten/batten-entry";
import type { PadKey } from "@/components/readings/pad/typed-keys";

const pendulum: Station = { id: "A", instrument: "pendulum", place: null, length: 4, scale: [-300, 300], series: 1 };
const uTube: Station = { ...pendulum, id: "U", instrument: "u-tube", scale: [0, 500] };

const typing = (entry: BattenEntry, text: string) =>
  [...text].reduce((now, key) => withKey(now, (key === "-" ? "sign" : key) as PadKey), entry);
const swinging: BattenEntry = { ...emptyBattenEntry("pendulum"), mode: "turning-points" };
const swing = (...texts: string[]) => texts.reduce((entry, text) => withMarkTaken(typing(entry, text)), swinging);

describe("a batten reading while it is typed", () => {
  test("is the number that stands in the digits", () => {
    expect(battenValue(typing(emptyBattenEntry("pendulum"), "101,5"), pendulum)).toEqual({
      ok: true,
      value: { mode: "settled", valuesMm: [101.5] },
    });
  });

  test("keeps turning points in the order in which they were read", () => {
    const value = battenValue(typing(swing("112", "97"), "110"), pendulum);
    expect(value).toEqual({ ok: true, value: { mode: "turning-points", valuesMm: [112, 97, 110] } });
  });

  test("refuses two turning points, which can't tell where the bob would rest", () => {
    expect(battenValue(swing("112", "97"), pendulum)).toEqual({ ok: false, refusal: { type: "TooFewTurningPoints", got: 2, needed: 3 } });
  });

  test("refuses a number that the scale does not hold", () => {
    const refusal = { type: "OutsideScale", value: 301, scale: [-300, 300] };
    expect(battenValue(typing(emptyBattenEntry("pendulum"), "301"), pendulum)).toEqual({ ok: false, refusal });
  });

  test("refuses a U-tube with one leg read", () => {
    const refusal = { type: "NothingTyped", leg: "starboard", otherLegRead: true };
    expect(battenValue(typing(emptyBattenEntry("u-tube"), "210"), uTube)).toEqual({ ok: false, refusal });
  });

  test("holds both legs of a U-tube apart", () => {
    const both = typing({ ...typing(emptyBattenEntry("u-tube"), "210"), leg: "starboard" }, "262");
    expect(battenValue(both, uTube)).toEqual({ ok: true, value: { mode: "settled", portMm: [210], starboardMm: [262] } });
  });

  test("lets a mark be taken out again", () => {
    expect(withoutMark(swing("112", "97", "110"), 1).marks.whole).toEqual(["112", "110"]);
  });

  test.each([
    { mode: "turning-points" as const, valuesMm: [112, -97, 110.5] },
    { mode: "settled" as const, valuesMm: [-4.5] },
  ])("starts a correction from what was saved", (value) => {
    expect(battenValue(entryOfBatten(value, "pendulum"), pendulum)).toEqual({ ok: true, value });
  });
});
