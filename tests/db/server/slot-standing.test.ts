import { expect, test } from "vitest";
import { placedEvents } from "@/db/schema/readings";
import { storeEvent } from "@/db/server/event-store";
import { standing } from "@/db/server/slot-standing";
import { sha256Hex } from "@/lib/ledger/sha256";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { idOf, Phone } from "./phone";
import { at, personWith, yard } from "./yard";

const mark: Slot = { kind: "draft", mark: "AP", round: "before" };

test("one place of the plan may hold more readings than one statement has room for", () => {
  const { db, test: id } = yard();
  const phone = new Phone(db, id, personWith({ db, test: id }, "lead").id);
  const count = 2500;
  for (let serverSeq = 1; serverSeq <= count; serverSeq++) {
    const event = phone.reads(mark, { value: 3.381 });
    const received = { serverSeq, device: phone.device, seq: serverSeq, test: id, sentBy: phone.person, receivedAt: at };
    const judged = { type: "record", basis: null, outcome: "applied", code: null, message: null } as const;
    storeEvent(db, { ...event, ...received, ...judged, id: idOf(event), bodyHash: sha256Hex(event.body) });
    db.insert(placedEvents)
      .values({ event: idOf(event), serverSeq, test: id, type: "record", slotKey: slotKey(mark) })
      .run();
  }
  expect(standing(db, id, mark).readings).toHaveLength(count);
  expect(db.$client.prepare("select count(*) from readings where slot_key = ?").pluck().get(slotKey(mark))).toBe(count);
});
