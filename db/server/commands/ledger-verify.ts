import { ledgerFaultClause } from "@/lib/report/ledger-words";
import { database } from "../connection";
import { testById } from "../tests";
import { type ChainFound, isLedgerKept, verifiedLedger } from "../verify-ledger";

/** Says of every chain whether it still fits, and names the first entry that does not; exit code 1 where one doesn't. */
const db = database();
const found = verifiedLedger(db);
for (const chain of found.chains) console.log(lineOf(chain));
for (const fault of found.notEntered) console.log(ledgerFaultClause(fault));
db.$client.close();
if (!isLedgerKept(found)) process.exitCode = 1;

function lineOf({ chain, entries, events, head, fault }: ChainFound): string {
  const named = chain === null ? "Server" : (testById(db, chain)?.title ?? chain);
  const told = `${named}: ${entries} entries, ${events} of them events, head ${head}`;
  return fault === null ? `${told}: whole` : `${told}\n  does not fit: ${ledgerFaultClause(fault)}`;
}
