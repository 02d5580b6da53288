import { describe, expect, test } from "vitest";
import { codeInAddress, isWholeCode, writtenCode } from "@/components/join/code-in-address";

describe("the code of a phone", () => {
  test.each([
    ["the fragment, which no server logs", { hash: "#code=acde-fghj", search: "" }],
    ["the query as well", { hash: "", search: "?code=ACDEFGHJ" }],
  ])("is read from %s", (_, address) => {
    expect(codeInAddress(address)).toBe("ACDE-FGHJ");
  });

  test("is empty where the address has none", () => {
    expect(codeInAddress({ hash: "", search: "" })).toBe("");
  });

  test.each([
    ["acd", "ACD"],
    ["acdef", "ACDE-F"],
    ["ACDE FGHJ more", "ACDE-FGHJ"],
  ])("typed as %s is written %s", (typed, written) => {
    expect(writtenCode(typed)).toBe(written);
  });

  test("is whole with four and four", () => {
    expect([isWholeCode("ACDE-FGHJ"), isWholeCode("ACDE-FGH")]).toEqual([true, false]);
  });
});
