import { expect, test } from "vitest";
import { blocksOf, codeNames, localLinks, scriptsNamed, sectionUnder, tableUnder } from "./markdown";

const document = `# Title

The job.

\`\`\`
npm run app
npm test
\`\`\`

## Map

| folder | holds |
|---|---|
| \`lib/\` | a [method](lib/frame.ts#sign) |

### Inner

inside

## Next

\`npm run --silent reduce -- x.json\`, [outside](https://example.org), [above](#map)
`;

test("links are those into the project, without anchors", () => {
  expect(localLinks(document)).toEqual(["lib/frame.ts"]);
});

test("scripts are those that npm is told to run", () => {
  expect(scriptsNamed(document)).toEqual(["app", "test", "reduce"]);
});

test("a table's cells are read under its heading only", () => {
  expect(tableUnder(document, "## Map")).toEqual([["`lib/`", "a [method](lib/frame.ts#sign)"]]);
  expect(tableUnder(document, "## Next")).toEqual([]);
});

test("a section ends at the next heading of its rank", () => {
  expect(sectionUnder(document, "## Map")).toContain("inside");
  expect(sectionUnder(document, "## Map")).not.toContain("outside");
  expect(sectionUnder(document, "## Absent")).toBe("");
});

test("names stand between backticks", () => {
  expect(codeNames("`kmt`, `kml` and gm")).toEqual(["kmt", "kml"]);
});

test("blocks are told apart by an empty line", () => {
  expect(blocksOf(document).slice(0, 3)).toEqual(["# Title", "The job.", "```\nnpm run app\nnpm test\n```"]);
});
