import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Quantity } from "@/components/ui/quantity";
import { centreOf, type Moments } from "@/lib/lightship/weight-item";

/** One line of the way from as inclined to lightship; what goes off stands with a minus. */
export type BalanceLine = {
  readonly label: string;
  readonly moments: Moments;
  readonly kind: State | "off" | "on";
};
type State = "as-inclined" | "lightship";
type Digits = Readonly<Record<"displacement" | "vcg" | "lcg" | "tcg", number>>;

type BalanceTableProps = { lines: readonly BalanceLine[]; digits: Readonly<Record<State, Digits>> };

/** What goes off and comes on is known as it was weighed and measured. */
const ofItems: Digits = { displacement: 2, lcg: 3, tcg: 3, vcg: 3 };

/** As inclined, what is deducted, what is added, and what is left: the lightship. Masses, centres and moments. */
export function BalanceTable({ lines, digits }: BalanceTableProps) {
  return (
    <DataTable caption="From as inclined to lightship" className="min-w-[52rem]">
      <thead>
        <tr>
          <ColumnHead>Item</ColumnHead>
          <ColumnHead figure>Mass, t</ColumnHead>
          <ColumnHead figure>LCG, m</ColumnHead>
          <ColumnHead figure>TCG, m</ColumnHead>
          <ColumnHead figure>VCG, m</ColumnHead>
          <ColumnHead figure>Along, t·m</ColumnHead>
          <ColumnHead figure>Athwart, t·m</ColumnHead>
          <ColumnHead figure>Upward, t·m</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {lines.map((line) => (
          <BalanceRow key={line.label} line={line} digits={line.kind === "off" || line.kind === "on" ? ofItems : digits[line.kind]} />
        ))}
      </tbody>
    </DataTable>
  );
}

function BalanceRow({ line, digits }: { line: BalanceLine; digits: Digits }) {
  const { moments, kind, label } = line;
  const by = kind === "off" ? -1 : 1;
  const centre = moments.mass === 0 ? null : centreOf(moments);
  const isState = kind !== "off" && kind !== "on";
  const look = isState ? "bg-sailcloth font-bold" : "";
  return (
    <tr className={look}>
      <RowHead className={isState ? "" : "pl-5 font-normal"}>
        {kind === "off" ? "less " : kind === "on" ? "plus " : ""}
        {label}
      </RowHead>
      <Figure value={by * moments.mass} decimals={digits.displacement} signed={!isState} />
      <Figure value={centre?.lcg ?? null} decimals={digits.lcg} />
      <Figure value={centre?.tcg ?? null} decimals={digits.tcg} signed />
      <Figure value={centre?.vcg ?? null} decimals={digits.vcg} />
      <Figure value={by * moments.along} decimals={1} signed={!isState} />
      <Figure value={by * moments.athwart} decimals={1} signed />
      <Figure value={by * moments.upward} decimals={1} signed={!isState} />
    </tr>
  );
}

function Figure({ value, decimals, signed = false }: { value: number | null; decimals: number; signed?: boolean }) {
  return (
    <Cell figure>
      <Quantity value={value} unit="" decimals={decimals} signed={signed} />
    </Cell>
  );
}
