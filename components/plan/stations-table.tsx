import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Quantity } from "@/components/ui/quantity";
import type { TestRecord } from "@/lib/record/test-record";

/** What hangs where. */
export function StationsTable({ stations }: { stations: TestRecord["stations"] }) {
  if (stations.length === 0) return <p>No station yet.</p>;
  return (
    <DataTable caption="Stations">
      <thead>
        <tr>
          <ColumnHead>Station</ColumnHead>
          <ColumnHead>Instrument</ColumnHead>
          <ColumnHead figure>Length or span</ColumnHead>
          <ColumnHead figure>Forward of AP</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {stations.map((station) => (
          <tr key={station.id}>
            <RowHead>{station.id}</RowHead>
            <Cell>
              {station.instrument}
              {station.reversed ? ", mounted the other way" : ""}
            </Cell>
            <Cell figure>
              <Quantity value={lengthOf(station)} unit="m" decimals={3} />
            </Cell>
            <Cell figure>
              <Quantity value={station.x ?? null} unit="m" decimals={1} />
            </Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}

function lengthOf(station: TestRecord["stations"][number]): number | null {
  if (station.instrument === "pendulum") return station.length;
  return station.instrument === "u-tube" ? station.span : null;
}
