import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { BATCH_BYTES, BATCH_EVENTS } from "@/lib/sync/batch-limits";
import { envelopeHash } from "@/lib/sync/envelope-hash";
import {
  afterAnswer,
  afterBackup,
  afterComparison,
  afterSilence,
  type EventState,
  isUnsent,
  nextBatch,
  type QueuedEvent,
  queueCount,
} from "@/lib/sync/outbox";
import type { Outcome, Receipt, SyncAnswer } from "@/lib/sync/protocol";
import { idOf, testId } from "./sample-acts";

const states: readonly EventState[] = ["saved", "sending", "on-server", "confirmed", "quarantined"];

function held(seq: number, state: EventState = "saved", body = `{"seq":${seq}}`): QueuedEvent {
  return { id: idOf(seq), seq, state, envelope: { body, signature: null } };
}

const numbers = (from: number, to: number) => Array.from({ length: to - from + 1 }, (_, i) => from + i);
const seqs = (events: readonly QueuedEvent[]) => events.map(({ seq }) => seq);
/** As they travel: a comma after each but the last, and one bracket that is not counted. */
const bytesOf = (events: readonly QueuedEvent[]) => Buffer.byteLength(JSON.stringify(events.map(({ envelope }) => envelope))) - 1;
const saved = (seq: number) => ({ id: idOf(seq), state: "saved", receipt: null });

function receipt(seq: number, outcome: Outcome = "applied"): Receipt {
  return { id: idOf(seq), outcome, serverSeq: 400 + seq };
}

function answer(results: readonly Receipt[], device: SyncAnswer["device"] = { highestSeq: 99, missing: [] }): SyncAnswer {
  const server = { id: testId, epoch: testId, time: "2026-05-04T10:00:00.000Z" };
  // what was sent came whole: the batch is numbered from 1
  const received = [1, 2, 3].map((seq) => envelopeHash(held(seq).envelope));
  return { server, results: [...results], received, device, confirmedTo: 0, ledgerHead: null };
}

describe("the next batch", () => {
  it("is what no server has answered for, oldest number first", () => {
    const queue = [held(5), held(2, "sending"), held(1, "on-server"), held(4, "quarantined"), held(3, "confirmed")];
    expect(seqs(nextBatch(queue))).toEqual([2, 5]);
    expect(nextBatch([])).toEqual([]);
  });

  it("is at most fifty events", () => {
    expect(seqs(nextBatch(numbers(1, 120).map((seq) => held(seq))))).toEqual(numbers(1, 50));
  });

  it("is at most 256 KB as it travels", () => {
    const large = numbers(1, 10).map((seq) => held(seq, "saved", "x".repeat(60_000)));
    expect(seqs(nextBatch(large))).toEqual([1, 2, 3, 4]);
  });

  it("counts letters of other scripts by their bytes, and the marks that JSON puts before quotes", () => {
    expect(seqs(nextBatch(numbers(1, 10).map((seq) => held(seq, "saved", "左".repeat(20_000)))))).toEqual([1, 2, 3, 4]);
    expect(seqs(nextBatch(numbers(1, 10).map((seq) => held(seq, "saved", '"'.repeat(30_000)))))).toEqual([1, 2, 3, 4]);
  });

  it("is one event, however large it is: it would wait for ever otherwise", () => {
    expect(seqs(nextBatch([held(1, "saved", "x".repeat(300_000)), held(2)]))).toEqual([1]);
  });

  it("for any queue keeps both limits, leaves nothing out in between and takes as much as it may", () => {
    const anyEvent = fc.record({
      state: fc.constantFrom(...states),
      body: fc
        .tuple(fc.constantFrom("x", "é", "左", '"', "🚢"), fc.integer({ min: 2000, max: 20_000 }))
        .map(([letter, times]) => letter.repeat(times)),
    });
    fc.assert(
      fc.property(fc.array(anyEvent, { minLength: 10, maxLength: 70 }), (drawn) => {
        const queue = drawn.map(({ state, body }, i) => held(i + 1, state, body));
        const batch = nextBatch(queue.toReversed());
        const unsent = queue.filter(isUnsent);
        expect(batch).toEqual(unsent.slice(0, batch.length));
        expect(batch.length).toBeLessThanOrEqual(BATCH_EVENTS);
        expect(batch.length > 1 ? bytesOf(batch) : 0).toBeLessThanOrEqual(BATCH_BYTES);
        const isFull = batch.length === BATCH_EVENTS || batch.length === unsent.length;
        expect(isFull ? BATCH_BYTES + 1 : bytesOf(unsent.slice(0, batch.length + 1))).toBeGreaterThan(BATCH_BYTES);
      }),
      { numRuns: 50 },
    );
  });
});

describe("after an answer", () => {
  it.each<[Outcome, EventState]>([
    ["applied", "on-server"],
    ["duplicate", "on-server"],
    ["disagrees", "on-server"],
    ["deferred", "on-server"],
    ["quarantined", "quarantined"],
  ])("an event that was %s is %s, with its receipt", (outcome, state) => {
    expect(afterAnswer([held(1, "sending")], answer([receipt(1, outcome)]))).toEqual([
      { id: idOf(1), state, receipt: receipt(1, outcome) },
    ]);
  });

  it("an event without a receipt of its own is saved here, as if nothing had been heard", () => {
    const batch = [held(1, "sending"), held(2, "sending"), held(3, "sending")];
    expect(afterAnswer(batch, answer([receipt(1)])).slice(1)).toEqual([saved(2), saved(3)]);
    expect(afterAnswer(batch, answer([receipt(2), receipt(1), receipt(3)]))).toEqual([
      saved(1),
      saved(2),
      { id: idOf(3), state: "on-server", receipt: receipt(3) },
    ]);
  });

  it("an event whose id the server could not read is told by its place", () => {
    const unreadable: Receipt = { id: null, outcome: "quarantined", serverSeq: 9, code: "malformed-body" };
    expect(afterAnswer([held(1, "sending")], answer([unreadable]))).toEqual([{ id: idOf(1), state: "quarantined", receipt: unreadable }]);
  });

  it("an event that broke on its way is saved here, whatever its receipt says", () => {
    const broken = { ...answer([receipt(1, "quarantined"), receipt(2)]), received: [envelopeHash({ body: "{]", signature: null })] };
    expect(afterAnswer([held(1, "sending"), held(2, "sending")], broken)).toEqual([saved(1), saved(2)]);
  });

  it("receipts of events that were not sent change nothing", () => {
    expect(afterAnswer([], answer([receipt(1)]))).toEqual([]);
  });
});

describe("after silence", () => {
  it("what was being sent is saved here, and nothing else changes", () => {
    expect(afterSilence(states.map((state, i) => held(i + 1, state)))).toEqual([saved(2)]);
  });
});

describe("after the server has told what it holds", () => {
  it("what it lists as missing or has never come to is sent again, whatever it once was", () => {
    const queue = [held(1, "confirmed"), held(2, "on-server"), held(3, "quarantined"), held(4, "confirmed"), held(5, "on-server")];
    expect(afterComparison(queue, { highestSeq: 3, missing: [2, 3] }, true)).toEqual([saved(2), saved(3), saved(4), saved(5)]);
    expect(afterComparison(queue, { highestSeq: 0, missing: [] }, true)).toHaveLength(5);
  });

  it("what it has set aside is sent again only to a server that was restored", () => {
    const queue = [held(1, "on-server"), held(2, "quarantined")];
    expect(afterComparison(queue, { highestSeq: 0, missing: [] }, false)).toEqual([saved(1)]);
    expect(afterComparison(queue, { highestSeq: 0, missing: [] }, true)).toEqual([saved(1), saved(2)]);
  });

  it("nothing is sent again that it has, and nothing that was not sent yet", () => {
    const queue = [held(1, "on-server"), held(2, "saved"), held(3, "sending")];
    expect(afterComparison(queue, { highestSeq: 1, missing: [] }, true)).toEqual([]);
  });

  it("for any loss, what it still has and what it is sent again are all that it had", () => {
    fc.assert(
      fc.property(fc.subarray(numbers(1, 30)), (kept) => {
        const queue = numbers(1, 30).map((seq) => held(seq, "on-server"));
        const highestSeq = Math.max(0, ...kept);
        const missing = numbers(1, highestSeq).filter((seq) => !kept.includes(seq));
        const again = afterComparison(queue, { highestSeq, missing }, true).map(({ id }) => Number(id.slice(-12)));
        expect([...kept, ...again].sort((a, b) => a - b)).toEqual(numbers(1, 30));
      }),
    );
  });
});

describe("after a backup", () => {
  const answered = (seq: number, state: EventState) => ({ ...held(seq, state), receipt: receipt(seq) });

  it("what the server took in up to that number is confirmed, and nothing after it", () => {
    const queue = [1, 2, 3].map((seq) => answered(seq, "on-server"));
    expect(afterBackup(queue, 402)).toEqual([1, 2].map((seq) => ({ id: idOf(seq), state: "confirmed", receipt: null })));
    expect(afterBackup(queue, 0)).toEqual([]);
  });

  it("what is on its way, set aside, or without a receipt is not", () => {
    const queue = states.map((state, i) => answered(i + 1, state)).filter(({ state }) => state !== "on-server");
    expect(afterBackup([...queue, { ...held(9, "on-server"), receipt: null }], 999)).toEqual([]);
  });
});

describe("the count of a queue", () => {
  it("tells what is here only, on the server, backed up, and set aside there", () => {
    expect(queueCount(states.map((state, i) => held(i + 1, state)))).toEqual({ unsent: 2, onServer: 2, confirmed: 1, quarantined: 1 });
    expect(queueCount([])).toEqual({ unsent: 0, onServer: 0, confirmed: 0, quarantined: 0 });
  });
});
