import { describe, expect, test } from "vitest";
import { cyclesOf, forbiddenImports, importGraph, importsOf, partOf } from "./import-rules";
import { codeFiles } from "./project";
import { sourceOf } from "./source";

const sources = codeFiles.map(sourceOf);

describe("the project", () => {
  test("imports downhill only", () => {
    expect(sources.flatMap(forbiddenImports)).toEqual([]);
  });

  test("has no circle between its parts", () => {
    expect(cyclesOf(importGraph(sources, componentOrPart))).toEqual([]);
  });

  test("has no circle between files of lib", () => {
    expect(cyclesOf(importGraph(sources, (file) => (file.startsWith("lib/") ? file : null)))).toEqual([]);
  });
});

describe("the rule", () => {
  test("reads every way of naming a module", () => {
    const text = `import a from "./a"; export * from "./b"; export { c } from "./c"; type D = import("./d").D;
      const e = import("./e"); const f = new Worker(new URL("./f", import.meta.url)); const no = "./g";`;
    expect(importsOf(sourceOf({ path: "x.ts", text })).map((each) => each.from)).toEqual(["./a", "./b", "./c", "./d", "./e", "./f"]);
  });

  test.each([
    ["lib/numerics/sum.ts", "@/lib/hydrostatics/hull", "lib/numerics must not import lib/hydrostatics"],
    ["lib/numerics/sum.ts", "node:fs", "lib must not import the package node:fs"],
    ["lib/record/parse.ts", "react", "lib must not import the package react"],
    ["db/device/queue.ts", "../server/connection", "db/device must not import db/server"],
    ["db/server/tests.ts", "@/db/device/queue", "db/server must not import db/device"],
    ["components/plan/plan.tsx", "@/db/device/queue", "components must not import db/device"],
    ["components/plan/use-plan.ts", "@/db/server/connection", "components/use-* must not import db/server"],
    ["worker/reduce.ts", "@/db/device/queue", "worker/reduce.ts must not import db/device"],
    ["app/page.tsx", "@/db/device/queue", "app must not import db/device"],
    ["components/plan/plan.tsx", "dexie", "must not open the phone's database"],
    ["app/page.tsx", "better-sqlite3", "app must not open the server's database"],
  ])("refuses %s importing %s", (path, from, why) => {
    const findings = forbiddenImports(sourceOf({ path, text: `import { x } from "${from}";` }));
    expect(findings).toEqual([expect.stringContaining(why)]);
  });

  test.each([
    ["lib/lightship/lightship.ts", "@/lib/inclining/line"],
    ["components/readings/use-queue.ts", "@/db/device/queue"],
    ["app/tests/page.tsx", "@/db/server/tests"],
    ["app/page.tsx", "next/link"],
    ["lib/record/parse.ts", "zod"],
  ])("lets %s import %s", (path, from) => {
    expect(forbiddenImports(sourceOf({ path, text: `import { x } from "${from}";` }))).toEqual([]);
  });

  test("names a circle once, with its trail", () => {
    const files = [
      ["lib/a.ts", "./b"],
      ["lib/b.ts", "./c"],
      ["lib/c.ts", "./a"],
    ].map(([path = "", from]) => sourceOf({ path, text: `import { x } from "${from}";` }));
    expect(cyclesOf(importGraph(files, (file) => file))).toEqual(["lib/a → lib/b → lib/c → lib/a"]);
  });

  test("finds a file's part by the longest row", () => {
    expect(["lib/frame", "lib/sync/event", "db/server/commands/x.ts", "worker/reduce.ts", "tests/x.ts"].map(partOf)).toEqual([
      "lib",
      "lib/sync",
      "db/server/commands",
      "worker/reduce.ts",
      null,
    ]);
  });
});

/** Components are looked at folder by folder, everything else by the rows of the table. */
function componentOrPart(file: string): string | null {
  const component = /^components\/[^/]+/.exec(file);
  return component ? component[0] : partOf(file);
}
