import type { MoveRun } from "./move-progress";
import type { Slot } from "./slot";
import type { ProjectedReading } from "./slot-projection";

export type Lateness = { readonly late: boolean; readonly capturedAfterClose: boolean };

/** Whether a batten reading arrived after its move was closed, and whether it was taken after that, by the phone's clock as measured. */
export function lateness(slot: Slot, reading: ProjectedReading, runs: readonly MoveRun[]): Lateness {
  const run = slot.kind === "batten" ? runs.find(({ move, repeat }) => move === slot.move && repeat === slot.repeat) : undefined;
  if (!run || run.closedSeq === null || run.closedAt === null) return { late: false, capturedAfterClose: false };
  return {
    late: reading.serverSeq > run.closedSeq,
    capturedAfterClose: capturedAt(reading) > Date.parse(run.closedAt),
  };
}

/** The moment of an act by the server's clock: the phone's time plus the last offset it measured [ms since 1970]. */
export function capturedAt(act: { readonly capturedAt: string; readonly clockOffsetMs: number | null }): number {
  return Date.parse(act.capturedAt) + (act.clockOffsetMs ?? 0);
}
