import type { TestRecord } from "@/lib/record/test-record";
import type { EventBody } from "./event";
import type { Slot } from "./slot";

/** What of a plan says which readings are due. */
export type DuePlan = Pick<TestRecord, "stations" | "moves" | "draftMarks" | "freeboardMarks" | "tanks" | "weights"> & {
  readonly waterPlaces: readonly { readonly place: string; readonly depth: number }[];
  readonly rounds: readonly ("before" | "after")[];
};

/** What has been ordered since: repeats of moves and new series of stations. */
export type Ordered = { readonly repeats: ReadonlyMap<number, number>; readonly series: ReadonlyMap<string, number> };

/** The highest repeat of each move and the highest series of each station, from the plan and the events of the wheelhouse. */
export function ordered(plan: DuePlan, events: Iterable<EventBody>): Ordered {
  const repeats = new Map(plan.moves.map(({ no, repeat }) => [no, repeat ?? 1]));
  const series = new Map(plan.stations.map(({ id, series = [] }) => [id, Math.max(1, ...series.map(({ no }) => no))]));
  for (const { type, payload } of events) {
    if (type === "move.repeat") raise(repeats, payload.move, payload.repeat);
    if (type === "station.series") raise(series, payload.station, payload.series);
  }
  return { repeats, series };
}

/** Every reading due, in the order in which the day goes: marks, tanks and water before, the moves, and what is due after. */
export function readingsDue(plan: DuePlan, { repeats, series }: Ordered): Slot[] {
  const battens = plan.moves.flatMap(({ no }) =>
    plan.stations.map(({ id }) => battenSlot(no, repeats.get(no) ?? 1, id, series.get(id) ?? 1)),
  );
  const positions = plan.moves.flatMap(({ no }) => plan.weights.map(({ id }): Slot => ({ kind: "position", weight: id, move: no })));
  const conditions = plan.moves.map(({ no }): Slot => ({ kind: "condition", move: no }));
  return [...plan.rounds.flatMap((round) => roundDue(plan, round)), ...battens, ...positions, ...ballastDue(plan), ...conditions];
}

/** Whether a slot stands in the plan. Notes always do; water may be drawn at any depth of a place in the plan. */
export function isInPlan(plan: DuePlan, { repeats, series }: Ordered, slot: Slot): boolean {
  switch (slot.kind) {
    case "batten":
      return slot.repeat <= (repeats.get(slot.move) ?? 0) && slot.series <= (series.get(slot.station) ?? 0);
    case "draft":
      return plan.draftMarks.some(({ id }) => id === slot.mark);
    case "freeboard":
      return (plan.freeboardMarks ?? []).some(({ id }) => id === slot.mark);
    case "sounding":
      return plan.tanks.some(({ id }) => id === slot.tank);
    case "ballast":
      return plan.tanks.some(({ id, shifts }) => id === slot.tank && shifts === true) && repeats.has(slot.move);
    case "water":
      return plan.waterPlaces.some(({ place }) => place === slot.place);
    case "position":
      return plan.weights.some(({ id }) => id === slot.weight) && repeats.has(slot.move);
    case "length":
      return slot.series <= (series.get(slot.station) ?? 0);
    case "condition":
      return repeats.has(slot.move);
    case "note":
      return true;
  }
}

function roundDue(plan: DuePlan, round: "before" | "after"): Slot[] {
  return [
    ...plan.draftMarks.map(({ id }): Slot => ({ kind: "draft", mark: id, round })),
    ...(plan.freeboardMarks ?? []).map(({ id }): Slot => ({ kind: "freeboard", mark: id, round })),
    ...plan.tanks.map(({ id }): Slot => ({ kind: "sounding", tank: id, round })),
    ...plan.waterPlaces.map(({ place, depth }): Slot => ({ kind: "water", place, depth, round })),
  ];
}

function ballastDue(plan: DuePlan): Slot[] {
  const shifting = plan.tanks.filter(({ shifts }) => shifts === true);
  return plan.moves.flatMap(({ no }) => shifting.map(({ id }): Slot => ({ kind: "ballast", tank: id, move: no })));
}

function battenSlot(move: number, repeat: number, station: string, series: number): Slot {
  return { kind: "batten", move, repeat, station, series };
}

function raise<K>(highest: Map<K, number>, name: K, to: number): void {
  const now = highest.get(name);
  if (now !== undefined && to > now) highest.set(name, to);
}
