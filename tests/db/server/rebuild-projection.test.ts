import { expect, test } from "vitest";
import { loadDemo } from "@/db/seed/demo";
import { type Database, openDatabase } from "@/db/server/connection";
import { rebuildProjection } from "@/db/server/rebuild-projection";
import { promised } from "@/lib/result";

const tables = ["placed_events", "slots", "readings"] as const;

test("gives from the events alone what stood before, row for row", async () => {
  const db = openDatabase(":memory:");
  const id = promised(await loadDemo(db));
  const before = projectionOf(db);
  expect(before.readings.length).toBeGreaterThan(60);
  rebuildProjection(db, id);
  expect(projectionOf(db)).toEqual(before);
});

test("mends a projection that was spoiled", async () => {
  const db = openDatabase(":memory:");
  const id = promised(await loadDemo(db));
  const before = projectionOf(db);
  db.$client.exec("update readings set status = 'void'; delete from slots where slot_key like 'batten/%'; delete from placed_events");
  rebuildProjection(db, id);
  expect(projectionOf(db)).toEqual(before);
});

function projectionOf(db: Database): Record<(typeof tables)[number], unknown[]> {
  const [placed_events, slots, readings] = tables.map((table) => db.$client.prepare(`select * from ${table} order by 1, 2`).all());
  return { placed_events: placed_events ?? [], slots: slots ?? [], readings: readings ?? [] };
}
