import { capturedAt } from "./captured-at";
import type { MoveRun } from "./move-progress";
import type { Slot } from "./slot";
import type { ProjectedReading } from "./slot-projection";

export type Lateness = { readonly late: boolean; readonly capturedAfterClose: boolean };

/** Whether a batten reading arrived after its move was closed, and whether it was taken after that, by the phones' clocks as measured. */
export function lateness(slot: Slot, reading: ProjectedReading, runs: readonly MoveRun[]): Lateness {
  const run = slot.kind === "batten" ? runs.find(({ move, repeat }) => move === slot.move && repeat === slot.repeat) : undefined;
  if (!run || run.closedSeq === null || run.closedMoment === null) return { late: false, capturedAfterClose: false };
  return {
    late: reading.serverSeq > run.closedSeq,
    capturedAfterClose: capturedAt(reading) > run.closedMoment,
  };
}
