import { describe, expect, it } from "vitest";
import { documentPath, valueAtPath } from "@/lib/record/document-path";

describe("a place in a document", () => {
  it("is written as in the record's own notation", () => {
    expect(documentPath(["readings", "battens", 3, "valuesMm"])).toBe("readings.battens[3].valuesMm");
    expect(documentPath(["moves", 0, "positions", "W-1"])).toBe("moves[0].positions.W-1");
    expect(documentPath(["moves", 0, "positions", "weight 1"])).toBe('moves[0].positions["weight 1"]');
    expect(documentPath([])).toBe("");
  });

  it("gives what stands there, and nothing where there is nothing", () => {
    expect(valueAtPath({ a: [{ b: 5 }] }, ["a", 0, "b"])).toBe(5);
    expect(valueAtPath({ a: 1 }, ["a", "b", "c"])).toBeUndefined();
    expect(valueAtPath(null, ["a"])).toBeUndefined();
  });
});
