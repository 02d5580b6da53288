import { index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";
import type { Outcome, QuarantineCode } from "@/lib/sync/protocol";

/**
 * Everything that was ever sent, byte for byte, with the receipt it got; triggers refuse every change.
 * What could not be read has no id, number or test of its own and is kept by its text.
 */
export const events = sqliteTable(
  "events",
  {
    serverSeq: integer("server_seq").primaryKey({ autoIncrement: true }),
    id: text("id"),
    device: text("device").notNull(),
    seq: integer("seq"),
    test: text("test"),
    type: text("type"),
    /** the act it stands on, or that it lets in */
    basis: text("basis"),
    body: text("body").notNull(),
    bodyHash: text("body_hash").notNull(),
    signature: text("signature"),
    /** account that sent it, which need not be its author */
    sentBy: text("sent_by").notNull(),
    receivedAt: text("received_at").notNull(),
    outcome: text("outcome").$type<Outcome>().notNull(),
    code: text("code").$type<QuarantineCode>(),
    message: text("message"),
  },
  (table) => [
    index("events_id").on(table.id),
    index("events_basis").on(table.basis),
    index("events_body_hash").on(table.bodyHash),
    index("events_device_seq").on(table.device, table.seq),
    index("events_test").on(table.test, table.type),
  ],
);
