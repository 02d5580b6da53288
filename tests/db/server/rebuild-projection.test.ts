import { expect, test } from "vitest";
import { loadDemo } from "@/db/seed/demo";
import { openDatabase } from "@/db/server/connection";
import { projectionOf, rebuildProjection } from "@/db/server/rebuild-projection";
import { promised } from "@/lib/result";

test("gives from the events alone what stood before, row for row", async () => {
  const db = openDatabase(":memory:");
  const id = promised(await loadDemo(db));
  const before = projectionOf(db, id);
  expect(before.filter((row) => row.startsWith('["readings"')).length).toBeGreaterThan(60);
  rebuildProjection(db, id);
  expect(projectionOf(db, id)).toEqual(before);
});

test("mends a projection that was spoiled", async () => {
  const db = openDatabase(":memory:");
  const id = promised(await loadDemo(db));
  const before = projectionOf(db, id);
  db.$client.exec("update readings set status = 'void'; delete from slots where slot_key like 'batten/%'; delete from placed_events");
  rebuildProjection(db, id);
  expect(projectionOf(db, id)).toEqual(before);
});
