import { spawnSync } from "node:child_process";
import { mkdirSync, mkdtempSync, readdirSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { loadDemo } from "@/db/seed/demo";
import { type Database, openDatabase } from "@/db/server/connection";
import { ledgerHead } from "@/db/server/ledger-entries";
import { grantRole } from "@/db/server/role-grants";
import { promised } from "@/lib/result";

let base: string;
let copies: string;
let server: Database;
let id: string;
beforeAll(async () => {
  base = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  copies = path.join(base, "copies");
  mkdirSync(copies);
  mkdirSync(path.join(base, "data"));
  server = openDatabase(path.join(base, "data", "battenbook.db"));
  id = promised(await loadDemo(server));
});
afterAll(() => rmSync(base, { recursive: true }));

test("copies beside a running server, restores only without one, and says in words what was lost and what was kept", () => {
  const copied = command("backup");
  expect(copied.stdout).toMatch(/^battenbook-[\dTZ-]+\.db: whole, 0\.\d MB, events up to \d+\n$/);
  const file = path.join(copies, readdirSync(copies)[0] ?? "");
  const { account } = server.$client.prepare("select account from role_grants limit 1").get() as { account: string };
  grantRole(server, { test: id, account, role: "witness" }, { by: null, at: new Date().toISOString() });
  const head = ledgerHead(server, id);

  expect(command("restore", file)).toMatchObject({
    status: 1,
    stderr: "Nothing was changed. The database is in use: stop the server first.\n",
  });
  server.$client.close();
  const restored = command("restore", file);
  expect(restored.status).toBe(0);
  const lines = restored.stdout.trim().split("\n");
  expect(lines).toEqual([
    expect.stringMatching(/^Restored from .+\. New epoch [0-9a-f-]{36}: phones send again what this copy lacks\.$/),
    expect.stringMatching(/^The database that was here before is kept as battenbook-before-restore-[\dTZ-]+\.db\.$/),
    expect.stringMatching(
      /^No longer shown: Inclining test after conversion, what followed on the copy up to entry \d+, head [0-9a-f]{64}$/,
    ),
    "Roles, passwords and revoked phones are as they were in the copy: look through them.",
  ]);
  expect(lines[2]).toContain(head);
});

test("ends with 1 and a sentence without a folder, and without a file", () => {
  expect(command("backup", "", "")).toMatchObject({
    status: 1,
    stderr: "No backup was made. No backup folder is set: BATTENBOOK_BACKUP_FOLDER names it.\n",
  });
  expect(command("restore")).toMatchObject({ status: 1, stderr: "Which copy? npm run restore -- FILE\n" });
});

function command(name: "backup" | "restore", file = "", folder = copies) {
  const words = ["--import", "tsx", "--conditions=react-server", `db/server/commands/${name}.ts`, ...(file === "" ? [] : [file])];
  const env = { ...process.env, BATTENBOOK_DATA: path.join(base, "data"), BATTENBOOK_BACKUP_FOLDER: folder };
  return spawnSync(process.execPath, words, { env, encoding: "utf8" });
}
