import { performance } from "node:perf_hooks";
import { isLedgerKept, verifiedLedger } from "@/db/server/verify-ledger";
import { BATCH_EVENTS } from "@/lib/sync/batch-limits";
import type { Envelope } from "@/lib/sync/protocol";
import { BenchServer, type Hand, inBatches, percentile, readingsOf } from "./bench-server";

/** Fifty phones come on deck at once after a day below, each with everything it holds, one batch after the other. */
export async function reconnecting(phones = 50, each = 500): Promise<void> {
  const server = new BenchServer();
  try {
    const hands = await Promise.all(Array.from({ length: phones }, () => server.hand()));
    const held = hands.map((hand, i) => readingsOf(hand, each, i * 37));
    const times: number[] = [];
    const start = performance.now();
    await Promise.all(hands.map((hand, i) => drained(server, hand, held[i] ?? [], times)));
    const seconds = (performance.now() - start) / 1000;
    const sent = phones * each;
    console.log(`${phones} phones with ${each} events each reconnect at once (route handlers in one process)`);
    console.log(`  all ${sent} taken in ${seconds.toFixed(1)} s, ${Math.round(sent / seconds)} events/s`);
    console.log(
      `  a batch of ${BATCH_EVENTS}, with the wait behind the others: p50 ${ms(times, 0.5)}, p99 ${ms(times, 0.99)}, longest ${ms(times, 1)}`,
    );
    console.log(
      `  lost ${sent - heldOnServer(server, held)}, set aside ${setAside(server)}, ledger ${isLedgerKept(verifiedLedger(server.db)) ? "whole" : "BROKEN"}`,
    );
  } finally {
    server.remove();
  }
}

async function drained(server: BenchServer, hand: Hand, held: readonly Envelope[], times: number[]): Promise<void> {
  for (const batch of inBatches(held, BATCH_EVENTS)) {
    const start = performance.now();
    await server.sent(hand, batch);
    times.push(performance.now() - start);
  }
}

function heldOnServer({ db }: BenchServer, held: readonly (readonly Envelope[])[]): number {
  const bodies = new Set(db.$client.prepare("select body from events").pluck().all());
  return held.flat().filter(({ body }) => bodies.has(body)).length;
}

function setAside({ db }: BenchServer): unknown {
  return db.$client.prepare("select count(*) from events where outcome = 'quarantined'").pluck().get();
}

function ms(times: readonly number[], share: number): string {
  return `${percentile(times, share).toFixed(0)} ms`;
}
