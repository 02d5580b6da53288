import type { TestRecord } from "@/lib/record/test-record";

/** Where a mark stands, for a reader whose plan has no words of its own for it. */
export function markInWords({ x, y }: { x: number; y: number }, lbp: number): string {
  const along = x < lbp / 3 ? "aft" : x > (2 * lbp) / 3 ? "forward" : "midships";
  const side = y < 0 ? "port" : y > 0 ? "starboard" : "centreline";
  return `${along}, ${side}`;
}

/** Tanks whose pipe takes a certified lamp and phone: as the plan says, else everything but clean water. */
export function gasDangerousTanks(tanks: TestRecord["tanks"], told: readonly string[] | undefined): ReadonlySet<string> {
  const judged = tanks.filter(({ contents }) => !isCleanWater(contents)).map(({ id }) => id);
  return new Set(told ?? judged);
}

function isCleanWater(contents: string): boolean {
  return /water|ballast/i.test(contents) && !/oil|fuel|slop|bilge|waste|sewage|grey|gray|black|cargo/i.test(contents);
}
