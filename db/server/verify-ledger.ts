import { asc, eq } from "drizzle-orm";
import { chainHead, type LedgerEntry } from "@/lib/ledger/hash-chain";
import { sha256Hex } from "@/lib/ledger/sha256";
import type { LedgerFault } from "@/lib/report/ledger-words";
import { events } from "../schema/events";
import { isSignatureGood } from "./admission-facts";
import type { Database } from "./connection";
import { deviceById } from "./devices";
import type { StoredEvent } from "./event-store";
import { chainsKept, ledgerOf } from "./ledger-entries";

export type ChainFound = {
  /** the test; null: the server's own chain */
  readonly chain: string | null;
  readonly entries: number;
  readonly events: number;
  readonly head: string;
  /** the first entry that does not fit; null: all do */
  readonly fault: LedgerFault | null;
};

export type LedgerFound = { readonly chains: readonly ChainFound[]; readonly notEntered: readonly LedgerFault[] };

/** Recomputes every chain, the hash of every event's bytes and every signature, and looks for events that no entry speaks of. */
export function verifiedLedger(db: Database): LedgerFound {
  const stored = new Map(storedEvents(db).map((event) => [event.serverSeq, event]));
  const chains = chainsKept(db).map((chain) => ({ chain, entries: ledgerOf(db, chain) }));
  const entered = new Set(chains.flatMap(({ entries }) => entries.flatMap((entry) => serverSeqOf(entry) ?? [])));
  const missed = [...stored.keys()].filter((serverSeq) => !entered.has(serverSeq));
  return {
    chains: chains.map(({ chain, entries }) => chainFound(db, chain, entries, stored)),
    notEntered: missed.map((serverSeq) => ({ type: "EventNotEntered", seq: null, serverSeq })),
  };
}

/** One test's chain, its events' bytes and signatures. */
export function verifiedChain(db: Database, test: string): ChainFound {
  const ofTest = db.select().from(events).where(eq(events.test, test)).all();
  return chainFound(db, test, ledgerOf(db, test), new Map(ofTest.map((event) => [event.serverSeq, event])));
}

/** Whether nothing at all is wrong. */
export function isLedgerKept({ chains, notEntered }: LedgerFound): boolean {
  return notEntered.length === 0 && chains.every(({ fault }) => fault === null);
}

function storedEvents(db: Database): StoredEvent[] {
  return db.select().from(events).orderBy(asc(events.serverSeq)).all();
}

type Stored = ReadonlyMap<number, StoredEvent>;

function chainFound(db: Database, chain: string | null, entries: readonly LedgerEntry[], stored: Stored): ChainFound {
  const fitting = chainHead(entries);
  const faults = entries.flatMap((entry) => eventFault(db, entry, stored) ?? []);
  const all = [...(fitting.ok ? [] : [fitting.refusal]), ...faults].sort((a, b) => (a.seq ?? 0) - (b.seq ?? 0));
  return {
    chain,
    entries: entries.length,
    events: entries.filter((entry) => serverSeqOf(entry) !== null).length,
    head: entries.at(-1)?.hash ?? "",
    fault: all[0] ?? null,
  };
}

function eventFault(db: Database, entry: LedgerEntry, stored: Stored): LedgerFault | null {
  const serverSeq = serverSeqOf(entry);
  if (serverSeq === null) return null;
  const event = stored.get(serverSeq);
  const at = { seq: entry.seq, serverSeq };
  if (!event) return { type: "EventMissing", ...at };
  if (sha256Hex(event.body) !== entry.contentHash) return { type: "EventChanged", ...at };
  const isBad = event.outcome !== "quarantined" && isSignatureGood(deviceById(db, event.device), event) === false;
  return isBad ? { type: "SignatureBad", ...at } : null;
}

/** The event that an entry stands for; null: it stands for none. */
function serverSeqOf({ after, contentHash }: LedgerEntry): number | null {
  if (contentHash === null || typeof after !== "object" || after === null || !("serverSeq" in after)) return null;
  return typeof after.serverSeq === "number" ? after.serverSeq : null;
}
