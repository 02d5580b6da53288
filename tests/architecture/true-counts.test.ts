import { describe, expect, test } from "vitest";
import { stepOfReport as stepOfJourneys } from "../../.ci/playwright-step.mjs";
import { failedStep, tallyOf } from "../../.ci/tally.mjs";
import { stepOfReport as stepOfTests } from "../../.ci/vitest-step.mjs";

describe("a step of tests", () => {
  const file = (status: string, ...tests: string[]) => ({
    name: "/x.test.ts",
    status,
    message: "does not parse",
    assertionResults: tests.map((each) => ({ status: each, fullName: each, failureMessages: ["why"] })),
  });

  test("counts what passed and what failed", () => {
    const { passed, failed } = stepOfTests("unit", { testResults: [file("failed", "passed", "passed", "failed")] }, 1, "");
    expect([passed, failed]).toEqual([2, 1]);
  });

  test("takes a test that did not run for failed", () => {
    const { passed, failed } = stepOfTests("unit", { testResults: [file("passed", "passed", "pending", "todo")] }, 0, "");
    expect([passed, failed]).toEqual([1, 2]);
  });

  test("takes a file that does not load for failed", () => {
    const { failed, failures } = stepOfTests("unit", { testResults: [file("failed")] }, 1, "");
    expect(failed).toBe(1);
    expect(failures[0]).toContain("does not parse");
  });

  test("takes an error outside every test for failed", () => {
    const { passed, failed } = stepOfTests("unit", { testResults: [file("passed", "passed")] }, 1, "unhandled rejection");
    expect([passed, failed]).toEqual([1, 1]);
  });

  test("takes finding no test for failed", () => {
    expect(stepOfTests("unit", { testResults: [] }, 0, "").failed).toBe(1);
  });
});

describe("a step of journeys", () => {
  const journey = (status: string) => ({ status, results: [{ errors: [{ message: "why" }] }] });
  const report = (...statuses: string[]) => ({
    errors: [],
    suites: [{ title: "a.spec.ts", file: "a.spec.ts", specs: statuses.map((title) => ({ title, tests: [journey(title)] })) }],
  });

  test("takes only what passed at once for passed", () => {
    const { passed, failed, failures } = stepOfJourneys("journeys", report("expected", "unexpected", "flaky", "skipped"), "");
    expect([passed, failed]).toEqual([1, 3]);
    expect(failures[0]).toBe("a.spec.ts > unexpected\nwhy");
  });

  test("takes an error outside every journey, and no journey at all, for failed", () => {
    expect(stepOfJourneys("journeys", { errors: [{ message: "no config" }], suites: [] }, "").failed).toBe(1);
    expect(stepOfJourneys("journeys", report(), "").failed).toBe(1);
  });
});

test("the sum is the sum of the steps", async () => {
  const passing = () => ({ name: "a", passed: 3, failed: 0, failures: [] });
  expect(await tallyOf([passing, () => failedStep("b", "why", 2), passing])).toEqual({ passed: 6, failed: 2 });
});
