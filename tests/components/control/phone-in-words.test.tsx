import { describe, expect, test } from "vitest";
import { heardInWords } from "@/components/control/phone-in-words";
import { runsInWords } from "@/components/control/runs-in-words";

describe("gaps in words", () => {
  test("join neighbours and keep the others apart", () => {
    expect(runsInWords([20, 13, 12, 14, 12])).toBe("12–14, 20");
    expect(runsInWords([7])).toBe("7");
    expect(runsInWords([])).toBe("");
  });
});

describe("when a phone was heard", () => {
  const now = Date.parse("2026-05-04T12:00:00Z");

  test("is told in minutes and hours, never in the future", () => {
    expect(heardInWords(null, now)).toBe("Not heard yet");
    expect(heardInWords("2026-05-04T11:59:30Z", now)).toBe("Heard just now");
    expect(heardInWords("2026-05-04T12:00:20Z", now)).toBe("Heard just now");
    expect(heardInWords("2026-05-04T11:42:00Z", now)).toBe("Heard 18 min ago");
    expect(heardInWords("2026-05-04T09:30:00Z", now)).toBe("Heard 2 h 30 min ago");
  });
});
