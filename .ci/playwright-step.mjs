import { mkdtemp, readFile, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import path from "node:path";
import { runNode } from "./child.mjs";
import { chromium } from "./chromium.mjs";
import { failedStep } from "./tally.mjs";

/** A step that runs every journey in a real browser; without browser or build each journey has failed, with the reason. */
export function playwrightStep(name, { isBuilt }) {
  return async () => {
    const reason = isBuilt() ? await browserProblem() : "The production build failed, so no journey could run.";
    if (reason !== null) return failedStep(name, reason, await journeyCount());
    const { report, output } = await playwrightReport([]);
    return report === null ? failedStep(name, output, await journeyCount()) : stepOfReport(name, report, output);
  };
}

function browserProblem() {
  return chromium().then(
    () => null,
    (error) => error.message,
  );
}

async function journeyCount() {
  const { report } = await playwrightReport(["--list"]);
  return report === null ? 1 : testsOf(report.suites).length;
}

async function playwrightReport(options) {
  const folder = await mkdtemp(path.join(tmpdir(), "battenbook-journeys-"));
  const file = path.join(folder, "report.json");
  const args = ["test", "--config", "tests/playwright.config.ts", "--reporter=json", ...options];
  const { output } = await runNode("node_modules/@playwright/test/cli.js", args, {
    quiet: true,
    env: { PLAYWRIGHT_JSON_OUTPUT_NAME: file },
  });
  const report = await readFile(file, "utf8").then(JSON.parse, () => null);
  await rm(folder, { recursive: true, force: true });
  return { report, output };
}

/** The sums of one report: what did not pass at once has failed, whether it ran or not. */
export function stepOfReport(name, report, output) {
  const tests = testsOf(report.suites);
  const failures = [...report.errors.map((error) => error.message ?? output), ...tests.filter((test) => !test.ok).map(testFailure)];
  if (tests.length === 0 && failures.length === 0) failures.push("No journey was found.");
  return { name, passed: tests.filter((test) => test.ok).length, failed: failures.length, failures };
}

function testsOf(suites, file = "", titles = []) {
  return suites.flatMap((suite) => {
    const path = suite.title === suite.file ? titles : [...titles, suite.title];
    const own = suite.specs.flatMap((spec) => spec.tests.map((test) => testOf(suite.file ?? file, [...path, spec.title], test)));
    return [...own, ...testsOf(suite.suites ?? [], suite.file ?? file, path)];
  });
}

// "expected" is the one status that ran and passed at once: skipped and flaky are not
function testOf(file, titles, test) {
  const errors = test.results.flatMap((result) => result.errors.map((error) => error.message ?? ""));
  return { name: `${file} > ${titles.join(" > ")}`, ok: test.status === "expected", status: test.status, errors };
}

function testFailure(test) {
  return `${test.name}\n${test.errors.join("\n") || `did not pass (${test.status})`}`;
}
