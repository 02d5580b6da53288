import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Quantity } from "@/components/ui/quantity";
import type { Defence, Interval } from "@/lib/lightship/defended-lightship";
import type { lightshipDigits } from "@/lib/report/result-digits";

type IntervalTableProps = {
  intervals: Defence["interval95"];
  digits: ReturnType<typeof lightshipDigits>;
  isAssumed: boolean;
};

/** Between which values each number of the lightship lies, 95 times of a hundred. */
export function IntervalTable({ intervals, digits, isAssumed }: IntervalTableProps) {
  return (
    <div>
      <DataTable caption="95 % intervals of the lightship" showCaption>
        <thead>
          <tr>
            <ColumnHead>Number</ColumnHead>
            <ColumnHead figure>from</ColumnHead>
            <ColumnHead figure>to</ColumnHead>
          </tr>
        </thead>
        <tbody>
          <Row name="Displacement" interval={intervals.displacement} unit="t" decimals={digits.displacement} />
          <Row name="VCG, classical" interval={intervals.vcg} unit="m" decimals={digits.vcg} />
          {intervals.vcgGeneralised ? (
            <Row name="VCG, generalised" interval={intervals.vcgGeneralised} unit="m" decimals={digits.vcg} />
          ) : null}
          <Row name="LCG forward of AP" interval={intervals.lcg} unit="m" decimals={digits.lcg} />
        </tbody>
      </DataTable>
      <p className="mt-3 text-ink-soft text-small">
        {isAssumed
          ? "The test states no uncertainties: the program's own assumptions stand for them."
          : "By the standard uncertainties that the test states; the scatter of the line is always counted."}
      </p>
    </div>
  );
}

function Row({ name, interval: [low, high], ...digits }: { name: string; interval: Interval; unit: string; decimals: number }) {
  return (
    <tr>
      <RowHead>{name}</RowHead>
      <Cell figure>
        <Quantity value={low} {...digits} />
      </Cell>
      <Cell figure>
        <Quantity value={high} {...digits} />
      </Cell>
    </tr>
  );
}
