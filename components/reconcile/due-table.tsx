import type { LeadActs } from "@/components/control/lead-acts";
import { SlotCell } from "@/components/control/slot-cell";
import { slotInWords } from "@/components/control/slot-in-words";
import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Disclosure } from "@/components/ui/disclosure";
import type { ReadingDue } from "@/lib/sync/live";
import { ReadingHistory } from "./reading-history";

type DueTableProps = { due: readonly ReadingDue[]; acts: LeadActs | null };

/** A row for each reading due: what stands, who read it, and folded under it everything that was ever said of it. */
export function DueTable({ due, acts }: DueTableProps) {
  if (due.length === 0) return <p>None.</p>;
  return (
    <DataTable caption="Readings due and what was read" className="min-w-[40rem]">
      <thead>
        <tr>
          <ColumnHead>Reading due</ColumnHead>
          <ColumnHead className="w-64">What stands</ColumnHead>
          <ColumnHead>Who</ColumnHead>
          <ColumnHead className="w-2/5">History</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {due.map((each) => (
          <tr key={each.slotKey} className="align-top">
            <RowHead className="font-normal first-letter:uppercase">{slotInWords(each.slot)}</RowHead>
            <Cell>
              <SlotCell due={each} isOpen={false} />
            </Cell>
            <Cell>{[...new Set(each.readings.map(({ author }) => author))].join(", ")}</Cell>
            <Cell>
              {each.readings.length > 0 ? (
                <Disclosure title={each.readings.length === 1 ? "1 reading" : `${each.readings.length} readings`}>
                  <ReadingHistory due={each} acts={acts} />
                </Disclosure>
              ) : null}
            </Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
