import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Quantity } from "@/components/ui/quantity";
import { alongTheLine, type PlotPoint } from "./plot-points";

/** What the plot draws, as figures. */
export function PlotTable({ points }: { points: readonly PlotPoint[] }) {
  return (
    <DataTable caption="Points of the plot, port to starboard">
      <thead>
        <tr>
          <ColumnHead>Move</ColumnHead>
          <ColumnHead>Station</ColumnHead>
          <ColumnHead figure>Moment</ColumnHead>
          <ColumnHead figure>Tangent</ColumnHead>
          <ColumnHead figure>Left over</ColumnHead>
          <ColumnHead>Takes part</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {alongTheLine(points).map((point) => (
          <tr key={`${point.move} ${point.station} ${point.tangent}`}>
            <RowHead>{point.move}</RowHead>
            <Cell>{point.station}</Cell>
            <Cell figure>
              <Quantity value={point.moment} unit="t·m" decimals={2} signed />
            </Cell>
            <Cell figure>
              <Quantity value={point.tangent} unit="mm per m" decimals={2} signed />
            </Cell>
            <Cell figure>
              <Quantity value={point.residual} unit="mm per m" decimals={3} signed />
            </Cell>
            <Cell>{point.leftOut === null ? "yes" : `no: ${point.leftOut}`}</Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
