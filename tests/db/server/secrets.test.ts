import { mkdtempSync, readdirSync, rmSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { sessionSecret } from "@/db/server/secrets";

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  vi.stubEnv("BATTENBOOK_DATA", path.join(folder, "data"));
  vi.stubEnv("NEXTAUTH_SECRET", "");
});
afterEach(() => {
  vi.unstubAllEnvs();
  rmSync(folder, { recursive: true });
});

test("makes one secret of 32 bytes and keeps it for its owner alone", () => {
  const secret = sessionSecret();
  expect(Buffer.from(secret, "base64url")).toHaveLength(32);
  expect(sessionSecret()).toBe(secret);
  const data = path.join(folder, "data");
  expect(statSync(data).mode & 0o777).toBe(0o700);
  for (const file of readdirSync(data)) expect(statSync(path.join(data, file)).mode & 0o777).toBe(0o600);
});

test("takes the secret of the environment where one is set", () => {
  vi.stubEnv("NEXTAUTH_SECRET", "given");
  expect(sessionSecret()).toBe("given");
});
