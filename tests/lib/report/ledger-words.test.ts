import { expect, test } from "vitest";
import { ledgerActName, ledgerFaultClause } from "@/lib/report/ledger-words";

test("names the entry in every fault, and the event that has none", () => {
  const at = { seq: 12, serverSeq: 40 };
  const faults = [
    { type: "ChainOutOfOrder", seq: 12, expected: 11 },
    { type: "ChainBroken", seq: 12, previous: "a", expected: "b" },
    { type: "EntryChanged", seq: 12, hash: "a", recomputed: "b" },
    { type: "EventMissing", ...at },
    { type: "EventChanged", ...at },
    { type: "SignatureBad", ...at },
  ] as const;
  for (const fault of faults) expect(ledgerFaultClause(fault)).toMatch(/^entry 12 /);
  expect(new Set(faults.map(ledgerFaultClause)).size).toBe(faults.length);
  expect(ledgerFaultClause({ type: "EventNotEntered", seq: null, serverSeq: 40 })).toBe("event 40 has no entry in any chain");
});

test("names an act without words of its own as it is written", () => {
  expect(ledgerActName("move.open")).toBe("Move opened");
  expect(ledgerActName("something.new")).toBe("something.new");
});
