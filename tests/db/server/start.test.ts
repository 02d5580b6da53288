import { spawnSync } from "node:child_process";
import { chmodSync, existsSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";

const root = path.resolve(import.meta.dirname, "../../..");
let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
});
afterEach(() => rmSync(folder, { recursive: true }));

test("makes database and secret at the first start", () => {
  expect(started({}).status).toBe(0);
  expect(existsSync(path.join(folder, "battenbook.db"))).toBe(true);
  expect(existsSync(path.join(folder, "session-secret"))).toBe(true);
});

test("ends with one plain sentence where the database can't be opened", () => {
  const file = path.join(folder, "battenbook.db");
  writeFileSync(file, "this is no database, and long enough to be looked at as one ".repeat(40));
  chmodSync(file, 0o600);
  const { status, stderr } = started({});
  expect(status).toBe(1);
  expect(stderr.trim().split("\n")).toEqual([expect.stringMatching(/^Battenbook can't start: /)]);
});

test("does not open the database while the application is built", () => {
  const { status, stderr } = started({ NEXT_PHASE: "phase-production-build" });
  expect(status).toBe(1);
  expect(stderr).toContain("not opened while the application is built");
  expect(existsSync(path.join(folder, "battenbook.db"))).toBe(false);
});

function started(env: Record<string, string>) {
  const script = "import('./db/server/start.ts').then(({ startServer }) => startServer())";
  const tsx = path.join(root, "node_modules/tsx/dist/cli.mjs");
  const own = { BATTENBOOK_DATA: folder, NEXTAUTH_SECRET: "", ...env };
  return spawnSync(process.execPath, [tsx, "--conditions=react-server", "--eval", script], {
    cwd: root,
    env: { ...process.env, ...own },
    encoding: "utf8",
  });
}
