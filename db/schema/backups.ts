import { integer, sqliteTable, text } from "drizzle-orm/sqlite-core";

/** The copies made of this database that were found whole. A restored copy knows those made before it, and they hold no more than it does. */
export const backups = sqliteTable("backups", {
  id: integer("id").primaryKey({ autoIncrement: true }),
  at: text("at").notNull(),
  file: text("file").notNull(),
  bytes: integer("bytes").notNull(),
  /** every event up to this number is in the copy */
  serverSeq: integer("server_seq").notNull(),
  /** the last entry of any chain in the copy: with a later one there is something to back up */
  ledgerEntry: integer("ledger_entry").notNull(),
});
