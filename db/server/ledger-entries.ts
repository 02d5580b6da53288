import { and, asc, desc, eq, lt, sql } from "drizzle-orm";
import { chained, GENESIS, type LedgerEntry, type LedgerMatter } from "@/lib/ledger/hash-chain";
import { accounts } from "../schema/accounts";
import { ledgerEntries } from "../schema/ledger";
import type { Act } from "./act";
import type { Database } from "./connection";
import { preparedQuery } from "./prepared-query";

/** What a verb says of its own act; who, when and why come from the act. */
export type Written = Act & {
  readonly what: string;
  readonly role?: string | null;
  readonly before?: unknown;
  readonly after?: unknown;
  readonly capturedAt?: string | null;
  readonly contentHash?: string | null;
};

/** Adds one entry to a test's chain, or to the server's (null). Called inside the transaction of the act itself. */
export function writeEntry(db: Database, test: string | null, written: Written): LedgerEntry {
  const entry = chained(matterOf(test, written), lastOf(db, test));
  db.insert(ledgerEntries)
    .values({ chain: chainOf(test), ...entry })
    .run();
  return entry;
}

/** The hash of the last entry of a chain. */
export function ledgerHead(db: Database, test: string | null): string {
  return lastOf(db, test)?.hash ?? GENESIS;
}

/** A whole chain, first entry first. */
export function ledgerOf(db: Database, test: string | null): LedgerEntry[] {
  const rows = db
    .select()
    .from(ledgerEntries)
    .where(eq(ledgerEntries.chain, chainOf(test)))
    .orderBy(asc(ledgerEntries.seq))
    .all();
  return rows.map(({ id, chain, ...entry }) => entry);
}

/** A stretch of a test's chain, the last entry first, each with the name of who did it. */
export function ledgerPage(
  db: Database,
  test: string,
  before: number | null,
  most: number,
): (LedgerEntry & { readonly name: string | null })[] {
  const ofChain = eq(ledgerEntries.chain, chainOf(test));
  const rows = db
    .select({ entry: ledgerEntries, name: accounts.name })
    .from(ledgerEntries)
    .leftJoin(accounts, eq(accounts.id, ledgerEntries.who))
    .where(before === null ? ofChain : and(ofChain, lt(ledgerEntries.seq, before)))
    .orderBy(desc(ledgerEntries.seq))
    .limit(most)
    .all();
  return rows.map(({ entry: { id, chain, ...entry }, name }) => ({ ...entry, name }));
}

/** The tests that have a chain here. */
export function chainsKept(db: Database): (string | null)[] {
  const rows = db.selectDistinct({ chain: ledgerEntries.chain }).from(ledgerEntries).orderBy(ledgerEntries.chain).all();
  return rows.map(({ chain }) => (chain === chainOf(null) ? null : chain));
}

function lastOf(db: Database, test: string | null): { seq: number; hash: string } | null {
  return lastEntry(db).get({ chain: chainOf(test) }) ?? null;
}

const lastEntry = preparedQuery((db) => {
  const { seq, hash, chain } = ledgerEntries;
  const ofChain = db
    .select({ seq, hash })
    .from(ledgerEntries)
    .where(eq(chain, sql.placeholder("chain")));
  return ofChain.orderBy(desc(seq)).limit(1).prepare();
});

// JSON has no undefined: what a verb does not say stands in the entry as null
function matterOf(test: string | null, written: Written): LedgerMatter {
  return {
    test,
    at: written.at,
    who: written.by,
    role: written.role ?? null,
    device: written.device ?? null,
    what: written.what,
    before: written.before ?? null,
    after: written.after ?? null,
    reason: written.reason ?? null,
    capturedAt: written.capturedAt ?? null,
    contentHash: written.contentHash ?? null,
  };
}

function chainOf(test: string | null): string {
  return test ?? "server";
}
