import Link from "next/link";
import { Sign } from "@/components/ui/sign";
import type { JobSheet } from "@/lib/sync/job-sheet";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { slotHref } from "../task/slot-query";

type BattenGridProps = { sheet: JobSheet; read: ReadonlySet<string> };

/** Moves down, stations across: each cell one reading of this phone. */
export function BattenGrid({ sheet, read }: BattenGridProps) {
  return (
    <div className="overflow-x-auto">
      <table className="w-full border-separate border-spacing-1">
        <thead>
          <tr className="text-left text-small">
            <th scope="col" className="font-normal text-ink-soft">
              Move
            </th>
            {sheet.stations.map(({ id }) => (
              <th key={id} scope="col" className="text-center">
                {id}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {sheet.moves.map((move) => (
            <tr key={move.no}>
              <th scope="row" className="w-14 text-left font-mono text-large">
                {move.no}
                {move.state === "open" ? <span className="block font-sans text-[0.65rem] text-redlead-text">now</span> : null}
              </th>
              {sheet.stations.map(({ id, series }) => (
                <Cell
                  key={id}
                  test={sheet.test.id}
                  slot={{ kind: "batten", move: move.no, repeat: move.repeat, station: id, series }}
                  read={read}
                />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Cell({ test, slot, read }: { test: string; slot: Extract<Slot, { kind: "batten" }>; read: ReadonlySet<string> }) {
  const isRead = read.has(slotKey(slot));
  return (
    <td className="p-0">
      <Link
        href={slotHref(test, slot)}
        prefetch={false}
        aria-label={`Station ${slot.station}, move ${slot.move}: ${isRead ? "read" : "not read"} with this phone`}
        className={`grid min-h-key min-w-key place-items-center rounded border-2 ${isRead ? "border-ink-line bg-sailcloth-sunken text-ink-soft" : "border-ink bg-sailcloth-raised"}`}
      >
        <Sign kind={isRead ? "read" : "due"} className="h-5 w-5" />
      </Link>
    </td>
  );
}
