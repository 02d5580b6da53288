import { describe, expect, test } from "vitest";
import { soundingSentence, soundingValue } from "@/components/readings/sounding/sounding-entry";

describe("a sounding while it is typed", () => {
  test.each([
    ["0", 0],
    ["0,52", 0.52],
  ])("takes %s as metres on the tape", (typing, value) => {
    expect(soundingValue({ typing })).toEqual({ ok: true, value: { value } });
  });

  test.each(["52", "−0.1"])("refuses %s in a sentence", (typing) => {
    const value = soundingValue({ typing });
    expect(value.ok ? null : soundingSentence(value.refusal)).toBe(`${typing} m is no sounding in metres: the tape runs from 0 to 30 m.`);
  });

  test("says nothing before anything is typed", () => {
    const value = soundingValue({ typing: "" });
    expect(value.ok ? "saved" : soundingSentence(value.refusal)).toBeNull();
  });
});
