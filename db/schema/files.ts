import { integer, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { accounts } from "./accounts";
import { tests } from "./tests";

/** A photograph or certificate, kept by the hash of its content; `of` names the reading, weight or hydrometer it shows. */
export const files = sqliteTable(
  "files",
  {
    sha256: text("sha256").notNull(),
    test: text("test")
      .notNull()
      .references(() => tests.id),
    of: text("of_what").notNull(),
    type: text("type").notNull(),
    size: integer("size").notNull(),
    name: text("name"),
    addedAt: text("added_at").notNull(),
    addedBy: text("added_by").references(() => accounts.id),
  },
  (table) => [primaryKey({ columns: [table.sha256, table.test, table.of] })],
);
