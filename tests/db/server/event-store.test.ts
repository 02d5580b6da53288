import { randomUUID } from "node:crypto";
import { beforeEach, expect, test } from "vitest";
import { receivedFrom } from "@/db/server/event-store";
import type { Envelope } from "@/lib/sync/protocol";
import type { Slot } from "@/lib/sync/slot";
import { Phone } from "./phone";
import { personWith, type Yard, yard } from "./yard";

const mark: Slot = { kind: "draft", mark: "AP", round: "before" };
let ship: Yard;
let phone: Phone;
beforeEach(() => {
  ship = yard();
  phone = new Phone(ship.db, ship.test, personWith(ship, "reader").id);
});

/** The same reading under another number, signed as the phone signs. */
function numbered(seq: number): Envelope {
  const { body } = phone.reads(mark, { value: 3.381 });
  const other = body.replace(/"seq":\d+/, `"seq":${seq}`);
  return { body: other, signature: phone.signed(other) };
}
const received = () => receivedFrom(ship.db, phone.device);

test("a device hears its highest number and those below it that have not come", () => {
  expect(received()).toEqual({ highestSeq: 0, missing: [], received: 0 });
  phone.sends([numbered(2), numbered(5)]);
  expect(received()).toEqual({ highestSeq: 5, missing: [1, 3, 4], received: 2 });
  phone.sends([numbered(3), numbered(1), numbered(4)]);
  expect(received()).toEqual({ highestSeq: 5, missing: [], received: 5 });
  expect(receivedFrom(ship.db, randomUUID())).toEqual({ highestSeq: 0, missing: [], received: 0 });
});

test("of a great many missing numbers it hears the first thousand, however large a number it claims", () => {
  const answer = phone.sends([numbered(Number.MAX_SAFE_INTEGER)]);
  expect(answer.results).toMatchObject([{ outcome: "applied" }]);
  expect(received()).toMatchObject({ highestSeq: Number.MAX_SAFE_INTEGER, received: 1 });
  expect(received().missing).toEqual(Array.from({ length: 1000 }, (_, i) => i + 1));
});
