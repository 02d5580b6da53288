import type { JobSheet } from "@/lib/sync/job-sheet";
import type { Slot } from "@/lib/sync/slot";

type Query = Pick<URLSearchParams, "get">;

/** The page on which a slot is read, with the slot in the query: the pages themselves are the same for every test. */
export function slotHref(test: string, slot: Slot): string {
  const { kind, ...rest } = slot;
  const page = pages[kind];
  const named = kind === "freeboard" || kind === "note" ? { kind } : {};
  const query = new URLSearchParams(Object.entries({ test, ...named, ...rest }).map(([name, value]) => [name, String(value)]));
  return `/readings/${page}?${query}`;
}

const pages: Record<Slot["kind"], string> = {
  batten: "batten",
  draft: "draft",
  freeboard: "draft",
  sounding: "sounding",
  ballast: "sounding",
  water: "water",
  condition: "conditions",
  note: "conditions",
  position: "held",
  length: "held",
};

/** The batten slot a query names, in the station's current series; null where the sheet has no such station or move. */
export function battenSlot(query: Query, { stations, moves }: JobSheet): Extract<Slot, { kind: "batten" }> | null {
  const station = stations.find(({ id }) => id === query.get("station"));
  const move = moves.find(({ no }) => String(no) === query.get("move"));
  if (!station || !move) return null;
  const repeat = Math.max(1, Number(query.get("repeat") ?? move.repeat) || 1);
  return { kind: "batten", move: move.no, repeat, station: station.id, series: station.series };
}

export function markSlot(query: Query, sheet: JobSheet): Extract<Slot, { kind: "draft" | "freeboard" }> | null {
  const kind = query.get("kind") === "freeboard" ? "freeboard" : "draft";
  const marks = kind === "freeboard" ? sheet.freeboardMarks : sheet.draftMarks;
  const mark = marks.find(({ id }) => id === query.get("mark"));
  return mark ? { kind, mark: mark.id, round: roundOf(query) } : null;
}

export function tankSlot(query: Query, { tanks, moves }: JobSheet): Extract<Slot, { kind: "sounding" | "ballast" }> | null {
  const tank = tanks.find(({ id }) => id === query.get("tank"));
  if (!tank) return null;
  const move = moves.find(({ no }) => String(no) === query.get("move"));
  return move ? { kind: "ballast", tank: tank.id, move: move.no } : { kind: "sounding", tank: tank.id, round: roundOf(query) };
}

export function waterSlot(query: Query, { water }: JobSheet): Extract<Slot, { kind: "water" }> | null {
  const sample = water.find(({ place, depth }) => place === query.get("place") && String(depth) === query.get("depth"));
  return sample ? { kind: "water", ...sample, round: roundOf(query) } : null;
}

export function conditionSlot(query: Query, { moves }: JobSheet): Extract<Slot, { kind: "condition" | "note" }> | null {
  if (query.get("kind") === "note") return { kind: "note" };
  const move = moves.find(({ no }) => String(no) === query.get("move"));
  return move ? { kind: "condition", move: move.no } : null;
}

function roundOf(query: Query): "before" | "after" {
  return query.get("round") === "after" ? "after" : "before";
}
