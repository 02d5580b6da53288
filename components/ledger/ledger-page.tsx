import Link from "next/link";
import { buttonClass } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Sign } from "@/components/ui/sign";
import type { LedgerFault } from "@/lib/report/ledger-words";
import { ledgerFaultClause } from "@/lib/report/ledger-words";
import { type EntryLine, LedgerTable } from "./ledger-table";

type LedgerPageProps = {
  test: string;
  found: { readonly entries: number; readonly events: number; readonly head: string; readonly fault: LedgerFault | null };
  entries: readonly EntryLine[];
  /** the number before which the next stretch begins; null: this was the last */
  earlier: number | null;
};

/** The audit trail of a test, the last entry first, and whether it still fits. */
export function LedgerPage({ test, found, entries, earlier }: LedgerPageProps) {
  return (
    <div className="flex flex-col gap-5">
      {found.fault ? (
        <Notice tone="refused" title="This ledger does not fit">
          From here on nothing in it can be trusted: {ledgerFaultClause(found.fault)}. Keep a copy of the server’s data as it is, and ask
          whoever keeps the server.
        </Notice>
      ) : (
        <p className="flex items-center gap-2">
          <Sign kind="read" />
          <span>
            Whole: {found.entries} entries, {found.events} of them events, every hash and every signature recomputed just now.
          </span>
        </p>
      )}
      <p className="text-small">
        Head of the chain: <code className="break-all font-mono">{found.head}</code>
      </p>
      <LedgerTable entries={entries} />
      {earlier === null ? null : (
        <div>
          <Link href={`/tests/${test}/ledger?before=${earlier}`} prefetch={false} className={buttonClass("plain")}>
            Earlier entries
          </Link>
        </div>
      )}
    </div>
  );
}
