import type { SignKind } from "@/components/ui/sign";
import type { ReadingDue, StandingReading } from "@/lib/sync/live";

export type CellSign = { readonly sign: SignKind; readonly word: string };

/** What a slot's state is called, a sign with its word; `isOpen` tells whether it is being read now. */
export function cellSigns(due: ReadingDue, isOpen: boolean): CellSign[] {
  if (due.state === "empty") return [isOpen ? { sign: "due", word: "due now" } : { sign: "waiting", word: "not yet" }];
  if (due.state === "disagrees") return [{ sign: "disagrees", word: "disagrees" }, ...howItCame(standing(due))];
  const settled: CellSign[] = due.state === "resolved" ? [{ sign: "settled", word: "settled" }] : [];
  const came = howItCame(standing(due));
  return settled.length + came.length > 0 ? [...settled, ...came] : [{ sign: "read", word: "read" }];
}

/** The readings that count in a slot: the station's own where there is one. */
export function standing(due: ReadingDue): StandingReading[] {
  const heads = due.readings.filter((reading) => reading.status === "accepted" || reading.status === "disagrees");
  const own = heads.filter((reading) => reading.source === "station");
  return own.length > 0 && due.state !== "disagrees" ? own : heads;
}

function howItCame(readings: readonly StandingReading[]): CellSign[] {
  const radio: CellSign[] = readings.some((each) => each.source === "radio") ? [{ sign: "radio", word: "radio" }] : [];
  const paper: CellSign[] = readings.some((each) => each.source === "paper") ? [{ sign: "paper", word: "paper" }] : [];
  const late: CellSign[] = readings.some((each) => each.late || each.capturedAfterClose) ? [{ sign: "late", word: "late" }] : [];
  return [...radio, ...paper, ...late];
}
