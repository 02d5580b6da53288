import { describe, expect, it } from "vitest";
import { BATCH_EVENTS } from "@/lib/sync/batch-limits";
import { envelopeSchema, receiptSchema, syncAnswerSchema, syncRequestSchema } from "@/lib/sync/protocol";
import { idOf, phones, testId } from "./sample-acts";

const envelope = { body: "{}", signature: null };
const request = { protocol: 1, device: phones.aft, holds: 3, events: [envelope, { body: "{}", signature: "c2ln" }] };
const receipt = { id: idOf(1), outcome: "applied", serverSeq: 412 };
const answer = {
  server: { id: testId, epoch: testId, time: "2026-05-04T10:00:00.000Z" },
  results: [receipt, { id: null, outcome: "quarantined", serverSeq: 413, code: "malformed-body", message: "The event is not JSON" }],
  received: ["a".repeat(64), "b".repeat(64)],
  device: { highestSeq: 17, missing: [3, 4] },
  confirmedTo: 400,
  ledgerHead: null,
};

describe("what a phone sends", () => {
  it("is read as it was written, an empty batch too: it asks what the server holds", () => {
    expect(syncRequestSchema.parse(JSON.parse(JSON.stringify(request)))).toEqual(request);
    expect(syncRequestSchema.safeParse({ ...request, holds: 0, events: [] }).success).toBe(true);
  });

  it("may be whatever text in an envelope: a body that can't be read is answered for by itself", () => {
    expect(envelopeSchema.safeParse({ body: "no JSON at all", signature: null }).success).toBe(true);
  });

  it.each<[string, object]>([
    ["of another protocol", { protocol: 2 }],
    ["from a phone without a number", { device: "blue phone" }],
    ["that holds less than nothing", { holds: -1 }],
    ["with a word nobody knows", { test: testId }],
    ["of more than fifty events", { events: new Array(BATCH_EVENTS + 1).fill(envelope) }],
    ["with an event larger than 64 KB", { events: [{ body: "x".repeat(64 * 1024 + 1), signature: null }] }],
    ["with an event of nothing", { events: [{ body: "", signature: null }] }],
    ["with an event that does not say whether it is signed", { events: [{ body: "{}" }] }],
  ])("is refused %s", (_, changes) => {
    expect(syncRequestSchema.safeParse(request).success).toBe(true);
    expect(syncRequestSchema.safeParse({ ...request, ...changes }).success).toBe(false);
  });
});

describe("what a phone hears", () => {
  it("is read as it was written", () => {
    expect(syncAnswerSchema.parse(JSON.parse(JSON.stringify(answer)))).toEqual(answer);
  });

  it("may be of an older server, which confirms nothing, or of a newer one, whose further words are left out", () => {
    const { confirmedTo, ...older } = answer;
    expect(syncAnswerSchema.parse(older).confirmedTo).toBe(0);
    const newer = { ...answer, weather: "calm", server: { ...answer.server, name: "Yard" } };
    expect(syncAnswerSchema.parse(newer)).toEqual(answer);
  });

  it.each<[string, object]>([
    ["of a server without a name", { server: { ...answer.server, id: "the yard's" } }],
    ["of a server without an epoch", { server: { id: testId, time: answer.server.time } }],
    ["without receipts", { results: undefined }],
    ["with a receipt of an outcome nobody knows", { results: [{ ...receipt, outcome: "stored" }] }],
    ["with a receipt that has no number", { results: [{ ...receipt, serverSeq: 0 }] }],
    ["that misses an event before the first", { device: { highestSeq: 17, missing: [0] } }],
    ["that says nothing of what the server holds", { device: undefined }],
  ])("is no answer %s", (_, changes) => {
    expect(syncAnswerSchema.safeParse({ ...answer, ...changes }).success).toBe(false);
  });

  it("never has a receipt with a reason that the protocol does not know", () => {
    expect(receiptSchema.safeParse({ ...receipt, outcome: "quarantined", code: "unknown-slot" }).success).toBe(true);
    expect(receiptSchema.safeParse({ ...receipt, outcome: "quarantined", code: "bad-mood" }).success).toBe(false);
  });
});
