import { integer, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";

/** The audit trail: one chain per test and one for the server (`chain` = test id, or "server"). Only ever added to. */
export const ledgerEntries = sqliteTable(
  "ledger_entries",
  {
    id: integer("id").primaryKey({ autoIncrement: true }),
    chain: text("chain").notNull(),
    seq: integer("seq").notNull(),
    test: text("test"),
    at: text("at").notNull(),
    who: text("who"),
    role: text("role"),
    device: text("device"),
    what: text("what").notNull(),
    before: text("before", { mode: "json" }),
    after: text("after", { mode: "json" }),
    reason: text("reason"),
    capturedAt: text("captured_at"),
    contentHash: text("content_hash"),
    previous: text("previous").notNull(),
    hash: text("hash").notNull(),
  },
  (table) => [uniqueIndex("ledger_chain_seq").on(table.chain, table.seq)],
);
