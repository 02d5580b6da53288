import type { IncliningResult } from "@/lib/lightship/inclining-result";
import type { TestRecord } from "@/lib/record/test-record";

type Batten = TestRecord["readings"]["battens"][number];
type Moves = TestRecord["moves"];

/** The same test on the same ship seen in a mirror: port becomes starboard. */
export function mirrored(record: TestRecord): TestRecord {
  return {
    ...record,
    hydrostatics:
      record.hydrostatics.kind === "table"
        ? record.hydrostatics
        : { ...record.hydrostatics, appendages: record.hydrostatics.appendages?.map(across) },
    draftMarks: record.draftMarks.map(across),
    moves: mappedPositions(record.moves, ([x, y, z]) => [x, -y, z]),
    tanks: record.tanks.map((tank) => ({ ...tank, table: tank.table.map((row) => ({ ...row, tcg: -row.tcg })) })),
    aboard: record.aboard.map(across),
    items: record.items.map((item) => (item.action === "relocate" ? { ...item, y: -item.y, toY: -item.toY } : { ...item, y: -item.y })),
    readings: { ...record.readings, battens: record.readings.battens.map(mirroredBatten) },
  };
}

/** The same test in a world where everything, the water too, is heavier by a factor. */
export function heavierBy(record: TestRecord, factor: number): TestRecord {
  const heavier = <T extends { mass: number }>(item: T): T => ({ ...item, mass: item.mass * factor });
  const denser = <T extends { density: number }>(item: T): T => ({ ...item, density: item.density * factor });
  return {
    ...record,
    weights: record.weights.map(heavier),
    aboard: record.aboard.map(heavier),
    items: record.items.map(heavier),
    tanks: record.tanks.map(denser),
    readings: { ...record.readings, water: record.readings.water.map(denser) },
  };
}

/** The same test with one station's batten nailed on elsewhere. */
export function zeroShifted(record: TestRecord, station: string, mm: number): TestRecord {
  const battens = record.readings.battens.map((reading) => (reading.station === station ? shiftedBatten(reading, mm) : reading));
  return { ...record, readings: { ...record.readings, battens } };
}

/** The same test with one pendulum more, whose bob hangs on the line that the others gave. */
export function withAgreeingStation(record: TestRecord, { slope, moves }: IncliningResult["fit"], length: number): TestRecord {
  const battens = moves.map(({ no, moment }): Batten => {
    const valuesMm = [40 + 1000 * length * slope * moment];
    return { id: `00000000-0000-4000-8000-00000000000${no}`, move: no, station: "Z", mode: "settled", valuesMm };
  });
  return {
    ...record,
    stations: [...record.stations, { id: "Z", instrument: "pendulum", length }],
    readings: { ...record.readings, battens: [...record.readings.battens, ...battens] },
  };
}

function across<T extends { y: number }>(place: T): T {
  return { ...place, y: -place.y };
}

function mappedPositions(moves: Moves, map: (place: [number, number, number]) => [number, number, number]): Moves {
  return moves.map((move) => ({
    ...move,
    positions: Object.fromEntries(Object.entries(move.positions).map(([id, place]) => [id, map(place)])),
  }));
}

function mirroredBatten(reading: Batten): Batten {
  if ("valuesMm" in reading) return { ...reading, valuesMm: reading.valuesMm.map((value) => -value) };
  if ("portMm" in reading) return { ...reading, portMm: reading.starboardMm, starboardMm: reading.portMm };
  return { ...reading, valuesDegrees: reading.valuesDegrees.map((value) => -value) };
}

function shiftedBatten(reading: Batten, mm: number): Batten {
  if ("valuesMm" in reading) return { ...reading, valuesMm: reading.valuesMm.map((value) => value + mm) };
  if ("portMm" in reading) return { ...reading, portMm: reading.portMm.map((value) => value + mm) };
  return { ...reading, valuesDegrees: reading.valuesDegrees.map((value) => value + mm / 100) };
}
