import { type ReadingRefusal, readingShown } from "@/lib/inclining/reading-shown";
import type { Provenance } from "@/lib/inclining/test-readings";
import { repeated } from "./plan-faults";
import type { RecordFault, ReferenceKind } from "./record-faults";
import type { TestRecord } from "./test-record";

export type ReadingFault = RecordFault | (ReadingRefusal & { readonly path: string });

/**
 * What does not fit in the accepted readings of a record: ids given twice, names that the plan does not know, values that
 * can't be read. Readings with another status take no part in the reduction and may be kept as they came.
 */
export function readingFaults(record: TestRecord): readonly ReadingFault[] {
  const { battens, drafts, freeboards, soundings, water } = record.readings;
  const read = [
    ...accepted("battens", battens),
    ...accepted("drafts", drafts),
    ...accepted("freeboards", freeboards ?? []),
    ...accepted("soundings", soundings),
    ...accepted("water", water),
  ];
  return [
    ...repeated(read.map(({ reading, path }) => ({ name: reading.id, path: `${path}.id` }))),
    ...accepted("battens", battens).flatMap(({ reading, path }) => battenFaults(record, reading, path)),
    ...accepted("drafts", drafts).flatMap(({ reading, path }) => unknown("mark", reading.mark, record.draftMarks, `${path}.mark`)),
    ...accepted("freeboards", freeboards ?? []).flatMap(({ reading, path }) =>
      unknown("freeboard mark", reading.mark, record.freeboardMarks ?? [], `${path}.mark`),
    ),
    ...accepted("soundings", soundings).flatMap(({ reading, path }) => soundingFaults(record, reading, path)),
    ...accepted("water", water).flatMap(({ reading, path }) => waterFaults(record, reading, path)),
  ];
}

type Placed<T> = { readonly reading: T; readonly path: string };
type Batten = TestRecord["readings"]["battens"][number];
type Sounding = TestRecord["readings"]["soundings"][number];
type Water = TestRecord["readings"]["water"][number];
type Station = TestRecord["stations"][number];

function accepted<T extends Provenance>(list: string, readings: readonly T[]): readonly Placed<T>[] {
  const placed = readings.map((reading, i) => ({ reading, path: `readings.${list}[${i}]` }));
  return placed.filter(({ reading }) => (reading.status ?? "accepted") === "accepted");
}

function battenFaults(record: TestRecord, reading: Batten, path: string): readonly ReadingFault[] {
  const station = record.stations.find(({ id }) => id === reading.station);
  return [
    ...unknown("station", reading.station, record.stations, `${path}.station`),
    ...unknownMove(record, reading.move, `${path}.move`, reading.session ?? 1),
    ...(station === undefined ? [] : [...unknownSeries(station, reading, path), ...valueFaults(station, reading, path)]),
  ];
}

// series 1 is what a station begins with, listed or not
function unknownSeries({ series = [] }: Station, reading: Batten, path: string): readonly RecordFault[] {
  const no = reading.series ?? 1;
  const isKnown = no === 1 || series.some((each) => each.no === no);
  return isKnown ? [] : [{ type: "UnknownReference", kind: "series", name: String(no), path: `${path}.series` }];
}

function valueFaults(station: Station, reading: Batten, path: string): readonly ReadingFault[] {
  const shown = readingShown(station, reading);
  if (shown.ok) return [];
  return [{ ...shown.refusal, path: `${path}.${shown.refusal.path ?? valueKeyOf(reading)}` }];
}

function valueKeyOf(reading: Batten): string {
  if ("valuesMm" in reading) return "valuesMm";
  return "portMm" in reading ? "portMm" : "valuesDegrees";
}

function soundingFaults(record: TestRecord, { tank, round, move }: Sounding, path: string): readonly ReadingFault[] {
  const faults = [
    ...unknown("tank", tank, record.tanks, `${path}.tank`),
    ...(move === undefined ? [] : unknownMove(record, move, `${path}.move`)),
  ];
  if ((round === undefined) === (move === undefined)) {
    return [...faults, { type: "SoundingWithoutPlace", given: round === undefined ? "neither" : "both", path }];
  }
  const isBallast = record.tanks.some(({ id, shifts }) => id === tank && shifts);
  const isKnown = record.tanks.some(({ id }) => id === tank);
  return move === undefined || isBallast || !isKnown ? faults : [...faults, { type: "NotBallast", tank, path: `${path}.move` }];
}

function waterFaults({ hydrometers = [] }: TestRecord, { hydrometer }: Water, path: string): readonly RecordFault[] {
  return hydrometer === undefined ? [] : unknown("hydrometer", hydrometer, hydrometers, `${path}.hydrometer`);
}

function unknown(kind: ReferenceKind, name: string, known: readonly { readonly id: string }[], path: string): readonly RecordFault[] {
  return known.some(({ id }) => id === name) ? [] : [{ type: "UnknownReference", kind, name, path }];
}

function unknownMove({ moves }: TestRecord, move: number, path: string, session?: number): readonly RecordFault[] {
  const isKnown = moves.some((each) => each.no === move && (session === undefined || (each.session ?? 1) === session));
  return isKnown ? [] : [{ type: "UnknownReference", kind: "move", name: String(move), path }];
}
