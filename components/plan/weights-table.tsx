import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Quantity } from "@/components/ui/quantity";
import type { TestRecord } from "@/lib/record/test-record";

/** What is shifted, from where at the start, and by which paper it is known. */
export function WeightsTable({ record: { weights, moves } }: { record: TestRecord }) {
  const zero = moves.find(({ no }) => no === 0);
  if (weights.length === 0) return <p>No weight yet.</p>;
  return (
    <DataTable caption="Weights">
      <thead>
        <tr>
          <ColumnHead>Weight</ColumnHead>
          <ColumnHead figure>Mass</ColumnHead>
          <ColumnHead figure>Athwart at move 0</ColumnHead>
          <ColumnHead>Certificate</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {weights.map(({ id, mass, certificate }) => (
          <tr key={id}>
            <RowHead>{id}</RowHead>
            <Cell figure>
              <Quantity value={mass} unit="t" decimals={3} />
            </Cell>
            <Cell figure>
              <Quantity value={zero?.positions[id]?.[1] ?? null} unit="m" decimals={2} signed />
            </Cell>
            <Cell>{certificate ?? "none named"}</Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
