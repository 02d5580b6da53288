import { existsSync } from "node:fs";
import { mkdtemp, readFile, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import path from "node:path";
import { runNode } from "./child.mjs";
import { root } from "./house.mjs";
import { failedStep } from "./tally.mjs";

/** A step that runs the vitest files under some folders; folders that are not there hold nothing to run. */
export function vitestStep(name, folders, { exclude = [] } = {}) {
  return async () => {
    const there = folders.filter((folder) => existsSync(path.join(root, folder)));
    if (there.length === 0) return failedStep(name, `None of ${folders.join(", ")} exists.`);
    const { report, code, output } = await vitestReport(there, exclude);
    return report === null ? failedStep(name, output) : stepOfReport(name, report, code, output);
  };
}

async function vitestReport(folders, exclude) {
  const folder = await mkdtemp(path.join(tmpdir(), "battenbook-vitest-"));
  const file = path.join(folder, "report.json");
  const options = ["--reporter=json", `--outputFile=${file}`, ...exclude.map((glob) => `--exclude=${glob}`)];
  const args = ["run", "--config", "tests/vitest.config.ts", ...folders, ...options];
  const { code, output } = await runNode("node_modules/vitest/vitest.mjs", args, { quiet: true });
  const report = await readFile(file, "utf8").then(JSON.parse, () => null);
  await rm(folder, { recursive: true, force: true });
  return { report, code, output };
}

/** The sums of one report: what did not pass has failed, whether it ran or not. */
export function stepOfReport(name, report, code, output) {
  const tests = report.testResults.flatMap((file) => file.assertionResults.map((test) => ({ file: file.name, ...test })));
  const failures = [
    ...report.testResults.filter(didNotLoad).map(loadFailure),
    ...tests.filter((test) => test.status !== "passed").map(testFailure),
  ];
  // an error outside every test leaves all of them green: the exit code tells it
  if (code !== 0 && failures.length === 0) failures.push(output);
  const passed = tests.filter((test) => test.status === "passed").length;
  if (passed === 0 && failures.length === 0) failures.push("No test was found.");
  return { name, passed, failed: failures.length, failures };
}

function didNotLoad(file) {
  return file.status === "failed" && file.assertionResults.every((test) => test.status !== "failed");
}

function loadFailure(file) {
  return `${relative(file.name)}: ${file.message}`;
}

function testFailure(test) {
  const why = test.status === "failed" ? test.failureMessages.map(withoutPackages).join("\n") : `did not run (${test.status})`;
  return `${relative(test.file)} > ${test.fullName}\n${why}`;
}

/** A message without the lines of its stack that are not ours. */
function withoutPackages(message) {
  return message
    .split("\n")
    .filter((line) => !/^\s+at .*(node_modules|<anonymous>|node:internal)/.test(line))
    .join("\n");
}

function relative(file) {
  return path.relative(root, file);
}
