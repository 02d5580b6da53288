import { beforeEach, expect, test } from "vitest";
import { liveSnapshot } from "@/db/server/live-snapshot";
import { rebuildProjection } from "@/db/server/rebuild-projection";
import type { Envelope } from "@/lib/sync/protocol";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { idOf, Phone, readingOf } from "./phone";
import { at, personWith, type Yard, yard } from "./yard";

const mark: Slot = { kind: "draft", mark: "AP", round: "before" };
let ship: Yard;
let mara: Phone;
let read: Envelope;
let corrected: Envelope;

beforeEach(() => {
  ship = yard();
  mara = new Phone(ship.db, ship.test, personWith(ship, "reader", "Mara").id);
  read = mara.reads(mark, { value: 3.381 });
  corrected = mara.says({
    type: "correct",
    reading: readingOf(read),
    base: idOf(read),
    slot: mark,
    payload: { value: 3.318 },
    source: "station",
    reason: "figures turned round",
  });
});

test("a correction that came before its reading stands when the reading arrives", () => {
  expect(mara.sends([corrected]).results[0]?.outcome).toBe("deferred");
  mara.sends([read]);
  expect(values()).toEqual([3.318]);
});

test.each(["author", "test"])("a copy of a correction that broke on its way in its %s does not take its place", (broken) => {
  mara.sends([corrected]);
  expect(mara.sends([brokenIn(corrected, broken)]).results[0]).toMatchObject({ outcome: "quarantined", code: "bad-signature" });
  mara.sends([read]);
  expect(values()).toEqual([3.318]);
  const before = projection();
  rebuildProjection(ship.db, ship.test);
  expect(projection()).toEqual(before);
});

function brokenIn({ body, signature }: Envelope, key: string): Envelope {
  const said = JSON.parse(body) as Record<string, string>;
  const other = (said[key] ?? "").replace(/^./, (digit) => (digit === "a" ? "b" : "a"));
  return { body: body.replace(`"${key}":"${said[key]}"`, `"${key}":"${other}"`), signature };
}

function values(): number[] {
  const readings = liveSnapshot(ship.db, ship.test, at)?.due.find(({ slot }) => slotKey(slot) === slotKey(mark))?.readings ?? [];
  return readings.flatMap(({ status, value }) => (status === "accepted" && "value" in value ? [value.value as number] : []));
}

function projection(): unknown[] {
  return ["placed_events", "slots", "readings"].map((table) => ship.db.$client.prepare(`select * from ${table} order by 1, 2`).all());
}
