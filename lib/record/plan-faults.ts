import type { NoPosition, NoReferenceMove } from "@/lib/inclining/shift-moments";
import { documentPath } from "./document-path";
import type { RecordFault, RepeatedName } from "./record-faults";
import type { TestRecord } from "./test-record";

export type PlanFault = RecordFault | NoReferenceMove | (NoPosition & { readonly path: string });

/** What does not fit together in a record's plan: names given twice, no move 0, a move without the place of a weight. */
export function planFaults(record: TestRecord): readonly PlanFault[] {
  const marks = [...named("draftMarks", record.draftMarks), ...named("freeboardMarks", record.freeboardMarks ?? [])];
  return [
    ...repeated(marks),
    ...repeated(named("stations", record.stations)),
    ...record.stations.flatMap((station, i) => repeated(numbered(`stations[${i}].series`, station.series ?? []))),
    ...repeated(named("weights", record.weights)),
    ...repeated(named("tanks", record.tanks)),
    ...repeated(named("hydrometers", record.hydrometers ?? [])),
    ...repeated(record.moves.map((move, i) => ({ name: runOf(move), path: `moves[${i}].no` }))),
    ...(record.moves.some(({ no, session }) => no === 0 && (session ?? 1) === 1) ? [] : [noReferenceMove]),
    ...record.moves.flatMap((move, i) => positionFaults(record, move, i)),
  ];
}

type Named = { readonly name: string; readonly path: string };
type Move = TestRecord["moves"][number];

const noReferenceMove: NoReferenceMove = { type: "NoReferenceMove", path: "moves" };

/** The second and every later use of a name. */
export function repeated(names: readonly Named[]): readonly RepeatedName[] {
  const first = new Map<string, string>();
  return names.flatMap(({ name, path }) => {
    const before = first.get(name);
    if (before !== undefined) return [{ type: "RepeatedName", name, first: before, path } as const];
    first.set(name, path);
    return [];
  });
}

function positionFaults({ weights }: TestRecord, { no, positions }: Move, index: number): readonly PlanFault[] {
  const path = documentPath(["moves", index, "positions"]);
  const missing = weights
    .filter(({ id }) => positions[id] === undefined)
    .map(({ id }) => ({ type: "NoPosition", weight: id, move: no, path }) as const);
  const unknown = Object.keys(positions).filter((name) => weights.every(({ id }) => id !== name));
  return [
    ...missing,
    ...unknown.map(
      (name) => ({ type: "UnknownReference", kind: "weight", name, path: documentPath(["moves", index, "positions", name]) }) as const,
    ),
  ];
}

function named(list: string, entries: readonly { readonly id: string }[]): readonly Named[] {
  return entries.map(({ id }, i) => ({ name: id, path: `${list}[${i}].id` }));
}

function numbered(list: string, entries: readonly { readonly no: number }[]): readonly Named[] {
  return entries.map(({ no }, i) => ({ name: String(no), path: `${list}[${i}].no` }));
}

function runOf({ no, repeat = 1, session = 1 }: Move): string {
  return `move ${no}${repeat > 1 ? `, repeat ${repeat}` : ""}${session > 1 ? `, session ${session}` : ""}`;
}
