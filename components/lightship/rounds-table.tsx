import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Quantity } from "@/components/ui/quantity";
import type { RoundResult } from "@/lib/lightship/inclining-result";
import { roundFigures } from "@/lib/report/waterline-lines";

/** How she floated before the moves and after them, each round fitted apart. */
export function RoundsTable({ before, after }: { before: RoundResult; after: RoundResult }) {
  return (
    <DataTable caption="Before and after the moves" showCaption>
      <thead>
        <tr>
          <ColumnHead>Waterline</ColumnHead>
          <ColumnHead figure>Before</ColumnHead>
          <ColumnHead figure>After</ColumnHead>
          <ColumnHead figure>Change</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {roundFigures.map(({ key, name, unit, decimals, signed }) => (
          <tr key={key}>
            <RowHead className="font-normal">{name}</RowHead>
            <Cell figure>
              <Quantity value={before[key]} unit={unit} decimals={decimals} signed={signed} />
            </Cell>
            <Cell figure>
              <Quantity value={after[key]} unit={unit} decimals={decimals} signed={signed} />
            </Cell>
            <Cell figure>
              <Quantity value={after[key] - before[key]} unit={unit} decimals={decimals} signed />
            </Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
