import canonicalize from "canonicalize";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { canonicalJson } from "@/lib/ledger/canonical-json";

/** The number whose 64 bits these hexadecimal digits are. */
function numberOfBits(bits: string): number {
  const view = new DataView(new ArrayBuffer(8));
  view.setBigUint64(0, BigInt(`0x${bits}`));
  return view.getFloat64(0);
}

// of whole code points: half a surrogate pair is refused
const anyText = fc.string({ unit: "binary", maxLength: 12 });
const anyJson = fc.jsonValue({ stringUnit: "binary", maxDepth: 4 });

describe("canonical JSON", () => {
  // Source: RFC 8785 appendix B, table 1, all finite rows.
  it.each([
    ["0000000000000000", "0"],
    ["8000000000000000", "0"],
    ["0000000000000001", "5e-324"],
    ["8000000000000001", "-5e-324"],
    ["7fefffffffffffff", "1.7976931348623157e+308"],
    ["ffefffffffffffff", "-1.7976931348623157e+308"],
    ["4340000000000000", "9007199254740992"],
    ["c340000000000000", "-9007199254740992"],
    ["4430000000000000", "295147905179352830000"],
    ["44b52d02c7e14af5", "9.999999999999997e+22"],
    ["44b52d02c7e14af6", "1e+23"],
    ["44b52d02c7e14af7", "1.0000000000000001e+23"],
    ["444b1ae4d6e2ef4e", "999999999999999700000"],
    ["444b1ae4d6e2ef4f", "999999999999999900000"],
    ["444b1ae4d6e2ef50", "1e+21"],
    ["3eb0c6f7a0b5ed8c", "9.999999999999997e-7"],
    ["3eb0c6f7a0b5ed8d", "0.000001"],
    ["41b3de4355555553", "333333333.3333332"],
    ["41b3de4355555554", "333333333.33333325"],
    ["41b3de4355555555", "333333333.3333333"],
    ["41b3de4355555556", "333333333.3333334"],
    ["41b3de4355555557", "333333333.33333343"],
    ["becbf647612f3696", "-0.0000033333333333333333"],
    ["43143ff3c1cb0959", "1424953923781206.2"],
  ])("writes the number of bits %s as %s", (bits, text) => {
    expect(canonicalJson(numberOfBits(bits))).toBe(text);
  });

  // Source: RFC 8785 appendix B, table 1, the two rows that must stop a program.
  it.each(["7fffffffffffffff", "7ff0000000000000"])("refuses the number of bits %s", (bits) => {
    expect(() => canonicalJson(numberOfBits(bits))).toThrow(RangeError);
  });

  it("writes the example of RFC 8785 §3.2.2 and §3.2.3", () => {
    const given = String.raw`{
      "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
      "string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
      "literals": [null, true, false]
    }`;
    const canonical = String.raw`{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\u000f\nA'B\"\\\\\"/"}`;
    expect(canonicalJson(JSON.parse(given))).toBe(canonical);
  });

  it("sorts names by UTF-16 code units, as in the example of RFC 8785 §3.2.3", () => {
    const given = String.raw`{
      "\u20ac": "Euro Sign",
      "\r": "Carriage Return",
      "\ufb33": "Hebrew Letter Dalet With Dagesh",
      "1": "One",
      "\ud83d\ude00": "Emoji: Grinning Face",
      "\u0080": "Control",
      "\u00f6": "Latin Small Letter O With Diaeresis"
    }`;
    const sorted = [...canonicalJson(JSON.parse(given)).matchAll(/:"([^"]+)"/g)].map(([, value]) => value);
    expect(sorted).toEqual([
      "Carriage Return",
      "One",
      "Control",
      "Latin Small Letter O With Diaeresis",
      "Euro Sign",
      "Emoji: Grinning Face",
      "Hebrew Letter Dalet With Dagesh",
    ]);
  });

  it("sorts names at every depth and keeps lists in their order", () => {
    expect(canonicalJson({ b: [{ z: 1, a: [3, 1, 2] }], a: {} })).toBe('{"a":{},"b":[{"a":[3,1,2],"z":1}]}');
  });

  it("leaves out what is undefined in an object, as ECMAScript's own JSON does", () => {
    expect(canonicalJson({ a: undefined, b: 1 })).toBe('{"b":1}');
  });

  it("for any value reads back as that value, and is its own canonical text", () => {
    fc.assert(
      fc.property(anyJson, (value) => {
        const text = canonicalJson(value);
        expect(JSON.parse(text)).toEqual(value);
        expect(canonicalJson(JSON.parse(text))).toBe(text);
      }),
    );
  });

  it("for any object is the same in whatever order its members were written", () => {
    const members = fc.uniqueArray(fc.tuple(anyText, fc.integer()), { selector: ([name]) => name });
    fc.assert(
      fc.property(members, (entries) => {
        expect(canonicalJson(Object.fromEntries(entries.toReversed()))).toBe(canonicalJson(Object.fromEntries(entries)));
      }),
    );
  });

  it("for any value agrees with another program written to the same standard", () => {
    fc.assert(
      fc.property(anyJson, (value) => {
        expect(canonicalJson(value)).toBe(canonicalize(value));
      }),
    );
  });

  it.each<[string, unknown]>([
    ["nothing at all", undefined],
    ["nothing in a list", [1, undefined]],
    ["a gap in a list", new Array(2)],
    ["a function", { a: () => 1 }],
    ["a symbol", Symbol("a")],
    ["a big integer", 1n],
    ["minus infinity", { a: Number.NEGATIVE_INFINITY }],
    ["half a surrogate pair", "\ud83d"],
    ["half a surrogate pair in a name", { "\ude00": 1 }],
    ["a date", new Date(0)],
    ["a map", new Map([["a", 1]])],
    ["bytes", new Uint8Array([1])],
  ])("refuses %s", (_, value) => {
    expect(() => canonicalJson(value)).toThrow(/^JSON cannot hold/);
  });
});
