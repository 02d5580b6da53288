import { describe, expect, test } from "vitest";
import { pathWithin } from "@/components/sign-in/path-within";

describe("where a person goes after signing in", () => {
  test("is the page that asked for it, with its query", () => {
    expect(pathWithin("/tests/0190a5d1/control?move=3")).toBe("/tests/0190a5d1/control?move=3");
  });

  test("is the list of tests where nothing asked", () => {
    expect(pathWithin(null)).toBe("/tests");
    expect(pathWithin("")).toBe("/tests");
  });

  test.each(["//elsewhere.example/x", "/\\elsewhere.example", "https://elsewhere.example", "javascript:alert(1)", "/\t/elsewhere.example"])(
    "is never another server: %j",
    (next) => {
      expect(pathWithin(next)).toMatch(/^\/(?!\/)/);
      expect(new URL(pathWithin(next), "https://here.example").origin).toBe("https://here.example");
    },
  );
});
