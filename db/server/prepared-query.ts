import { getTableColumns, sql } from "drizzle-orm";
import type { SQLiteTable } from "drizzle-orm/sqlite-core";
import type { Database } from "./connection";

/** A query that is built once for each open database: on the way of every event, building took longer than asking. */
export function preparedQuery<Q>(build: (db: Database) => Q): (db: Database) => Q {
  const built = new WeakMap<Database, Q>();
  return (db) => {
    const known = built.get(db);
    if (known !== undefined) return known;
    const query = build(db);
    built.set(db, query);
    return query;
  };
}

/** An insert of whole rows that is built once. */
export function preparedInsert<T extends SQLiteTable>(table: T): (db: Database, row: T["$inferInsert"]) => void {
  const columns = Object.entries(getTableColumns(table));
  // the builder would write the word null there, and not nothing
  const open = columns.find(([, { dataType, notNull }]) => dataType === "json" && !notNull);
  if (open) throw new Error(`${open[0]} may be null and is JSON: such rows are not inserted in this way`);
  const toCome = Object.fromEntries(columns.map(([name]) => [name, sql.placeholder(name)])) as T["$inferInsert"];
  const insert = preparedQuery((db) => db.insert(table).values(toCome).prepare());
  return (db, row) => void insert(db).run(row);
}
