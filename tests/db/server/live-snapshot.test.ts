import { randomUUID } from "node:crypto";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { createAccount } from "@/db/server/accounts";
import { tellChange } from "@/db/server/changes";
import { type Database, openDatabase } from "@/db/server/connection";
import { registerDevice } from "@/db/server/devices";
import { liveSnapshot } from "@/db/server/live-snapshot";
import { liveStream } from "@/db/server/live-stream";
import { grantRole } from "@/db/server/role-grants";
import { takeEvents } from "@/db/server/take-events";
import { planOf, savePlan } from "@/db/server/test-plan";
import { createTest } from "@/db/server/tests";
import { createVessel } from "@/db/server/vessels";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import { promised } from "@/lib/result";
import type { EventBody } from "@/lib/sync/event";
import type { Slot } from "@/lib/sync/slot";
import { bargeRecord } from "../../components/control/barge";

const at = "2026-05-04T09:00:00.000Z";
const device = "0190a5d1-5d00-4000-8000-0000000000d1";
let folder: string;
let db: Database;
let id: string;
let author: string;
let seq: number;

beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  db = openDatabase(path.join(folder, "a.db"));
  seq = 0;
  author = promised(createAccount(db, { name: "Ida Brekke", email: null, passwordHash: null }, { by: null, at })).id;
  const { vessel, hydrostatics, draftMarks, tanks, ...record } = bargeRecord(-1);
  const ship = createVessel(db, { vessel, hydrostatics, draftMarks, tanks }, { by: author, at });
  const given = { title: record.test.title, date: record.test.date, place: record.test.place, timeZone: "Europe/Oslo" };
  id = promised(createTest(db, ship, given, { by: author, at })).id;
  promised(savePlan(db, id, planOf(bargeRecord(-1)), null, { by: author, at }));
  grantRole(db, { test: id, account: author, role: "lead" }, { by: author, at });
  promised(registerDevice(db, { device, name: "Deck phone", publicKey: null }, author, { by: author, at }));
});
afterEach(() => {
  db.$client.close();
  rmSync(folder, { recursive: true });
});

type Own = "v" | "id" | "device" | "seq" | "test" | "jobTag" | "author" | "capturedAt" | "clockOffsetMs" | "reason";
type Given = EventBody extends infer E ? (E extends unknown ? Omit<E, Own> : never) : never;

/** An event as the lead's own device sends it. */
function taken(given: Given): void {
  seq += 1;
  const act = { v: 1, id: randomUUID(), device, seq, test: id, jobTag: "plan", author, capturedAt: at, clockOffsetMs: 0, reason: null };
  const body = { ...act, ...given } as EventBody;
  const { results } = takeEvents(
    db,
    { device, holds: 1, events: [{ body: canonicalJson(body), signature: null }] },
    { account: author, at },
  );
  expect(results[0]?.outcome).not.toBe("quarantined");
}

const noReading = { reading: null, base: null, slot: null, source: null } as const;
const slot: Slot = { kind: "batten", move: 0, repeat: 1, station: "A", series: 1 };
const read = (valuesMm: number[]): Given => ({
  type: "record",
  reading: randomUUID(),
  base: null,
  slot,
  payload: { mode: "settled", valuesMm },
  source: "station",
});

describe("the live view of a test", () => {
  test("holds every reading due and none read before anything has arrived", () => {
    const snapshot = liveSnapshot(db, id, at);
    // 5 moves × (3 stations + 2 weights + conditions) and 6 marks before and after
    expect(snapshot?.due).toHaveLength(5 * 6 + 2 * 6);
    expect(snapshot?.due.every(({ state }) => state === "empty")).toBe(true);
    expect(snapshot?.moves.map(({ no, state }) => [no, state])).toEqual([0, 1, 2, 3, 4].map((no) => [no, "due"]));
  });

  test("is nothing for a test that is not here", () => {
    expect(liveSnapshot(db, randomUUID(), at)).toBeNull();
  });

  test("names who read, and every act that a decision must settle", () => {
    taken(read([12]));
    taken(read([19]));
    const due = liveSnapshot(db, id, at)?.due.find(({ slotKey }) => slotKey === "batten/0/1/A/1");
    expect(due?.state).toBe("disagrees");
    expect(due?.readings.map(({ author: who, status }) => [who, status])).toEqual([
      ["Ida Brekke", "disagrees"],
      ["Ida Brekke", "disagrees"],
    ]);
    expect([...(due?.heads ?? [])].sort()).toEqual(due?.readings.map(({ event }) => event).sort());
  });

  test("follows the orders, and marks as late what arrives after its move was closed", () => {
    taken({ type: "move.open", ...noReading, payload: { move: 0, repeat: 1 } });
    expect(liveSnapshot(db, id, at)?.moves[0]).toMatchObject({ state: "open", openedAt: at, closedAt: null });
    taken({ type: "move.close", ...noReading, payload: { move: 0, repeat: 1 } });
    taken(read([12]));
    const snapshot = liveSnapshot(db, id, at);
    expect(snapshot?.moves[0]?.state).toBe("closed");
    expect(snapshot?.due.find(({ slotKey }) => slotKey === "batten/0/1/A/1")?.readings[0]?.late).toBe(true);
    expect(snapshot?.cursor).toBe(3);
  });

  test("asks for a repeated move again and keeps its earlier readings in sight", () => {
    taken(read([12]));
    taken({ type: "move.repeat", ...noReading, payload: { move: 0, repeat: 2 } });
    const snapshot = liveSnapshot(db, id, at);
    const ofStation = snapshot?.due.filter((each) => each.slot.kind === "batten" && each.slot.move === 0 && each.slot.station === "A");
    expect(ofStation?.map(({ slotKey, state }) => [slotKey, state])).toEqual([
      ["batten/0/2/A/1", "empty"],
      ["batten/0/1/A/1", "read"],
    ]);
    expect(snapshot?.moves[0]?.repeat).toBe(2);
  });

  test("tells which numbers of a phone are missing", () => {
    taken(read([12]));
    seq += 2;
    taken(read([12.2]));
    expect(liveSnapshot(db, id, at)?.phones).toEqual([
      expect.objectContaining({ name: "Deck phone", person: "Ida Brekke", highestSeq: 4, received: 2, missing: [2, 3] }),
    ]);
  });
});

describe("the live stream", () => {
  test("sends a whole snapshot at once, and another after each change", async () => {
    const gone = new AbortController();
    const reader = liveStream(db, id, async () => true, gone.signal).getReader();
    const first = await nextMessage(reader);
    expect(first.split("\n").slice(0, 2)).toEqual(["event: snapshot", "id: 0"]);
    taken(read([12]));
    const second = await nextMessage(reader);
    expect(second.split("\n").slice(0, 2)).toEqual(["event: snapshot", "id: 1"]);
    expect(JSON.parse(second.split("\n")[2]?.slice("data: ".length) ?? "null")).toEqual(
      JSON.parse(JSON.stringify(liveSnapshot(db, id, at))),
    );
    gone.abort();
  });

  test("ends when its listener may see no more", async () => {
    const gone = new AbortController();
    let may = true;
    const reader = liveStream(db, id, async () => may, gone.signal).getReader();
    await nextMessage(reader);
    may = false;
    tellChange(id);
    expect((await reader.read()).done).toBe(true);
  });
});

async function nextMessage(reader: ReadableStreamDefaultReader<Uint8Array>): Promise<string> {
  const { value } = await reader.read();
  return new TextDecoder().decode(value);
}
