import { expect, it } from "vitest";
import { type RestoreFault, restoreFaultSentence } from "@/lib/report/restore-words";

it.each<[RestoreFault, string]>([
  [{ type: "CopyMissing", file: "a.db" }, "There is no file a.db."],
  [{ type: "CopyOfSomethingElse", file: "a.db" }, "a.db is no copy of this program's database."],
  [{ type: "ServerRuns" }, "The database is in use: stop the server first."],
  [{ type: "RestoreFailed", message: "no space left" }, "The copy could not be put in place: no space left."],
  [{ type: "CopyDamaged", found: "row 3 missing from index events_id" }, "The copy is damaged: row 3 missing from index events_id."],
  [
    { type: "CopyLedgerBroken", fault: { type: "EventMissing", seq: 7, serverSeq: 40 } },
    "The ledger in the copy does not fit: entry 7 speaks of event 40, which is gone.",
  ],
])("$type is said in one sentence", (fault, sentence) => {
  expect(restoreFaultSentence(fault)).toBe(sentence);
});
