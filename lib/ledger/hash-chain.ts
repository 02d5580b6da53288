import { answer, type Result, refuse } from "@/lib/result";
import { canonicalJson } from "./canonical-json";
import { sha256Hex } from "./sha256";

/** What the ledger says of one act: who, in which role, with what, when, and what stood before and after. */
export type LedgerMatter = {
  /** the test whose chain it is; null: the server's own chain */
  readonly test: string | null;
  /** when it was written here */
  readonly at: string;
  readonly who: string | null;
  readonly role: string | null;
  readonly device: string | null;
  readonly what: string;
  readonly before: unknown;
  readonly after: unknown;
  readonly reason: string | null;
  readonly capturedAt: string | null;
  /** SHA-256 of the event's exact bytes, where the entry stands for one */
  readonly contentHash: string | null;
};

export type LedgerEntry = LedgerMatter & { readonly seq: number; readonly previous: string; readonly hash: string };

export type ChainRefusal =
  | { readonly type: "ChainOutOfOrder"; readonly seq: number; readonly expected: number }
  | { readonly type: "ChainBroken"; readonly seq: number; readonly previous: string; readonly expected: string }
  | { readonly type: "EntryChanged"; readonly seq: number; readonly hash: string; readonly recomputed: string };

/** The head of a chain that has no entry yet. */
export const GENESIS = "0".repeat(64);

/** The next entry of a chain: its hash is over everything it says and over the hash before it. */
export function chained(matter: LedgerMatter, last: { seq: number; hash: string } | null): LedgerEntry {
  const seq = (last?.seq ?? 0) + 1;
  const previous = last?.hash ?? GENESIS;
  return { ...matter, seq, previous, hash: entryHash({ ...matter, seq, previous }) };
}

/**
 * The head of a whole chain, or the first entry that does not fit and why.
 *
 * Refused: a number out of order, a link to another hash than the entry before has, a content that its hash does not match.
 */
export function chainHead(entries: Iterable<LedgerEntry>): Result<{ seq: number; hash: string }, ChainRefusal> {
  let head = { seq: 0, hash: GENESIS };
  for (const entry of entries) {
    const refusal = misfit(entry, head);
    if (refusal) return refuse(refusal);
    head = { seq: entry.seq, hash: entry.hash };
  }
  return answer(head);
}

function misfit(entry: LedgerEntry, head: { seq: number; hash: string }): ChainRefusal | null {
  const { seq, previous, hash } = entry;
  if (seq !== head.seq + 1) return { type: "ChainOutOfOrder", seq, expected: head.seq + 1 };
  if (previous !== head.hash) return { type: "ChainBroken", seq, previous, expected: head.hash };
  const recomputed = entryHash(entry);
  return hash === recomputed ? null : { type: "EntryChanged", seq, hash, recomputed };
}

function entryHash(entry: Omit<LedgerEntry, "hash">): string {
  const { seq, previous, test, at, who, role, device, what, before, after, reason, capturedAt, contentHash } = entry;
  return sha256Hex(canonicalJson({ seq, previous, test, at, who, role, device, what, before, after, reason, capturedAt, contentHash }));
}
