import { existsSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { importTable } from "./import-table";
import { blocksOf, codeNames, localLinks, scriptsNamed, tableUnder } from "./markdown";
import { codeFiles, projectPaths, root, textFile } from "./project";
import { nodesOfType, sourceOf } from "./source";

const readme = textFile("README.md").text;
const developers = textFile("DEVELOPERS.md").text;
const scripts: Record<string, string> = JSON.parse(textFile("package.json").text).scripts;

describe("README.md", () => {
  test("says what the job is, then the two commands", () => {
    const [title = "", job = "", commands = ""] = blocksOf(readme);
    expect(title).toBe("# Battenbook");
    expect(job).toMatch(/^[A-Z][\s\S]+\.$/);
    expect(commands.split("\n").filter((line) => line.startsWith("npm "))).toEqual([
      expect.stringMatching(/^npm run app\b/),
      expect.stringMatching(/^npm test\b/),
    ]);
  });
});

describe.each(["README.md", "DEVELOPERS.md"])("%s", (name) => {
  const text = textFile(name).text;

  test("links to what exists", () => {
    expect(localLinks(text).filter((link) => !existsSync(path.join(root, link)))).toEqual([]);
  });

  test("names npm scripts that exist", () => {
    expect(scriptsNamed(text).filter((script) => !(script in scripts))).toEqual([]);
  });
});

describe("DEVELOPERS.md", () => {
  test("prints the import table as the check holds it", () => {
    const printed = tableUnder(developers, "## Imports run downhill").map(([part = "", uses = ""]) => [codeNames(part), codeNames(uses)]);
    expect(printed).toEqual(importTable.map(({ part, mayImport }) => [[part], [...mayImport]]));
  });

  test("maps every folder at the root and in lib, and no other", () => {
    const mapped = tableUnder(developers, "## Map").map(([folder = ""]) => codeNames(folder)[0]);
    expect(mapped.filter((folder) => folder !== undefined && !existsSync(path.join(root, folder)))).toEqual([]);
    expect(foldersToMap().filter((folder) => !mapped.includes(folder))).toEqual([]);
  });

  test("explains words by names that lib really has", () => {
    const glossary = tableUnder(developers, "## Glossary");
    const names = glossary.flatMap(([, name = ""]) => codeNames(name));
    const known = namesInLib();
    expect(names.length).toBeGreaterThan(30);
    expect(names.filter((name) => !known.has(name))).toEqual([]);
  });

  test("gives each word of the glossary a definition and a source", () => {
    const incomplete = tableUnder(developers, "## Glossary").filter((row) => row.length !== 6 || row.some((cell) => cell === ""));
    expect(incomplete).toEqual([]);
  });
});

function foldersToMap(): readonly string[] {
  const folders = projectPaths.flatMap((file) => /^([a-z]+\/)/.exec(file)?.[1] ?? []);
  const ofLib = projectPaths.flatMap((file) => /^(lib\/[a-z]+\/)/.exec(file)?.[1] ?? []);
  return [...new Set([...folders, ...ofLib])];
}

function namesInLib(): ReadonlySet<string> {
  const sources = codeFiles.filter((file) => file.path.startsWith("lib/")).map(sourceOf);
  const identifiers = sources.flatMap((source) => nodesOfType(source, "Identifier").map((node) => node.name));
  const literals = sources.flatMap((source) => nodesOfType(source, "Literal").map((node) => String(node.value)));
  return new Set([...identifiers, ...literals]);
}
