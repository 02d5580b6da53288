import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Quantity } from "@/components/ui/quantity";
import type { MarkRead } from "@/lib/inclining/draft-rounds";

/** Each mark and freeboard: what was read, of how many estimates, what it is off the waterline and how it changed. */
export function MarksTable({ marks }: { marks: readonly MarkRead[] }) {
  return (
    <DataTable caption="Residual of each mark" showCaption className="min-w-[32rem]">
      <thead>
        <tr>
          <ColumnHead>Mark</ColumnHead>
          <ColumnHead figure>Read</ColumnHead>
          <ColumnHead figure>Estimates</ColumnHead>
          <ColumnHead figure>Measured less fitted</ColumnHead>
          <ColumnHead figure>After less before</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {marks.map(({ mark, kind, value, estimates, scatter, residual, change }) => (
          <tr key={`${kind} ${mark}`}>
            <RowHead>{kind === "draft" ? mark : `${mark}, freeboard`}</RowHead>
            <Cell figure>
              <Quantity value={value} unit="m" decimals={3} />
            </Cell>
            <Cell figure>
              {estimates}
              {scatter === null ? null : (
                <>
                  , ± <Quantity value={scatter * 1000} unit="mm" decimals={1} />
                </>
              )}
            </Cell>
            <Cell figure>
              <Quantity value={residual * 1000} unit="mm" decimals={1} signed />
            </Cell>
            <Cell figure>
              <Quantity value={change === null ? null : change * 1000} unit="mm" decimals={1} signed />
            </Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
