import path from "node:path";
import { performance } from "node:perf_hooks";
import { backUp } from "@/db/server/backup";
import { type Database, openDatabase } from "@/db/server/connection";
import { promised } from "@/lib/result";
import { BATCH_EVENTS } from "@/lib/sync/batch-limits";
import { BenchServer, inBatches, percentile, readingsOf } from "./bench-server";

/** What the sync route writes for an event, in an order in which every row finds what it refers to. */
const tables = ["events", "ledger_entries", "placed_events", "slots", "readings"];

/** Events a second by the route, and the rows they became by nothing but inserts into the same tables, each batch one durable commit. */
export async function syncAgainstInserts(count = 3000): Promise<void> {
  const server = new BenchServer();
  try {
    const hand = await server.hand();
    const batches = inBatches(readingsOf(hand, count), BATCH_EVENTS);
    await server.sent(hand, []);
    const empty = openDatabase(path.join(server.copies, promised(await backUp(server.db, server.copies, new Date().toISOString())).file));
    const before = Object.fromEntries(tables.map((table) => [table, lastRow(server.db, table)]));
    const times: number[] = [];
    for (const batch of batches) {
      const start = performance.now();
      await server.sent(hand, batch);
      times.push(performance.now() - start);
    }
    const ours = times.reduce((sum, time) => sum + time, 0);
    const { inserted, rows } = insertedRows(server.db, empty, before, batches.length);
    empty.$client.close();
    console.log(`Sync, ${count} events in batches of ${BATCH_EVENTS}, every batch on the disk (synchronous = FULL)`);
    line("the route: session, checks, signatures, ledger, projection", count, ours);
    line(`nothing but the ${rows} rows that remain of it, inserted`, count, inserted);
    console.log(
      `  ratio ${(ours / inserted).toFixed(1)}; a batch p50 ${percentile(times, 0.5).toFixed(1)} ms, p99 ${percentile(times, 0.99).toFixed(1)} ms`,
    );
  } finally {
    server.remove();
  }
}

function insertedRows(from: Database, into: Database, after: Record<string, number>, commits: number): { inserted: number; rows: number } {
  const work = tables.map((table) => {
    const rows = from.$client.prepare(`select * from ${table} where rowid > ?`).all(after[table]) as Record<string, unknown>[];
    const columns = Object.keys(rows[0] ?? {});
    const insert = into.$client.prepare(
      `insert into ${table} (${columns.map((name) => `"${name}"`).join()}) values (${columns.map(() => "?").join()})`,
    );
    return {
      insert,
      shares: inBatches(
        rows.map((row) => columns.map((name) => row[name])),
        Math.ceil(rows.length / commits),
      ),
    };
  });
  const commit = into.$client.transaction((i: number) => {
    for (const { insert, shares } of work) for (const row of shares[i] ?? []) insert.run(row);
  });
  if (into.$client.pragma("synchronous", { simple: true }) !== 2) throw new Error("the inserts are not as durable as the route");
  into.$client.pragma("foreign_keys = OFF");
  const start = performance.now();
  for (let i = 0; i < commits; i++) commit.immediate(i);
  return { inserted: performance.now() - start, rows: work.reduce((sum, { shares }) => sum + shares.flat().length, 0) };
}

function lastRow(db: Database, table: string): number {
  return Number(db.$client.prepare(`select coalesce(max(rowid), 0) from ${table}`).pluck().get());
}

function line(name: string, count: number, ms: number): void {
  console.log(
    `  ${name.padEnd(62)} ${Math.round((1000 * count) / ms)
      .toString()
      .padStart(7)} events/s`,
  );
}
