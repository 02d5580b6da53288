import type SqliteDatabase from "better-sqlite3";

const MOST = 500;

/**
 * The same handle, on which a statement is prepared once: the query builder writes the same few texts for every event, and preparing
 * them was a sixth of the time of a sync.
 */
export function keepingStatements(client: SqliteDatabase.Database): SqliteDatabase.Database {
  const kept = new Map<string, SqliteDatabase.Statement>();
  const prepare = (source: string) => {
    const known = kept.get(source);
    if (known && !known.busy) return asPrepared(known);
    if (kept.size >= MOST) kept.clear();
    const statement = client.prepare(source);
    kept.set(source, statement);
    return statement;
  };
  return Object.create(client, { prepare: { value: prepare } });
}

// whoever used it before may have asked for its rows as lists
function asPrepared(statement: SqliteDatabase.Statement): SqliteDatabase.Statement {
  return statement.reader ? statement.raw(false) : statement;
}
