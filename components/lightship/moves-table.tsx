import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Quantity } from "@/components/ui/quantity";
import { uncertaintyOfMove } from "@/lib/inclining/checks/movement-checks";
import type { InclinedShip } from "@/lib/inclining/inclining-test";
import { withoutEachMove } from "@/lib/inclining/line-diagnostics";
import { standardisedResiduals } from "@/lib/inclining/standardised-residuals";
import type { IncliningTestData } from "@/lib/inclining/test-data";

type MovesTableProps = { test: IncliningTestData; ship: InclinedShip; gmDecimals: number };

/** How far each move stands off the line through the others, and what GM would be without it. */
export function MovesTable({ test, ship: { line, asInclined }, gmDecimals }: MovesTableProps) {
  const { points, limit } = standardisedResiduals(line.moves, uncertaintyOfMove(test, line));
  const without = withoutEachMove(line, asInclined);
  return (
    <div>
      <DataTable caption="Each move against the others" showCaption>
        <thead>
          <tr>
            <ColumnHead>Move</ColumnHead>
            <ColumnHead figure>Moment</ColumnHead>
            <ColumnHead figure>Off the line</ColumnHead>
            <ColumnHead figure>in standard deviations</ColumnHead>
            <ColumnHead figure>GM without it</ColumnHead>
          </tr>
        </thead>
        <tbody>
          {points.map(({ no, session, moment, residual, standardised }) => (
            <tr key={`${session} ${no}`}>
              <RowHead className="font-normal">{session > 1 ? `${no}, session ${session}` : no}</RowHead>
              <Cell figure>
                <Quantity value={moment} unit="t·m" decimals={1} signed />
              </Cell>
              <Cell figure>
                <Quantity value={residual * 1000} unit="mm per m" decimals={3} signed />
              </Cell>
              <Cell figure>
                <Quantity value={standardised} unit="" decimals={1} signed />
              </Cell>
              <Cell figure>
                <Quantity
                  value={without.find((each) => each.no === no && each.session === session)?.gmFluid ?? null}
                  unit="m"
                  decimals={gmDecimals}
                />
              </Cell>
            </tr>
          ))}
        </tbody>
      </DataTable>
      {limit === null ? null : (
        <p className="mt-3 text-ink-soft text-small">
          Of a straight line the move that stands off most passes <Quantity value={limit} unit="" decimals={1} /> standard deviations in
          five tests of a hundred.
        </p>
      )}
    </div>
  );
}
