import Link from "next/link";
import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Notice } from "@/components/ui/notice";
import type { Role, TestState } from "@/lib/sync/job-sheet";
import { rolesInWords, stateInWords } from "./test-state";

export type TestLine = {
  readonly id: string;
  readonly title: string;
  readonly vessel: string;
  readonly date: string;
  readonly place: string;
  readonly state: TestState;
  readonly roles: readonly Role[];
};

/** The tests in which a person has a part. */
export function TestsTable({ tests }: { tests: readonly TestLine[] }) {
  if (tests.length === 0) return <Notice title="No tests yet">A test appears here when you are given a part in it.</Notice>;
  return (
    <DataTable caption="Your tests">
      <thead>
        <tr>
          <ColumnHead>Test</ColumnHead>
          <ColumnHead>Vessel</ColumnHead>
          <ColumnHead>Date</ColumnHead>
          <ColumnHead>Place</ColumnHead>
          <ColumnHead>State</ColumnHead>
          <ColumnHead>Your part</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {tests.map((test) => (
          <tr key={test.id}>
            <RowHead>
              <Link
                href={`/tests/${test.id}`}
                prefetch={false}
                className="inline-flex min-h-tap items-center underline decoration-ink-line underline-offset-4 hover:decoration-ink"
              >
                {test.title}
              </Link>
            </RowHead>
            <Cell>{test.vessel}</Cell>
            <Cell className="whitespace-nowrap tabular-nums">{test.date}</Cell>
            <Cell>{test.place}</Cell>
            <Cell>{stateInWords[test.state]}</Cell>
            <Cell>{rolesInWords(test.roles)}</Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
