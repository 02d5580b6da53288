import { beforeAll, expect, test } from "vitest";
import { loadDemo } from "@/db/seed/demo";
import { demoPassword, demoPeople } from "@/db/seed/demo-people";
import { skerryTern } from "@/db/seed/skerry-tern";
import { accountSigningIn, createAccount } from "@/db/server/accounts";
import { type Database, openDatabase } from "@/db/server/connection";
import { ledgerOf } from "@/db/server/ledger-entries";
import { liveSnapshot } from "@/db/server/live-snapshot";
import { rolesOf } from "@/db/server/role-grants";
import { testSoFar } from "@/lib/inclining/test-so-far";
import { chainHead } from "@/lib/ledger/hash-chain";
import { promised } from "@/lib/result";

const now = "2026-05-04T12:00:00.000Z";
const { record } = skerryTern();
let db: Database;
let id: string;

beforeAll(async () => {
  db = openDatabase(":memory:");
  id = promised(await loadDemo(db));
});

test("has one account for each role and a second reader, who sign in with the password that is told", async () => {
  const roles = Object.values(demoPeople).map(({ id: account }) => rolesOf(db, account, id, now));
  expect(roles).toEqual([["engineer"], ["lead"], ["witness"], ["administrator"], ["reader"], ["reader"]]);
  for (const { email, id: account } of Object.values(demoPeople))
    expect((await accountSigningIn(db, email, demoPassword))?.id).toBe(account);
});

test("has moves 0 to 5 read at every station, and leaves 6 to 8 to the visitor", () => {
  const snapshot = snapshotOf(db);
  expect(snapshot.state).toBe("open");
  expect(snapshot.moves.map(({ state }) => state)).toEqual([...Array(6).fill("closed"), ...Array(3).fill("due")]);
  for (const { slot, state } of snapshot.due) {
    if (slot.kind === "batten" || slot.kind === "position" || slot.kind === "condition")
      expect(state).toBe(slot.move <= 5 ? "read" : "empty");
  }
});

test("has marks, water and most tanks read before the moves", () => {
  const before = snapshotOf(db).due.filter(({ slot }) => "round" in slot && slot.round === "before");
  const empty = before.filter(({ state }) => state === "empty").map(({ slotKey }) => slotKey);
  expect(empty.sort()).toEqual(["sounding/BW-F/before", "sounding/GW/before"]);
});

test("has two readers who disagree once", () => {
  const open = snapshotOf(db).due.filter(({ state }) => state === "disagrees");
  expect(open.map(({ slotKey }) => slotKey)).toEqual(["draft/FS/before"]);
  expect(open[0]?.readings.map(({ author }) => author).sort()).toEqual(["Mara Quist", "Nils Aker"]);
});

test("has one reading that came after its move was closed, though it was taken before, and one by radio", () => {
  const standing = snapshotOf(db).due.flatMap(({ slotKey, readings }) => readings.map((reading) => ({ slotKey, ...reading })));
  expect(standing.filter(({ late }) => late).map(({ slotKey, capturedAfterClose }) => [slotKey, capturedAfterClose])).toEqual([
    ["batten/4/1/U/1", false],
  ]);
  expect(standing.filter(({ source }) => source === "radio").map(({ slotKey }) => slotKey)).toEqual(["batten/3/1/C/1"]);
});

test("shows the gust of move 5 as the largest departure from a straight line", () => {
  const { line } = testSoFar(snapshotOf(db).record);
  const departure = (line?.moves ?? []).map(({ no, moment, tanHeel }) => ({ no, off: Math.abs(tanHeel - moment * (line?.slope ?? 0)) }));
  expect(departure.sort((a, b) => b.off - a.off)[0]?.no).toBe(5);
});

test("sets nothing aside, misses no number, and has a chain that fits", () => {
  const { phones, quarantined } = snapshotOf(db);
  expect(quarantined).toEqual([]);
  expect(phones.map(({ name, missing }) => [name, missing])).toEqual(
    expect.arrayContaining([
      ["Mara's phone", []],
      ["Nils's phone", []],
      ["Wheelhouse laptop", []],
    ]),
  );
  expect(phones).toHaveLength(3);
  expect(chainHead(ledgerOf(db, id)).ok).toBe(true);
});

test("is the same each time it is loaded", async () => {
  const again = openDatabase(":memory:");
  await loadDemo(again);
  const bodies = (one: Database) => one.$client.prepare("select body, received_at from events order by server_seq").all();
  expect(bodies(again)).toEqual(bodies(db));
  expect(snapshotOf(again).record).toEqual(snapshotOf(db).record);
});

test("goes into an empty database only, and leaves another as it is", async () => {
  expect(await loadDemo(db)).toEqual({ ok: false, refusal: { type: "DatabaseNotEmpty" } });
  const office = openDatabase(":memory:");
  promised(createAccount(office, { name: "Somebody", email: null, passwordHash: null }, { by: null, at: now }));
  expect((await loadDemo(office)).ok).toBe(false);
  expect(liveSnapshot(office, record.test.id, now)).toBeNull();
});

function snapshotOf(one: Database) {
  return liveSnapshot(one, record.test.id, now) ?? expect.fail("the demo's test is not there");
}
