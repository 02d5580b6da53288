import { database } from "../connection";
import { testById } from "../tests";
import { type ChainFound, isLedgerKept, type LedgerFault, verifiedLedger } from "../verify-ledger";

/** Says of every chain whether it still fits, and names the first entry that does not; exit code 1 where one doesn't. */
const db = database();
const found = verifiedLedger(db);
for (const chain of found.chains) console.log(lineOf(chain));
for (const fault of found.notEntered) console.log(sentenceOf(fault));
db.$client.close();
if (!isLedgerKept(found)) process.exitCode = 1;

function lineOf({ chain, entries, events, head, fault }: ChainFound): string {
  const named = chain === null ? "Server" : (testById(db, chain)?.title ?? chain);
  const told = `${named}: ${entries} entries, ${events} of them events, head ${head}`;
  return fault === null ? `${told}: whole` : `${told}\n  does not fit: ${sentenceOf(fault)}`;
}

function sentenceOf(fault: LedgerFault): string {
  switch (fault.type) {
    case "ChainOutOfOrder":
      return `entry ${fault.seq} stands where entry ${fault.expected} is due`;
    case "ChainBroken":
      return `entry ${fault.seq} does not follow on the entry before it`;
    case "EntryChanged":
      return `entry ${fault.seq} is not what was written`;
    case "EventMissing":
      return `entry ${fault.seq} speaks of event ${fault.serverSeq}, which is gone`;
    case "EventChanged":
      return `entry ${fault.seq} speaks of event ${fault.serverSeq}, whose text is another now`;
    case "SignatureBad":
      return `entry ${fault.seq} speaks of event ${fault.serverSeq}, whose signature does not fit its phone's key`;
    case "EventNotEntered":
      return `event ${fault.serverSeq} has no entry in any chain`;
  }
}
