import { expect, test } from "vitest";
import { Attempts } from "@/db/server/attempts";

const second = (n: number) => new Date(Date.UTC(2026, 4, 4, 9, 0, n)).toISOString();

test("holds up whoever failed too often within a minute, and nobody else", () => {
  const attempts = new Attempts(3);
  for (const n of [0, 1, 2]) {
    expect(attempts.isTooMany("ann", second(n))).toBe(false);
    attempts.failed("ann", second(n));
  }
  expect(attempts.isTooMany("ann", second(3))).toBe(true);
  expect(attempts.isTooMany("rolf", second(3))).toBe(false);
  expect(attempts.isTooMany("ann", second(59))).toBe(true);
  expect(attempts.isTooMany("ann", second(60))).toBe(false);
});
