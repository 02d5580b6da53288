import type { EventBody, EventOf } from "@/lib/sync/event";
import type { LiveSnapshot, MoveProgress, ReadingDue, StandingReading } from "@/lib/sync/live";
import { slotKey } from "@/lib/sync/slot-key";

/**
 * The snapshot with what this device has saved and not yet sent: the lead sees orders and values take effect while the
 * server is away. What the server then says stands instead.
 */
export function snapshotWithUnsent(snapshot: LiveSnapshot, unsent: readonly EventBody[]): LiveSnapshot {
  return unsent.reduce(withAct, snapshot);
}

function withAct(snapshot: LiveSnapshot, act: EventBody): LiveSnapshot {
  switch (act.type) {
    case "move.open":
      return withMove(snapshot, act, { state: "open", repeat: act.payload.repeat, openedAt: act.capturedAt });
    case "move.close":
      return withMove(snapshot, act, { state: "closed", repeat: act.payload.repeat, closedAt: act.capturedAt });
    case "move.repeat":
      return withRepeat(withMove(snapshot, act, { state: "due", repeat: act.payload.repeat, openedAt: null, closedAt: null }), act);
    case "move.exclude":
      return withMove(snapshot, act, { excluded: act.reason });
    case "record":
    case "correct":
      return { ...withReading(snapshot, act), record: withRecorded(snapshot.record, act) };
    default:
      return snapshot;
  }
}

type MoveAct = EventOf<"move.open" | "move.close" | "move.repeat" | "move.exclude">;

function withMove(snapshot: LiveSnapshot, { payload }: MoveAct, change: Partial<MoveProgress>): LiveSnapshot {
  return { ...snapshot, moves: snapshot.moves.map((move) => (move.no === payload.move ? { ...move, ...change } : move)) };
}

function withRepeat(snapshot: LiveSnapshot, { payload }: EventOf<"move.repeat">): LiveSnapshot {
  const ordered = snapshot.due.flatMap(({ slot }): ReadingDue[] => {
    if (slot.kind !== "batten" || slot.move !== payload.move || slot.repeat !== payload.repeat - 1) return [];
    const again = { ...slot, repeat: payload.repeat };
    return [{ slot: again, slotKey: slotKey(again), state: "empty", readings: [], heads: [] }];
  });
  return { ...snapshot, due: [...snapshot.due, ...ordered] };
}

type ReadingAct = EventOf<"record" | "correct">;

function withReading(snapshot: LiveSnapshot, act: ReadingAct): LiveSnapshot {
  const key = slotKey(act.slot);
  const due = snapshot.due.map((each) => {
    if (each.slotKey !== key || each.readings.some((reading) => reading.event === act.id)) return each;
    const before = each.readings.filter((reading) => reading.event !== act.base);
    const state = each.state === "empty" ? ("read" as const) : each.state;
    return { ...each, state, readings: [...before, standing(act)], heads: [...each.heads.filter((head) => head !== act.base), act.id] };
  });
  return { ...snapshot, due };
}

function standing(act: ReadingAct): StandingReading {
  return {
    event: act.id,
    reading: act.reading,
    value: act.payload,
    source: act.source,
    status: "accepted",
    author: "this device, not sent yet",
    device: act.device,
    capturedAt: act.capturedAt,
    receivedAt: act.capturedAt,
    late: false,
    capturedAfterClose: false,
    corrected: act.type === "correct",
  };
}

type Taken = LiveSnapshot["record"];

/** A batten or a weight's place enters the line at once; rounds and conditions wait for the server. */
function withRecorded(record: Taken, { id, slot, payload, source, capturedAt }: ReadingAct): Taken {
  if (slot.kind === "batten" && "mode" in payload) {
    const { move, repeat, station, series } = slot;
    const reading = { id, move, repeat, station, series, source, takenAt: capturedAt, ...payload };
    return { ...record, readings: { ...record.readings, battens: [...record.readings.battens, reading] } };
  }
  if (slot.kind !== "position" || !("place" in payload)) return record;
  const moves = record.moves.map((move) =>
    move.no === slot.move ? { ...move, positions: { ...move.positions, [slot.weight]: payload.place } } : move,
  );
  return { ...record, moves };
}
