import { type CoverageShip, coverageTrial } from "@/db/seed/coverage";
import { skerryTern } from "@/db/seed/skerry-tern";
import { numbersWithInterval } from "@/lib/lightship/lightship-interval";
import { figure } from "@/lib/report/rounding";

/** How often the 95 % intervals hold the truth: `npm run coverage -- 2000`. Meant: 93 to 97 of a hundred. */
const trials = Number(process.argv[2] ?? 2000);
const ship: CoverageShip = skerryTern();
const held = Object.fromEntries(numbersWithInterval.map((number) => [number, { withGusts: 0, calm: 0 }]));

for (let trial = 0; trial < trials; trial++) {
  const found = coverageTrial(ship, trial, 10_000);
  for (const [number, isHeld] of Object.entries(found)) {
    const count = held[number];
    if (count && isHeld) count[trial % 2 === 0 ? "withGusts" : "calm"] += 1;
  }
  if ((trial + 1) % 100 === 0) console.error(`${trial + 1} of ${trials}`);
}

console.log(`${trials} simulated tests, every other one with gusts that move all stations together`);
for (const [number, { withGusts, calm }] of Object.entries(held)) {
  const share = (count: number, of: number) => `${figure((100 * count) / of, 1)} %`.padStart(8);
  const [gusty, still] = [Math.ceil(trials / 2), Math.floor(trials / 2)];
  console.log(
    `  ${number.padEnd(16)}${share(withGusts + calm, trials)} held; with gusts ${share(withGusts, gusty)}, calm ${share(calm, still)}`,
  );
}
