import { envelopeHash } from "@/lib/sync/envelope-hash";
import { type Envelope, type Receipt, type SyncAnswer, syncRequestSchema } from "@/lib/sync/protocol";

type Behaviour = { readonly id?: string; readonly quarantines?: readonly number[]; readonly mostEvents?: number };

/** A server that keeps what it is sent, by the rules of the protocol, and can be restored from an older backup. */
export function simulatedServer({ id = "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c90", quarantines = [], mostEvents = 50 }: Behaviour = {}) {
  const time = "2026-05-04T10:00:00.000Z";
  const stored = new Map<number, string>();
  const batches: number[][] = [];
  const envelopes: Envelope[] = [];
  let confirmedTo = 0;

  const fetch: typeof globalThis.fetch = async (_, init) => {
    const request = syncRequestSchema.parse(JSON.parse(String(init?.body)));
    if (request.events.length > mostEvents) return Response.json({ error: "too large" }, { status: 413 });
    const bodies = request.events.map(({ body }) => JSON.parse(body) as { id: string; seq: number });
    if (bodies.length > 0) batches.push(bodies.map(({ seq }) => seq));
    envelopes.push(...request.events);
    const answer: SyncAnswer = {
      server: { id, epoch: id, time },
      results: bodies.map(taken),
      received: request.events.map(envelopeHash),
      device: known(),
      confirmedTo,
      ledgerHead: null,
    };
    return Response.json(answer);
  };

  function taken(body: { id: string; seq: number }): Receipt {
    const outcome = stored.has(body.seq) ? "duplicate" : quarantines.includes(body.seq) ? "quarantined" : "applied";
    stored.set(body.seq, body.id);
    return { id: body.id, outcome, serverSeq: body.seq };
  }

  function known() {
    const highestSeq = Math.max(0, ...stored.keys());
    const missing = Array.from({ length: highestSeq }, (_, i) => i + 1).filter((seq) => !stored.has(seq));
    return { highestSeq, missing };
  }

  /** Back to an older state: only these numbers are known. */
  function restore(seqs: readonly number[]) {
    for (const seq of [...stored.keys()]) if (!seqs.includes(seq)) stored.delete(seq);
  }

  /** Everything it has is in a backup now. */
  function backUp() {
    confirmedTo = Math.max(0, ...stored.keys());
  }

  return { fetch, time, batches, envelopes, restore, backUp, held: () => [...stored.keys()].sort((a, b) => a - b) };
}
