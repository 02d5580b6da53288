import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Quantity } from "@/components/ui/quantity";
import type { Defence } from "@/lib/lightship/defended-lightship";
import { causeAdvice, causeName } from "@/lib/report/cause-words";

/** What contributes how much to the interval of KG, the largest first; below it what to measure better. */
export function BudgetTable({ budget }: { budget: Defence["budget"] }) {
  const [largest] = budget;
  return (
    <div>
      <DataTable caption="What leaves KG open" showCaption>
        <thead>
          <tr>
            <ColumnHead>Cause</ColumnHead>
            <ColumnHead figure>alone ±</ColumnHead>
            <ColumnHead figure>share</ColumnHead>
          </tr>
        </thead>
        <tbody>
          {budget.map(({ cause, share, halfWidth }) => (
            <tr key={cause}>
              <RowHead className="font-normal">{causeName(cause)}</RowHead>
              <Cell figure>
                <Quantity value={halfWidth * 1000} unit="mm" decimals={1} />
              </Cell>
              <Cell figure>
                <Quantity value={share * 100} unit="%" decimals={0} />
              </Cell>
            </tr>
          ))}
        </tbody>
      </DataTable>
      {largest ? (
        <p className="mt-3 text-small">
          <strong>Measure better next time:</strong> {causeAdvice(largest.cause)}
        </p>
      ) : null}
    </div>
  );
}
