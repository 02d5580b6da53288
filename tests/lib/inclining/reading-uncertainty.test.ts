import { expect, it } from "vitest";
import { assumedReadingUncertainty, readingUncertaintyOf } from "@/lib/inclining/reading-uncertainty";

it("takes what a test states, zero for a key left out, and the assumption where nothing is stated", () => {
  expect(readingUncertaintyOf({ readingMm: 1 })).toEqual({ readingMm: 1, readingDegrees: 0 });
  expect(readingUncertaintyOf({})).toEqual({ readingMm: 0, readingDegrees: 0 });
  expect(readingUncertaintyOf(undefined)).toEqual(assumedReadingUncertainty);
});
