import "server-only";
import path from "node:path";
import SqliteDatabase from "better-sqlite3";
import { type BetterSQLite3Database, drizzle } from "drizzle-orm/better-sqlite3";
import { migrate } from "drizzle-orm/better-sqlite3/migrator";
import { databaseFile, makePrivateFile } from "./data-folder";
import { keepingStatements } from "./kept-statements";
import { noteOpening } from "./server-identity";

/** One open database; `$client` is the plain SQLite handle for prepared statements. */
export type Database = BetterSQLite3Database<Record<string, never>> & { $client: SqliteDatabase.Database };

/** The application's database, opened and migrated at the first call. */
export function database(): Database {
  if (process.env.NEXT_PHASE === "phase-production-build") throw new Error("the database is not opened while the application is built");
  // Next loads this module once per bundle: the handle must outlive the module
  const shared = globalThis as { battenbookDatabase?: Database };
  shared.battenbookDatabase ??= openDatabase(databaseFile());
  return shared.battenbookDatabase;
}

/** Opens a database file (or ":memory:") with its migrations applied; every commit is on the disk before it is called one. */
export function openDatabase(file: string): Database {
  if (file !== ":memory:") makePrivateFile(file);
  const client = new SqliteDatabase(file);
  client.pragma("busy_timeout = 5000");
  client.pragma("journal_mode = WAL");
  client.pragma("foreign_keys = ON");
  client.pragma("synchronous = FULL");
  const db = Object.assign(drizzle({ client: keepingStatements(client) }), { $client: client });
  migrate(db, { migrationsFolder: path.join(process.cwd(), "db/migrations") });
  noteOpening(db);
  assertDurable(client);
  return db;
}

/** Runs the work in one immediate transaction; inside another one it becomes a savepoint. All of it stands, or nothing. */
export function inTransaction<T>(db: Database, work: () => T): T {
  return db.$client.transaction(work).immediate();
}

// the driver may fall back to NORMAL at the first write in WAL: asked after one, not before
function assertDurable(client: SqliteDatabase.Database): void {
  const synchronous = client.pragma("synchronous", { simple: true });
  if (synchronous !== 2) throw new Error(`the database would not wait for the disk (synchronous = ${synchronous}, must be 2)`);
}
