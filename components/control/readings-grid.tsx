import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Panel } from "@/components/ui/panel";
import type { LiveSnapshot, MoveProgress, ReadingDue } from "@/lib/sync/live";
import { battensOfMove, moveNow } from "./move-now";
import { SlotCell } from "./slot-cell";

type ReadingsGridProps = { snapshot: Pick<LiveSnapshot, "moves" | "due" | "record"> };

/** Battens due and read: a row for each move, a column for each station. */
export function ReadingsGrid({ snapshot }: ReadingsGridProps) {
  const stations = snapshot.record.stations.map((station) => station.id);
  return (
    <Panel title="Battens" aside={battensAside(snapshot)}>
      <DataTable caption="Batten readings, move by station">
        <thead>
          <tr>
            <ColumnHead>Move</ColumnHead>
            {stations.map((station) => (
              <ColumnHead key={station}>Station {station}</ColumnHead>
            ))}
          </tr>
        </thead>
        <tbody>
          {snapshot.moves.map((move) => (
            <MoveRow key={move.no} move={move} stations={stations} slots={battensOfMove(snapshot.due, move)} />
          ))}
        </tbody>
      </DataTable>
    </Panel>
  );
}

function MoveRow({ move, stations, slots }: { move: MoveProgress; stations: readonly string[]; slots: readonly ReadingDue[] }) {
  return (
    <tr className={move.state === "open" ? "bg-sailcloth" : ""}>
      <RowHead className="align-top">
        <span className="font-mono text-large">{move.no}</span>
        <span className="block font-normal text-ink-soft text-small">
          {moveStateInWords(move)}
          {move.repeat > 1 ? `, repeat ${move.repeat}` : ""}
        </span>
      </RowHead>
      {stations.map((station) => (
        <Cell key={station} className="align-top">
          {slots
            .filter((due) => isAtStation(due, station))
            .map((due) => (
              <SlotCell key={due.slotKey} due={due} isOpen={move.state === "open"} />
            ))}
        </Cell>
      ))}
    </tr>
  );
}

export function moveStateInWords(move: MoveProgress): string {
  if (move.excluded !== null) return "excluded";
  return { due: "not opened", open: "open", closed: "closed", disagrees: "orders differ" }[move.state];
}

function isAtStation(due: ReadingDue, station: string): boolean {
  return due.slot.kind === "batten" && due.slot.station === station;
}

function battensAside(snapshot: ReadingsGridProps["snapshot"]): string {
  const { kind, move, read, expected } = moveNow(snapshot);
  if (!move) return "All moves are closed";
  return kind === "open" ? `Move ${move.no}: ${read} of ${expected} read` : `Move ${move.no} is next`;
}
