import { describe, expect, test } from "vitest";
import { entryOfMark, markSecondLook, markSentence, markValue } from "@/components/readings/marks/mark-entry";

describe("a draft while it is typed", () => {
  test("is the mean of its estimates, which are kept", () => {
    const value = markValue({ estimates: ["2,25", "2.75"], typing: "" }, "draft");
    expect(value).toEqual({ ok: true, value: { value: 2.5, estimates: [2.25, 2.75] } });
  });

  test("is its only estimate where there is one", () => {
    expect(markValue({ estimates: [], typing: "2.013" }, "draft")).toEqual({ ok: true, value: { value: 2.013 } });
  });

  test("refuses centimetres in a sentence", () => {
    const value = markValue({ estimates: [], typing: "201" }, "draft");
    expect(value.ok ? null : markSentence(value.refusal)).toBe("201 m is no reading in metres: marks run from 0 to 30 m.");
  });

  test("lets a freeboard lie below the deck edge, and no draft below the keel", () => {
    expect(markValue({ estimates: [], typing: "−0.1" }, "freeboard").ok).toBe(true);
    expect(markValue({ estimates: [], typing: "−0.1" }, "draft").ok).toBe(false);
  });

  test("asks to look again where estimates lie too far apart", () => {
    expect(markSecondLook({ estimates: ["2.01"], typing: "2.12" })).toContain("more than 0.1 m apart");
    expect(markSecondLook({ estimates: ["2.01"], typing: "2.05" })).toBeNull();
  });

  test("starts a correction from what was saved", () => {
    const saved = { value: 2.5, estimates: [2.25, 2.75] };
    expect(markValue(entryOfMark(saved), "draft")).toEqual({ ok: true, value: saved });
  });
});
