import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { TimeOfDay } from "@/components/ui/time-of-day";
import { ledgerActName } from "@/lib/report/ledger-words";
import { EntryMatter } from "./entry-matter";

export type EntryLine = {
  readonly seq: number;
  readonly at: string;
  readonly name: string | null;
  readonly role: string | null;
  readonly what: string;
  readonly before: unknown;
  readonly after: unknown;
  readonly reason: string | null;
  readonly hash: string;
};

/** Entries one under the other: when, who, what, what it was before and is now, and why. */
export function LedgerTable({ entries }: { entries: readonly EntryLine[] }) {
  return (
    <DataTable caption="Entries of the ledger" className="min-w-[46rem]">
      <thead>
        <tr>
          <ColumnHead figure>No</ColumnHead>
          <ColumnHead>When</ColumnHead>
          <ColumnHead>Who</ColumnHead>
          <ColumnHead>What</ColumnHead>
          <ColumnHead>Matter</ColumnHead>
          <ColumnHead>Hash</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {entries.map((entry) => (
          <tr key={entry.seq} className="align-top">
            <RowHead className="text-right font-mono tabular-nums">{entry.seq}</RowHead>
            <Cell>
              <TimeOfDay at={entry.at} dated />
            </Cell>
            <Cell>
              {entry.name ?? "the server"}
              {entry.role ? <span className="block text-ink-soft text-small">{entry.role}</span> : null}
            </Cell>
            <Cell>{ledgerActName(entry.what)}</Cell>
            <Cell>
              <EntryMatter entry={entry} />
            </Cell>
            <Cell>
              <code className="font-mono text-small" title={entry.hash}>
                {entry.hash.slice(0, 8)}
              </code>
            </Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
