import { scryptSync } from "node:crypto";
import { expect, test } from "vitest";
import { isPassword, passwordHash } from "@/db/server/passwords";

test("knows a password again, and no other", async () => {
  const hash = await passwordHash("batten-and-bob");
  expect(await isPassword("batten-and-bob", hash)).toBe(true);
  expect(await isPassword("batten-and-bov", hash)).toBe(false);
  expect(await isPassword("", hash)).toBe(false);
});

test("gives two hashes of one password that have nothing in common", async () => {
  const [first, second] = await Promise.all([passwordHash("batten"), passwordHash("batten")]);
  expect(first).not.toBe(second);
});

test("says in the hash how it was made, and follows that when it checks", async () => {
  const salt = Buffer.from("0123456789abcdef");
  const cheap = scryptSync("batten", salt, 32, { N: 1024, r: 8, p: 1 });
  const hash = `scrypt$1024$8$1$${salt.toString("base64url")}$${cheap.toString("base64url")}`;
  expect(await isPassword("batten", hash)).toBe(true);
  expect((await passwordHash("batten")).startsWith("scrypt$32768$8$1$")).toBe(true);
});

test("takes one password for the same however its accents are coded", async () => {
  expect(await isPassword("Ba\u0301tten", await passwordHash("B\u00e1tten"))).toBe(true);
});

test("refuses every password where there is no hash, and a hash it does not know", async () => {
  expect(await isPassword("batten", null)).toBe(false);
  expect(await isPassword("batten", "plain$batten")).toBe(false);
});
