import { run } from "./child.mjs";
import { failedStep } from "./tally.mjs";

/** A step that passes or fails as a whole: one of package.json's scripts. */
export function scriptStep(name, script) {
  return async () => {
    const { code, output } = await run("npm", ["run", "--silent", script], { quiet: true });
    return code === 0 ? { name, passed: 1, failed: 0, failures: [] } : failedStep(name, output);
  };
}

/** A step of our own code that passes where it does not throw. */
export function ownStep(name, work) {
  return async () => {
    try {
      await work();
      return { name, passed: 1, failed: 0, failures: [] };
    } catch (error) {
      return failedStep(name, error.message);
    }
  };
}
