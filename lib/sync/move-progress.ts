import { capturedAt } from "./captured-at";
import type { EventOf } from "./event";
import type { Stamped } from "./slot-heads";

export type MoveEvent = Stamped<EventOf<"move.open" | "move.close" | "move.repeat" | "move.exclude">>;

export type RunState = "due" | "open" | "closed" | "disagrees";

/** One run of a move: the move as planned, or a repeat that was ordered. */
export type MoveRun = {
  readonly move: number;
  readonly repeat: number;
  readonly state: RunState;
  readonly excluded: string | null;
  /** the first act of its kind, in the words of its own phone's clock */
  readonly openedAt: string | null;
  readonly closedAt: string | null;
  /** the first close by the server's clock [ms since 1970]; what was taken after it came too late */
  readonly closedMoment: number | null;
  /** server's number of the first close; what arrives after it is late */
  readonly closedSeq: number | null;
};

/**
 * The runs of every move, from the wheelhouse's acts in any order.
 *
 * A run is closed once anybody closed it; to read again, a repeat is ordered. Two runs open at once by different devices
 * contradict each other: the weights stand in one place only. Closing one of them settles it.
 */
export function moveProgress(moves: readonly number[], events: readonly MoveEvent[]): MoveRun[] {
  const runs = moves.flatMap((move) => repeatsOf(move, events).map((repeat) => run(move, repeat, events)));
  const open = runs.filter(({ state }) => state === "open");
  const isContradicted = open.length > 1 && devicesThatOpened(open, events).size > 1;
  return isContradicted ? runs.map((one) => (one.state === "open" ? { ...one, state: "disagrees" } : one)) : runs;
}

// the numbers that were told, not all up to the highest: one mistaken order must not make a million runs
function repeatsOf(move: number, events: readonly MoveEvent[]): number[] {
  const told = events.filter(({ body }) => body.payload.move === move).map(({ body }) => body.payload.repeat);
  return [...new Set([1, ...told])].sort((a, b) => a - b);
}

function run(move: number, repeat: number, events: readonly MoveEvent[]): MoveRun {
  const acts = events.filter(({ body }) => body.payload.move === move && body.payload.repeat === repeat);
  const [opens, closes, excludes] = [inTurn(acts, "move.open"), inTurn(acts, "move.close"), inTurn(acts, "move.exclude")];
  return {
    move,
    repeat,
    state: closes.length > 0 ? "closed" : opens.length > 0 ? "open" : "due",
    excluded: excludes[0] ? (excludes[0].body.reason ?? "excluded") : null,
    openedAt: opens[0]?.body.capturedAt ?? null,
    closedAt: closes[0]?.body.capturedAt ?? null,
    closedMoment: closes[0] ? capturedAt(closes[0].body) : null,
    closedSeq: closes.length > 0 ? Math.min(...closes.map(({ serverSeq }) => serverSeq)) : null,
  };
}

function devicesThatOpened(open: readonly MoveRun[], events: readonly MoveEvent[]): Set<string> {
  const opened = events.filter(({ body }) => body.type === "move.open" && open.some((one) => isRunOf(one, body.payload)));
  return new Set(opened.map(({ body }) => body.device));
}

function isRunOf(one: MoveRun, payload: { move: number; repeat: number }): boolean {
  return one.move === payload.move && one.repeat === payload.repeat;
}

/** Acts of one kind, earliest first by the server's clock; at one moment in the order of their ids. */
function inTurn(acts: readonly MoveEvent[], type: MoveEvent["body"]["type"]): MoveEvent[] {
  const byMoment = (a: MoveEvent, b: MoveEvent) => capturedAt(a.body) - capturedAt(b.body) || (a.body.id < b.body.id ? -1 : 1);
  return acts.filter(({ body }) => body.type === type).sort(byMoment);
}
