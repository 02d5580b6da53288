import { describe, expect, test } from "vitest";
import { type PadKey, typedAfter } from "@/components/readings/pad/typed-keys";

const typed = (...keys: PadKey[]) => keys.reduce(typedAfter, "");

describe("what the keys type", () => {
  test.each<[string, PadKey[], string]>([
    ["one decimal mark only", ["1", ",", "5", ".", "2"], "1,52"],
    ["a nought before a mark that comes first", [".", "5"], "0.5"],
    ["a nought after a sign as well", ["sign", ",", "5"], "−0,5"],
    ["no nought in front of another digit", ["0", "7"], "7"],
    ["the sign away when it is pressed twice", ["4", "sign", "sign"], "4"],
    ["no more than a batten can show", ["1", "2", "3", "4", "5", "6", "7", "8", "9", "1"], "123456789"],
  ])("is %s", (_, keys, text) => {
    expect(typed(...keys)).toBe(text);
  });
});
