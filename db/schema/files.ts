import { index, integer, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
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

/** Which event names which photograph; written with the event. Its bytes lie in the folder of files, once they have come. */
export const eventPhotographs = sqliteTable(
  "event_photographs",
  {
    sha256: text("sha256").notNull(),
    serverSeq: integer("server_seq").notNull(),
    event: text("event").notNull(),
    test: text("test").notNull(),
    author: text("author").notNull(),
  },
  (table) => [primaryKey({ columns: [table.sha256, table.serverSeq] }), index("event_photographs_event").on(table.test, table.event)],
);
