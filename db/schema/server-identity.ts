import { sql } from "drizzle-orm";
import { check, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";

/** Who this server is. Phones compare the epoch: a new one means that the server was restored and knows less than before. */
export const serverIdentity = sqliteTable(
  "server_identity",
  {
    only: integer("only").primaryKey(),
    id: text("id").notNull(),
    epoch: text("epoch").notNull(),
    createdAt: text("created_at").notNull(),
    lastOpenedAt: text("last_opened_at").notNull(),
  },
  (table) => [check("server_identity_one_row", sql`${table.only} = 1`)],
);
