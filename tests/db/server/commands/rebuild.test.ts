import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { loadDemo } from "@/db/seed/demo";
import { openDatabase } from "@/db/server/connection";
import { promised } from "@/lib/result";

let folder: string;
beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  const db = openDatabase(path.join(folder, "battenbook.db"));
  promised(await loadDemo(db));
  db.$client.close();
});
afterAll(() => rmSync(folder, { recursive: true }));

test("finds everything as it stood and ends with 0; what was spoiled it mends, says so and ends with 1, once", () => {
  expect(rebuilt()).toMatchObject({
    status: 0,
    stdout: expect.stringMatching(/^Inclining test after conversion: \d+ rows from the events, as they stood$/m),
  });
  const db = openDatabase(path.join(folder, "battenbook.db"));
  const { changes } = db.$client.prepare("update readings set status = 'void' where status = 'accepted'").run();
  db.$client.close();
  const mended = rebuilt();
  expect(mended.status).toBe(1);
  // each row is one that stood otherwise, and one that stands now
  expect(mended.stdout).toContain(`; ${2 * changes} stood otherwise and are mended`);
  expect(rebuilt().status).toBe(0);
});

function rebuilt() {
  const command = ["--import", "tsx", "--conditions=react-server", "db/server/commands/rebuild.ts"];
  return spawnSync(process.execPath, command, { env: { ...process.env, BATTENBOOK_DATA: folder }, encoding: "utf8" });
}
