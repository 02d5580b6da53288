import { expect, test } from "vitest";
import { coverageTrial } from "@/db/seed/coverage";
import { skerryTern } from "@/db/seed/skerry-tern";
import { numbersWithInterval } from "@/lib/lightship/lightship-interval";

const trials = 160;

/** 0.95 ± 3 binomial deviations: √(0.95·0.05/160) = 0.017. The long run is the command `npm run coverage`. */
test("the 95 % intervals hold the truth about 95 times of a hundred, with gusts and without", () => {
  const held = Array.from({ length: trials }, (_, trial) => coverageTrial(skerryTern(), trial, 4000));
  for (const number of numbersWithInterval) {
    const share = held.filter((one) => one[number]).length / trials;
    expect(share, number).toBeGreaterThan(0.95 - 3 * 0.017);
    expect(share, number).toBeLessThanOrEqual(1);
  }
}, 900_000);
