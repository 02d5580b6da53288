import { describe, expect, test } from "vitest";
import { faultRun } from "./fault-run";
import { faults } from "./faulty-line";

/** Runs that once failed, by what they found. */
const pinned: readonly (readonly [seed: number, steps: number, found: string])[] = [
  [1002, 160, "a correction in one batch with a broken copy of its base"],
  [1009, 160, "a broken copy in the backup from which the server was restored"],
  [5045, 300, "a broken copy of a correction, placed beside the real one"],
];

describe("a day of readings under faults", () => {
  test.each([...[1, 2, 3].map((seed) => [seed, 160, "any day"] as const), ...pinned])(
    "loses, doubles and forgets nothing (seed %i, %i steps: %s)",
    async (seed, steps) => {
      const count = await faultRun(seed, steps);
      expect(count).toMatchObject({ lost: 0, falselyConfirmed: 0, doubled: 0, stuck: 0, setAside: 0, unverified: 0, projectionOff: 0 });
      expect(count.events).toBe(steps);
      expect(Object.values(count.faults).reduce((sum, times) => sum + times, 0)).toBeGreaterThan(20);
    },
    120_000,
  );

  test("has every fault in it, sooner or later", async () => {
    const seen = new Set<string>();
    for (const seed of [11, 12, 13]) for (const fault of Object.keys((await faultRun(seed, 200)).faults)) seen.add(fault);
    expect(Object.keys(faults).filter((fault) => !seen.has(fault))).toEqual([]);
  }, 240_000);
});
