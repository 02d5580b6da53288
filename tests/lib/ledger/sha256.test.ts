import { createHash } from "node:crypto";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { sha256Hex } from "@/lib/ledger/sha256";

describe("SHA-256 of a text", () => {
  // Source: FIPS 180-2 appendix B.1 to B.3, the function of FIPS 180-4 unchanged; nothing: NIST CAVP, SHA256ShortMsg.rsp, Len = 0.
  it.each([
    ["nothing", "", "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855"],
    ["one block", "abc", "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad"],
    [
      "two blocks",
      "abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq",
      "248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1",
    ],
    ["a million letters", "a".repeat(1_000_000), "cdc76e5c9914fb9281a1c7e284d73e67f1809a48a497200e046d39ccc7112cd0"],
  ])("is the published one for %s", (_, text, hash) => {
    expect(sha256Hex(text)).toBe(hash);
  });

  it("for any text is what another program makes of its UTF-8 bytes", () => {
    fc.assert(
      fc.property(fc.string({ unit: "binary", maxLength: 300 }), (text) => {
        expect(sha256Hex(text)).toBe(createHash("sha256").update(text, "utf8").digest("hex"));
      }),
    );
  });
});
