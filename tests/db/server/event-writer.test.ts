import { expect, test } from "vitest";
import { EventWriter, noReading } from "@/db/server/event-writer";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import { eventBodySchema } from "@/lib/sync/event";

const from = { device: crypto.randomUUID(), test: crypto.randomUUID(), jobTag: "tag" };
const opened = () => ({
  type: "move.open" as const,
  ...noReading,
  id: crypto.randomUUID(),
  author: crypto.randomUUID(),
  capturedAt: "2026-05-04T09:00:00.000Z",
  clockOffsetMs: null,
  reason: null,
  payload: { move: 1, repeat: 1 },
});

test("numbers the acts of a device from 1, each in its canonical text", () => {
  const writer = new EventWriter(from);
  const bodies = [1, 2, 3].map(() => writer.written(opened()).body);
  const events = bodies.map((body) => eventBodySchema.parse(JSON.parse(body)));
  expect(events.map(({ seq }) => seq)).toEqual([1, 2, 3]);
  expect(events.map(({ device }) => device)).toEqual([from.device, from.device, from.device]);
  for (const body of bodies) expect(canonicalJson(JSON.parse(body))).toBe(body);
});

test("signs exactly the text it sends, and leaves a device without a key unsigned", () => {
  const signed = new EventWriter(from, (body) => `signed ${body}`).written(opened());
  expect(signed.signature).toBe(`signed ${signed.body}`);
  expect(new EventWriter(from).written(opened()).signature).toBeNull();
});
