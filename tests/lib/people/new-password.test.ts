import { expect, test } from "vitest";
import { newPasswordSchema } from "@/lib/people/new-password";

test.each(["batten-and-bob", "four words in a row", "Ärmelkanal um halb vier", "x".repeat(60) + "yzabcdwq".repeat(8)])(
  "%j may be set",
  (password) => {
    expect(newPasswordSchema.safeParse(password).success).toBe(true);
  },
);

test.each([
  ["short", "At least 12 characters"],
  ["a".repeat(129), "At most 128 characters"],
  ["abababababababab", "Too few different characters"],
  ["abcdefghijklmnop", "A row of neighbours"],
  ["12345678901234", "A row of neighbours"],
])("%j may not, and why is said", (password, why) => {
  const read = newPasswordSchema.safeParse(password);
  expect(read.error?.issues.map(({ message }) => message).join(" ")).toContain(why);
});
