import { describe, expect, test } from "vitest";
import { textFiles } from "./project";
import { forbiddenPatternsIn, forbiddenWordsIn, hashOfWord } from "./wording-rules";

describe("the project", () => {
  test("holds no word that has no place in it", () => {
    // the lock file's checksums are letters by chance
    const written = textFiles.filter((file) => file.path !== "package-lock.json");
    expect(written.flatMap((file) => forbiddenWordsIn(file))).toEqual([]);
  });

  test("holds no note to oneself, no machine's path, no registry's address, no issue's number", () => {
    expect(textFiles.flatMap(forbiddenPatternsIn)).toEqual([]);
  });
});

describe("the rule", () => {
  const words = new Set([hashOfWord("flummery"), hashOfWord("ZQ")]);

  test("finds a word however it is joined or capitalised", () => {
    const found = ["A flummery.", "const someFlummery = 1;", "FLUMMERY_LIST", "flummery-rules"].map((text) =>
      forbiddenWordsIn({ path: "x.md", text }, words),
    );
    expect(found.map((each) => each.length)).toEqual([1, 1, 1, 1]);
  });

  test("takes two capitals as they stand", () => {
    expect(forbiddenWordsIn({ path: "x.md", text: "a ZQ model" }, words)).toHaveLength(1);
    expect(forbiddenWordsIn({ path: "x.md", text: "zq Zq" }, words)).toEqual([]);
  });

  test("names the line", () => {
    expect(forbiddenWordsIn({ path: "x.md", text: "fine\nflummery" }, words)).toEqual([expect.stringMatching(/^x\.md:2 /)]);
  });

  test.each([
    [["// TO", "DO later"].join("")],
    [["see /ro", "ot/notes"].join("")],
    [["https://registry.", "npmjs.org/x"].join("")],
    [["as said in issue ", "#12"].join("")],
  ])("finds %s", (text) => {
    expect(forbiddenPatternsIn({ path: "x.md", text })).toHaveLength(1);
  });

  test.each(["color: #123456", "src/home/page", "/tests/[id]", 'href="#3"'])("lets %s stand", (text) => {
    expect(forbiddenPatternsIn({ path: "x.md", text })).toEqual([]);
  });
});
