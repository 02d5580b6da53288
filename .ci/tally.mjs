/**
 * What a step reports: `{ name, passed, failed, failures }`, failures in words.
 * A step that could not run has failed; nothing that did not run has passed.
 */
export function failedStep(name, reason, failed = 1) {
  return { name, passed: 0, failed: Math.max(1, failed), failures: [reason] };
}

/** Runs the steps one after another, prints each as it ends, and gives the sums. */
export async function tallyOf(steps) {
  const sums = { passed: 0, failed: 0 };
  for (const step of steps) {
    const began = performance.now();
    const { name, passed, failed, failures } = await step();
    sums.passed += passed;
    sums.failed += failed;
    console.log(`${failed > 0 ? "✗" : "✓"} ${name.padEnd(14)} ${passed} passed, ${failed} failed  (${secondsSince(began)} s)`);
    for (const failure of failures) console.log(indented(failure));
  }
  return sums;
}

/** The last line of a run, and its exit code. */
export function conclude({ passed, failed }) {
  process.exitCode = failed > 0 ? 1 : 0;
  console.log(`${passed} passed, ${failed} failed`);
}

function secondsSince(began) {
  return Math.round((performance.now() - began) / 1000);
}

function indented(text) {
  return text.trim().replace(/^/gm, "    ");
}
