import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Quantity } from "@/components/ui/quantity";
import type { Expectation, ExpectedMove } from "@/lib/inclining/expected-moves";
import type { TestRecord } from "@/lib/record/test-record";

type MovesExpectedProps = { expectation: Expectation; record: TestRecord };

const bases = {
  offsets: "By the equilibrium of the hull at each move.",
  table: "By the table’s metacentre on even keel: right for small heels of a ship with upright sides.",
};

/** Heel, deflections and freeboard of each move, as the ship is expected to be. */
export function MovesExpected({ expectation, record }: MovesExpectedProps) {
  const { moves, gmFluid, by } = expectation;
  const hasFreeboard = moves.some(({ leastFreeboard }) => leastFreeboard !== null);
  return (
    <>
      <p className="mb-3">
        GM fluid <Quantity value={gmFluid} unit="m" decimals={2} className="font-bold" />. {bases[by]}
      </p>
      <DataTable caption="What each move should show" className="min-w-[36rem]">
        <thead>
          <tr>
            <ColumnHead>Move</ColumnHead>
            <ColumnHead figure>Moment, t·m</ColumnHead>
            <ColumnHead figure>Heel, °</ColumnHead>
            {record.stations.map(({ id, instrument }) => (
              <ColumnHead key={id} figure>
                {id}, {instrument === "inclinometer" ? "°" : "mm"}
              </ColumnHead>
            ))}
            {hasFreeboard ? <ColumnHead figure>Least freeboard, m</ColumnHead> : null}
          </tr>
        </thead>
        <tbody>
          {moves.map((move) => (
            <MoveRow key={move.no} move={move} stations={record.stations} hasFreeboard={hasFreeboard} />
          ))}
        </tbody>
      </DataTable>
      <p className="mt-2 text-ink-soft text-small">
        Change against move 0, positive to starboard. Small turns of the numbers are to be expected: the ship is not yet known.
      </p>
    </>
  );
}

type MoveRowProps = { move: ExpectedMove; stations: TestRecord["stations"]; hasFreeboard: boolean };

function MoveRow({ move, stations, hasFreeboard }: MoveRowProps) {
  const degrees = (Math.atan(move.tanHeel) * 180) / Math.PI;
  return (
    <tr>
      <RowHead>{move.no}</RowHead>
      <Cell figure>
        <Quantity value={move.moment} unit="" decimals={1} signed />
      </Cell>
      <Cell figure>
        <Quantity value={degrees} unit="" decimals={2} signed />
      </Cell>
      {stations.map(({ id, instrument }) => (
        <Cell key={id} figure>
          {instrument === "inclinometer" ? (
            <Quantity value={degrees} unit="" decimals={2} signed />
          ) : (
            <Quantity value={move.deflectionsMm[id] ?? null} unit="" decimals={0} signed />
          )}
        </Cell>
      ))}
      {hasFreeboard ? (
        <Cell figure>
          <Quantity value={move.leastFreeboard} unit="" decimals={2} />
        </Cell>
      ) : null}
    </tr>
  );
}
