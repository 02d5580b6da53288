import type { JobSheet } from "@/lib/sync/job-sheet";
import type { Station } from "./batten-entry";

type BattenHeadProps = { station: Station; move: JobSheet["moves"][number]; repeat: number };

/** Which move and which station, large enough to be checked at arm's length. */
export function BattenHead({ station, move, repeat }: BattenHeadProps) {
  return (
    <header className="flex items-stretch gap-3 pb-2">
      <p className="flex shrink-0 flex-col items-center justify-center rounded bg-ink px-3 py-1 text-sailcloth">
        <span className="text-small leading-none">Move</span>
        <span className="font-bold font-mono text-signal leading-none">{move.no}</span>
      </p>
      <div className="flex min-w-0 flex-1 flex-col justify-center">
        <h1 className="truncate font-bold text-title leading-tight">Station {station.id}</h1>
        <p className="truncate text-small">{station.place ?? instruments[station.instrument]}</p>
        <p className="truncate text-ink-soft text-small">
          {repeat > 1 ? <b className="text-redlead-text">Repeat {repeat} · </b> : null}
          {move.label}
        </p>
      </div>
    </header>
  );
}

const instruments = { pendulum: "Pendulum", "u-tube": "U-tube", inclinometer: "Inclinometer" } as const;
