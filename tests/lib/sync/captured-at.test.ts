import { describe, expect, it } from "vitest";
import { capturedAt } from "@/lib/sync/captured-at";

const noon = "2026-05-04T12:00:00.000Z";

describe("the moment of an act", () => {
  it("is the phone's time plus what its clock was last found to be off", () => {
    expect(capturedAt({ capturedAt: noon, clockOffsetMs: 250 })).toBe(Date.UTC(2026, 4, 4, 12, 0, 0, 250));
    expect(capturedAt({ capturedAt: noon, clockOffsetMs: -3 * 3_600_000 })).toBe(Date.UTC(2026, 4, 4, 9));
  });

  it("is the phone's time where it was never compared", () => {
    expect(capturedAt({ capturedAt: noon, clockOffsetMs: null })).toBe(Date.UTC(2026, 4, 4, 12));
  });
});
