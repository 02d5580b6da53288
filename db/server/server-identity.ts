import { randomUUID } from "node:crypto";
import { serverIdentity } from "../schema/server-identity";
import type { Database } from "./connection";

export type ServerIdentity = { readonly id: string; readonly epoch: string };

/** Who this server is, as every answer to a phone says it. */
export function identityOf(db: Database): ServerIdentity {
  const row = db.select().from(serverIdentity).get();
  if (!row) throw new Error("the database has no server identity: it was not opened by openDatabase");
  return { id: row.id, epoch: row.epoch };
}

/** Gives a new database its identity, and writes the time of opening. */
export function noteOpening(db: Database): void {
  const now = new Date().toISOString();
  db.insert(serverIdentity)
    .values({ only: 1, id: randomUUID(), epoch: randomUUID(), createdAt: now, lastOpenedAt: now })
    .onConflictDoUpdate({ target: serverIdentity.only, set: { lastOpenedAt: now } })
    .run();
}

/** A restored server knows less than before and must say so: a new epoch makes the phones send again what it lacks. */
export function beginEpoch(db: Database): ServerIdentity {
  db.update(serverIdentity).set({ epoch: randomUUID() }).run();
  return identityOf(db);
}
