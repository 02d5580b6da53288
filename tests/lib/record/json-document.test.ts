import { describe, expect, it } from "vitest";
import { jsonDocument } from "@/lib/record/json-document";

describe("a JSON document", () => {
  it("is what the text holds", () => {
    expect(jsonDocument('{"a": [1, "NaN"]}')).toEqual({ ok: true, value: { a: [1, "NaN"] } });
  });

  it("keeps a NaN or Infinity as a word, so that its place can be named", () => {
    expect(jsonDocument('{"a": [NaN, -Infinity, Infinity], "NaN": "it \\" is NaN"}')).toEqual({
      ok: true,
      value: { a: ["NaN", "-Infinity", "Infinity"], NaN: 'it " is NaN' },
    });
  });

  it("is refused where the text is none", () => {
    expect(jsonDocument("")).toMatchObject({ ok: false, refusal: { type: "NotJson", path: "record" } });
    expect(jsonDocument('{"a": 1,}')).toMatchObject({ ok: false, refusal: { type: "NotJson" } });
  });
});
