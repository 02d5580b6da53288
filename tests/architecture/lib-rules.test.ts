import { describe, expect, test } from "vitest";
import { formulasWithoutSource, roundingElsewhere, undocumentedFunctions, worldlyNames } from "./lib-rules";
import { codeFiles } from "./project";
import { sourceOf } from "./source";

const sources = codeFiles.map(sourceOf);

describe("the method", () => {
  const rules = { worldlyNames, roundingElsewhere, undocumentedFunctions, formulasWithoutSource };
  test.each(Object.entries(rules))("has nothing for %s", (_, rule) => {
    expect(sources.flatMap(rule)).toEqual([]);
  });
});

describe("the rules refuse", () => {
  const invented = (text: string, path = "lib/numerics/invented.ts") => sourceOf({ path, text });

  test.each([
    "const now = Date.now();",
    "const now = new Date();",
    "const chance = Math.random();",
    "const wide = window.innerWidth;",
    "const made = { id: crypto.randomUUID() };",
    "const found = process.env.HOME;",
  ])("in lib: %s", (text) => {
    expect(worldlyNames(invented(text))).toHaveLength(1);
    expect(worldlyNames(invented(text, "db/server/invented.ts"))).toEqual([]);
  });

  test.each([
    "const then = new Date(0);",
    "const plan = { document: 1 }; const read = plan.document;",
    "function f(window: number) { return window + 1; }",
    "type T = { readonly location: string };",
  ])("not: %s", (text) => {
    expect(worldlyNames(invented(text))).toEqual([]);
  });

  test("digits chosen outside lib/report", () => {
    expect(roundingElsewhere(invented("const a = (1).toFixed(2);", "components/plan/plan.tsx"))).toHaveLength(1);
    expect(roundingElsewhere(invented("const a = new Intl.NumberFormat();", "app/page.tsx"))).toHaveLength(1);
    expect(roundingElsewhere(invented("const a = (1).toFixed(2);", "lib/report/rounding.ts"))).toEqual([]);
  });

  test("an exported function that does not say what it gives", () => {
    expect(undocumentedFunctions(invented("export function sum() {}"))).toHaveLength(1);
    expect(undocumentedFunctions(invented("export const sum = () => 1;"))).toHaveLength(1);
    expect(undocumentedFunctions(invented("/** The sum. */\nexport function sum() {}"))).toEqual([]);
    expect(undocumentedFunctions(invented("function sum() {}"))).toEqual([]);
  });

  test("a formula that does not say where it comes from", () => {
    const formula = "/**\n * The heel.\n *\n *     tan = moment / (gm · displacement)\n *\n";
    expect(formulasWithoutSource(invented(`${formula} */\nexport function heel() {}`))).toHaveLength(1);
    expect(formulasWithoutSource(invented(`${formula} * Source: equilibrium. */\nexport function heel() {}`))).toEqual([]);
  });
});
