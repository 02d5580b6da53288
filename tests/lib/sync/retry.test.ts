import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { retryAfterMs, retryDelay } from "@/lib/sync/retry";

const nearlyOne = 1 - Number.EPSILON / 2;

describe("the wait before the next try", () => {
  it("lies under a second after the first failure, and under twice as long after each further one, up to a minute", () => {
    const bounds = [1, 2, 3, 4, 5, 6, 7, 8].map((failures) => retryDelay(failures, 0.5) * 2);
    expect(bounds).toEqual([1000, 2000, 4000, 8000, 16_000, 32_000, 60_000, 60_000]);
  });

  it("is drawn from nothing to the bound: many phones do not come back at once", () => {
    expect(retryDelay(3, 0)).toBe(0);
    expect(retryDelay(3, nearlyOne)).toBeCloseTo(4000, 9);
  });

  it("for any number of failures, for ever, is less than a minute and never less than nothing", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: Number.MAX_SAFE_INTEGER }),
        fc.double({ min: 0, max: nearlyOne, noNaN: true }),
        (failures, chance) => {
          expect(retryDelay(failures, chance)).toBeLessThan(60_000);
          expect(retryDelay(failures, chance)).toBeGreaterThanOrEqual(0);
        },
      ),
    );
  });
});

describe("the wait that a server asked for", () => {
  // Source: RFC 9110 §10.2.3, both of its examples
  it("is read in seconds or as a date", () => {
    expect(retryAfterMs("120", 0)).toBe(120_000);
    const now = Date.UTC(1999, 11, 31, 23, 58, 59);
    expect(retryAfterMs("Fri, 31 Dec 1999 23:59:59 GMT", now)).toBe(60_000);
  });

  it("is nothing for a date that has passed", () => {
    expect(retryAfterMs("Fri, 31 Dec 1999 23:59:59 GMT", Date.UTC(2026, 4, 4))).toBe(0);
    expect(retryAfterMs(" 0 ", 0)).toBe(0);
  });

  it.each([null, "", "soon", "in a minute", "Fri, 31 Foo 1999 23:59:59 GMT"])("is not known from %j", (header) => {
    expect(retryAfterMs(header, 0)).toBeNull();
  });
});
