import type { LiveSnapshot, MoveProgress, ReadingDue } from "@/lib/sync/live";

/** Where the test stands: the move being read, or the one that comes next, or none when all are closed. */
export type MoveNow = {
  readonly kind: "open" | "next" | "done";
  readonly move: MoveProgress | null;
  readonly next: MoveProgress | null;
  readonly due: readonly ReadingDue[];
  readonly read: number;
  readonly expected: number;
};

export function moveNow(snapshot: Pick<LiveSnapshot, "moves" | "due">): MoveNow {
  const open = snapshot.moves.find((move) => move.state === "open") ?? null;
  const next = snapshot.moves.find((move) => move.state === "due") ?? null;
  const move = open ?? next;
  const battens = move ? battensOfMove(snapshot.due, move) : [];
  const due = battens.filter((each) => each.state === "empty");
  return {
    kind: open ? "open" : next ? "next" : "done",
    move,
    next: open ? next : null,
    due,
    read: battens.length - due.length,
    expected: battens.length,
  };
}

/** The batten slots of a move in its last repeat. */
export function battensOfMove(due: readonly ReadingDue[], move: Pick<MoveProgress, "no" | "repeat">): ReadingDue[] {
  return due.filter((each) => each.slot.kind === "batten" && each.slot.move === move.no && each.slot.repeat === move.repeat);
}

/** A move that is in the test's result: closed, in its last repeat, not excluded. */
export function isCounted(move: MoveProgress): boolean {
  return move.excluded === null && (move.state === "closed" || move.state === "open");
}
