import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Panel } from "@/components/ui/panel";
import { Quantity } from "@/components/ui/quantity";
import type { TestRecord } from "@/lib/record/test-record";

type Item = TestRecord["items"][number];

/** What is to go ashore, to come aboard or to find another place, as the plan lists it. */
export function ItemsTable({ items }: { items: readonly Item[] }) {
  if (items.length === 0) {
    return (
      <Panel title="Items off, on and moved">
        <p>The plan lists none: the ship was complete, and nothing foreign was aboard.</p>
      </Panel>
    );
  }
  return (
    <Panel title="Items off, on and moved" aside={`${items.length} listed`}>
      <DataTable caption="Items" className="min-w-[36rem]">
        <thead>
          <tr>
            <ColumnHead>Item</ColumnHead>
            <ColumnHead>What becomes of it</ColumnHead>
            <ColumnHead figure>Mass</ColumnHead>
            <ColumnHead figure>x</ColumnHead>
            <ColumnHead figure>y</ColumnHead>
            <ColumnHead figure>z</ColumnHead>
          </tr>
        </thead>
        <tbody>
          {items.map((item) => (
            <ItemRow key={`${item.action} ${item.label} ${item.x} ${item.y} ${item.z}`} item={item} />
          ))}
        </tbody>
      </DataTable>
    </Panel>
  );
}

function ItemRow({ item }: { item: Item }) {
  return (
    <tr>
      <RowHead className="font-normal">{item.label}</RowHead>
      <Cell>{actionInWords[item.action]}</Cell>
      <Cell figure>
        <Quantity value={item.mass} unit="t" decimals={3} />
      </Cell>
      <Place from={item.x} to={item.action === "relocate" ? item.toX : null} />
      <Place from={item.y} to={item.action === "relocate" ? item.toY : null} signed />
      <Place from={item.z} to={item.action === "relocate" ? item.toZ : null} />
    </tr>
  );
}

function Place({ from, to, signed = false }: { from: number; to: number | null; signed?: boolean }) {
  return (
    <Cell figure>
      <Quantity value={from} unit="m" decimals={2} signed={signed} />
      {to === null || to === from ? null : (
        <>
          <span aria-hidden="true"> → </span>
          <span className="sr-only"> to </span>
          <Quantity value={to} unit="m" decimals={2} signed={signed} />
        </>
      )}
    </Cell>
  );
}

const actionInWords: Record<Item["action"], string> = { deduct: "goes ashore", add: "comes aboard", relocate: "finds its own place" };
