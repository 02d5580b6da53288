import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { loadDemo } from "@/db/seed/demo";
import { openDatabase } from "@/db/server/connection";
import { promised } from "@/lib/result";

let folder: string;
let id: string;
beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  const db = openDatabase(path.join(folder, "battenbook.db"));
  id = promised(await loadDemo(db));
  db.$client.close();
});
afterAll(() => rmSync(folder, { recursive: true }));

test("says that every chain is whole and ends with 0; after one byte was changed it names the entry and ends with 1", () => {
  const whole = verified();
  expect(whole.status).toBe(0);
  expect(whole.stdout).toMatch(/Inclining test after conversion: \d+ entries, \d+ of them events, head [0-9a-f]{64}: whole/);
  const seq = changeOneByte();
  const changed = verified();
  expect(changed.status).toBe(1);
  expect(changed.stdout).toContain(`does not fit: entry ${seq} speaks of event 40, whose text is another now`);
});

function verified() {
  const command = ["--import", "tsx", "--conditions=react-server", "db/server/commands/ledger-verify.ts"];
  return spawnSync(process.execPath, command, { env: { ...process.env, BATTENBOOK_DATA: folder }, encoding: "utf8" });
}

/** As somebody would who has the file: past the trigger that refuses it. */
function changeOneByte(): number {
  const db = openDatabase(path.join(folder, "battenbook.db"));
  db.$client.exec("drop trigger events_never_change");
  db.$client.exec(`update events set body = replace(body, '"v":1}', '"v":2}') where server_seq = 40`);
  const seq = db.$client
    .prepare("select seq from ledger_entries where chain = ? and json_extract(after, '$.serverSeq') = 40")
    .pluck()
    .get(id);
  db.$client.close();
  return Number(seq);
}
