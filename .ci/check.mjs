import { install } from "./install.mjs";
import { scriptStep } from "./program-step.mjs";
import { conclude, failedStep, tallyOf } from "./tally.mjs";
import { vitestStep } from "./vitest-step.mjs";

/** `npm run check`: what a minute can prove while working. Files named `*.slow.test.ts` wait for `npm test`. */
const steps = [
  scriptStep("types", "types"),
  scriptStep("lint", "lint"),
  vitestStep("architecture", ["tests/architecture"]),
  vitestStep("unit", ["tests/lib", "tests/db", "tests/worker", "tests/app", "tests/components"], { exclude: ["**/*.slow.test.ts"] }),
];

try {
  await install();
  conclude(await tallyOf(steps));
} catch (error) {
  conclude(await tallyOf([() => failedStep("install", error.message)]));
}
