import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import { chained, chainHead, GENESIS, type LedgerEntry, type LedgerMatter } from "@/lib/ledger/hash-chain";
import { sha256Hex } from "@/lib/ledger/sha256";
import { promised } from "@/lib/result";

const matter = (n: number, changes: Partial<LedgerMatter> = {}): LedgerMatter => ({
  test: "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c41",
  at: `2026-05-04T09:${String(n).padStart(2, "0")}:00.000Z`,
  who: "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c42",
  role: "reader",
  device: null,
  what: "record",
  before: null,
  after: { mode: "settled", valuesMm: [100 + n] },
  reason: null,
  capturedAt: null,
  contentHash: null,
  ...changes,
});

function chainOf(matters: readonly LedgerMatter[]): LedgerEntry[] {
  const entries: LedgerEntry[] = [];
  for (const each of matters) entries.push(chained(each, entries.at(-1) ?? null));
  return entries;
}

const numbered = (count: number) => chainOf(Array.from({ length: count }, (_, i) => matter(i + 1)));
const changed = (entries: readonly LedgerEntry[], seq: number, changes: Partial<LedgerEntry>) =>
  entries.map((entry) => (entry.seq === seq ? { ...entry, ...changes } : entry));

/** The entry as somebody would forge it who knows the rule and makes its hash fit again. */
function forged(entry: LedgerEntry, changes: Partial<LedgerEntry>): LedgerEntry {
  const { hash, ...said } = { ...entry, ...changes };
  return { ...said, hash: sha256Hex(canonicalJson(said)) };
}

const chains = fc
  .integer({ min: 2, max: 12 })
  .chain((count) => fc.record({ count: fc.constant(count), seq: fc.integer({ min: 1, max: count }) }));

describe("a chain", () => {
  it("begins at nothing, and is numbered from 1", () => {
    expect(chainHead([])).toEqual({ ok: true, value: { seq: 0, hash: "0".repeat(64) } });
    expect(numbered(3).map(({ seq }) => seq)).toEqual([1, 2, 3]);
    expect(numbered(1)[0]?.previous).toBe(GENESIS);
  });

  it("fits as it was written, and its head is its last entry's", () => {
    const entries = numbered(5);
    expect(promised(chainHead(entries))).toEqual({ seq: 5, hash: entries[4]?.hash });
  });

  it("has for each hash the SHA-256 of the canonical JSON of all else that the entry says", () => {
    const [, second] = numbered(2);
    const { hash, ...said } = second as LedgerEntry;
    expect(hash).toBe(sha256Hex(canonicalJson(said)));
  });

  it("is the same from the same acts, and another from the first one that differs", () => {
    const one = chainOf([matter(1), matter(2), matter(3)]);
    const other = chainOf([matter(1), matter(2, { reason: "Mistyped" }), matter(3)]);
    expect(one.map(({ hash }, i) => hash === other[i]?.hash)).toEqual([true, false, false]);
  });
});

describe("the first entry that does not fit is named", () => {
  it.each<[keyof LedgerMatter, unknown]>([
    ["test", null],
    ["at", "2026-05-04T09:02:00.001Z"],
    ["who", null],
    ["role", "lead"],
    ["device", "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c43"],
    ["what", "void"],
    ["before", { mode: "settled", valuesMm: [99] }],
    ["after", { mode: "settled", valuesMm: [102.1] }],
    ["reason", ""],
    ["capturedAt", "2026-05-04T09:02:00.000Z"],
    ["contentHash", "0".repeat(64)],
  ])("when its %s was changed", (key, value) => {
    expect(chainHead(changed(numbered(4), 2, { [key]: value }))).toMatchObject({ ok: false, refusal: { type: "EntryChanged", seq: 2 } });
  });

  it("with the hash it should have", () => {
    const entries = numbered(3);
    const refused = chainHead(changed(entries, 2, { hash: "f".repeat(64) }));
    expect(refused).toEqual({
      ok: false,
      refusal: { type: "EntryChanged", seq: 2, hash: "f".repeat(64), recomputed: entries[1]?.hash },
    });
  });

  it("for any change that was made to fit itself: the entry after it, whose link is broken", () => {
    fc.assert(
      fc.property(chains, ({ count, seq }) => {
        const entries = numbered(count).map((entry) => (entry.seq === seq ? forged(entry, { reason: "Forged" }) : entry));
        // the last entry has none after it: only a head kept elsewhere tells
        const found = seq === count ? { ok: true } : { ok: false, refusal: { type: "ChainBroken", seq: seq + 1 } };
        expect(chainHead(entries)).toMatchObject(found);
      }),
    );
  });

  it("for any entry taken out: the one that stood after it, with the number that is missing", () => {
    fc.assert(
      fc.property(chains, ({ count, seq }) => {
        fc.pre(seq < count);
        const entries = numbered(count).filter((entry) => entry.seq !== seq);
        expect(chainHead(entries)).toEqual({ ok: false, refusal: { type: "ChainOutOfOrder", seq: seq + 1, expected: seq } });
      }),
    );
  });

  it("for any two neighbours swapped: the one that came too early", () => {
    fc.assert(
      fc.property(chains, ({ count, seq }) => {
        fc.pre(seq < count);
        const entries = numbered(count);
        const swapped = entries.map((entry, i) => (i === seq - 1 ? entries[seq] : i === seq ? entries[seq - 1] : entry));
        expect(chainHead(swapped as LedgerEntry[])).toEqual({
          ok: false,
          refusal: { type: "ChainOutOfOrder", seq: seq + 1, expected: seq },
        });
      }),
    );
  });

  it("for any entry put in between: the one that stood there before, or the one put in if it leans on the wrong one", () => {
    fc.assert(
      fc.property(chains, ({ count, seq }) => {
        const entries = numbered(count);
        const before = entries[seq - 2] ?? null;
        const leaning = chained(matter(seq, { reason: "Put in" }), before);
        const inserted = [...entries.slice(0, seq - 1), leaning, ...entries.slice(seq - 1)];
        expect(chainHead(inserted)).toEqual({ ok: false, refusal: { type: "ChainOutOfOrder", seq, expected: seq + 1 } });
        const stray = [...entries.slice(0, seq - 1), { ...leaning, previous: "e".repeat(64) }, ...entries.slice(seq)];
        const refusal = { type: "ChainBroken", seq, previous: "e".repeat(64), expected: before?.hash ?? GENESIS };
        expect(chainHead(stray)).toEqual({ ok: false, refusal });
      }),
    );
  });

  it("when a whole tail was written anew, not at all: the head kept elsewhere differs", () => {
    const entries = numbered(4);
    const rewritten = chainOf([matter(1), matter(2), matter(3, { reason: "Written anew" }), matter(4)]);
    expect(promised(chainHead(rewritten)).hash).not.toBe(promised(chainHead(entries)).hash);
  });
});
