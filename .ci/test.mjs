import { existsSync } from "node:fs";
import path from "node:path";
import { build } from "./build.mjs";
import { root } from "./house.mjs";
import { install } from "./install.mjs";
import { playwrightStep } from "./playwright-step.mjs";
import { ownStep, scriptStep } from "./program-step.mjs";
import { conclude, failedStep, tallyOf } from "./tally.mjs";
import { vitestStep } from "./vitest-step.mjs";

/** `npm test`: everything that can be proved. The last line of its output is the sum of all steps. */
let isBuilt = false;

const steps = [
  scriptStep("types", "types"),
  scriptStep("lint", "lint"),
  vitestStep("architecture", ["tests/architecture"]),
  vitestStep("unit", ["tests/lib", "tests/db", "tests/worker", "tests/app", "tests/components"]),
  vitestStep("published", ["tests/published"]),
  ...(existsSync(path.join(root, "tests/faults")) ? [vitestStep("faults", ["tests/faults"])] : []),
  ownStep("build", async () => {
    await build();
    isBuilt = true;
  }),
  playwrightStep("journeys", { isBuilt: () => isBuilt }),
];

try {
  await install();
  conclude(await tallyOf(steps));
} catch (error) {
  conclude(await tallyOf([() => failedStep("install", error.message)]));
}
