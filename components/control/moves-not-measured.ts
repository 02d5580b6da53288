import type { TestSoFar } from "@/lib/inclining/test-so-far";
import type { ReadingDue } from "@/lib/sync/live";

/** The moves in the line at which some weight's place was not measured, so that the plan's stands for it. */
export function movesNotMeasured(due: readonly ReadingDue[], { line }: TestSoFar): number[] {
  const used = new Set(line?.moves.map(({ no }) => no));
  const missing = due.flatMap(({ slot, state }) =>
    slot.kind === "position" && state === "empty" && used.has(slot.move) ? [slot.move] : [],
  );
  return [...new Set(missing)];
}
