import { describe, expect, test } from "vitest";
import { codeFiles, projectPaths } from "./project";
import {
  ambiguousNames,
  badFileName,
  defaultExports,
  fileTooLong,
  functionsTooLong,
  misplacedUseClient,
  silencedChecks,
  unexpectedAtRoot,
  unmarkedDoor,
} from "./shape-rules";
import { sourceOf } from "./source";

const sources = codeFiles.map(sourceOf);
const atRoot = [
  ...["app", "components", "db", "lib", "public", "tests", "worker", "README.md", "DEVELOPERS.md"],
  ...["package.json", "package-lock.json", "biome.json", "tsconfig.json", "next.config.mjs", "tailwind.config.ts"],
  ...["instrumentation.ts", "proxy.ts"],
];

describe("the project", () => {
  const rules = { fileTooLong, functionsTooLong, defaultExports, misplacedUseClient, silencedChecks, ambiguousNames, unmarkedDoor };
  test.each(Object.entries(rules))("has nothing for %s", (_, rule) => {
    expect(sources.flatMap(rule)).toEqual([]);
  });

  test("names its files in kebab-case after what they hold", () => {
    const named = projectPaths.filter((path) => !path.startsWith("db/migrations/"));
    expect(named.flatMap((path) => badFileName({ path }))).toEqual([]);
  });

  test("shows a root that fits in one glance", () => {
    expect(unexpectedAtRoot(projectPaths, atRoot)).toEqual([]);
  });
});

describe("the rules refuse", () => {
  const invented = (text: string, path = "components/plan/plan.tsx") => sourceOf({ path, text });
  const lines = (count: number) => "\n".repeat(count);

  test("a file of 251 lines and no shorter one", () => {
    expect(fileTooLong(invented(`${lines(249)}x;`))).toEqual([]);
    expect(fileTooLong(invented(`${lines(250)}x;`))).toHaveLength(1);
  });

  test("a page of 26 lines", () => {
    expect(fileTooLong(invented(`${lines(25)}x;`, "app/tests/page.tsx"))).toHaveLength(1);
  });

  test("a function of 61 lines, but not a chapter of tests", () => {
    expect(functionsTooLong(invented(`function f() {${lines(60)}}`))).toHaveLength(1);
    expect(functionsTooLong(invented(`function f() {${lines(59)}}`))).toEqual([]);
    expect(functionsTooLong(invented(`describe("x", () => {${lines(60)}})`))).toEqual([]);
  });

  test.each(["lib/numerics/utils.ts", "components/index.ts", "lib/LinearFit.ts", "lib/linear_fit.ts"])("the name %s", (path) => {
    expect(badFileName({ path })).toHaveLength(1);
  });

  test.each(["app/tests/[id]/page.tsx", "app/(office)/[...rest]/not-found.tsx", "README.md", ".ci/run"])("not the name %s", (path) => {
    expect(badFileName({ path })).toEqual([]);
  });

  test.each(["export default 1;", "const a = 1; export { a as default };"])("a default export: %s", (text) => {
    expect(defaultExports(invented(text))).toHaveLength(1);
    expect(defaultExports(invented(text, "app/page.tsx"))).toEqual([]);
  });

  test("the client's mark in app/ or below the first line", () => {
    expect(misplacedUseClient(invented('"use client"; a();'))).toEqual([]);
    expect(misplacedUseClient(invented('a(); "use client";'))).toHaveLength(1);
    expect(misplacedUseClient(invented('"use client"; a();', "app/page.tsx"))).toHaveLength(1);
    expect(misplacedUseClient(invented('"use client"; a();', "app/error.tsx"))).toEqual([]);
  });

  test("a check that is turned off", () => {
    const silencer = ["ts", "ignore"].join("-");
    expect(silencedChecks(invented(`// @${silencer}\nlet a: any;`))).toHaveLength(2);
  });

  test("a name that is also a unit", () => {
    expect(ambiguousNames(invented("const kg = 1; const kmt = 2;"))).toHaveLength(1);
  });

  test("a door without its mark", () => {
    expect(unmarkedDoor(invented('import D from "better-sqlite3";', "db/server/connection.ts"))).toHaveLength(1);
    expect(unmarkedDoor(invented('import "client-only"; import D from "dexie";', "db/device/store.ts"))).toEqual([]);
  });

  test("a stranger at the root", () => {
    expect(unexpectedAtRoot(["app/page.tsx", "notes.txt"], atRoot)).toEqual(["notes.txt at the root is not expected"]);
  });
});
