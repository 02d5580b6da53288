import { describe, expect, test } from "vitest";
import { codeFiles, projectPaths } from "./project";
import { sourceOf } from "./source";
import { fileWithoutTests, mockedModules, repeatedTitles, testsWithoutExpectation, testsWithoutSource, unrunTests } from "./test-rules";

const sources = codeFiles.filter((file) => /\.(test|spec)\.tsx?$/.test(file.path)).map(sourceOf);

describe("the project's tests", () => {
  const rules = { unrunTests, testsWithoutExpectation, fileWithoutTests, repeatedTitles, mockedModules };
  test.each(Object.entries(rules))("have nothing for %s", (_, rule) => {
    expect(sources.flatMap(rule)).toEqual([]);
  });

  test("mirror the source path for path", () => {
    expect(testsWithoutSource(projectPaths)).toEqual([]);
  });
});

describe("the rules refuse", () => {
  const invented = (text: string) => sourceOf({ path: "tests/lib/invented.test.ts", text });
  const expecting = '("a", () => { expect(1).toBe(1); });';

  test.each(["test.skip", "it.only", "describe.skip", "test.concurrent.only", "test.skipIf(true)"])("%s", (call) => {
    expect(unrunTests(invented(`${call}${expecting}`)).length).toBeGreaterThan(0);
    expect(unrunTests(invented(`test${expecting} db.only("x");`))).toEqual([]);
  });

  test("a test without an expectation", () => {
    expect(testsWithoutExpectation(invented('test("a", () => { run(); });'))).toHaveLength(1);
    expect(testsWithoutExpectation(invented('test.each([1])("a", () => { run(); });'))).toHaveLength(1);
    expect(testsWithoutExpectation(invented(`test${expecting}`))).toEqual([]);
  });

  test("no test that expects through a function of its own file", () => {
    const text = 'test("a", () => same(1)); function same(a) { deeper(a); } const deeper = (a) => expect(a).toBe(1);';
    expect(testsWithoutExpectation(invented(text))).toEqual([]);
  });

  test("a file without a test", () => {
    expect(fileWithoutTests(invented("export const a = 1;"))).toHaveLength(1);
  });

  test("a title that stands twice in one chapter", () => {
    expect(repeatedTitles(invented(`test${expecting} test${expecting}`))).toHaveLength(1);
    expect(repeatedTitles(invented(`describe("x", () => { test${expecting} }); describe("y", () => { test${expecting} });`))).toEqual([]);
  });

  test("a test whose source is not there", () => {
    const paths = ["lib/a.ts", "tests/lib/a.test.ts", "tests/lib/a.slow.test.ts", "tests/lib/b.test.ts", "tests/published/c.test.ts"];
    expect(testsWithoutSource(paths)).toEqual(["tests/lib/b.test.ts mirrors no source lib/b"]);
  });

  test("an imitation of our own module", () => {
    expect(mockedModules(invented('vi.mock("@/lib/frame");'))).toHaveLength(1);
    expect(mockedModules(invented("vi.useFakeTimers();"))).toEqual([]);
  });
});
