import { and, asc, eq } from "drizzle-orm";
import type { TestRecord } from "@/lib/record/test-record";
import { type MoveRun, moveProgress } from "@/lib/sync/move-progress";
import type { Ordered } from "@/lib/sync/readings-due";
import { readingsOfRecord } from "@/lib/sync/recorded-reading";
import type { Slot } from "@/lib/sync/slot";
import { accounts } from "../schema/accounts";
import { readings, slots } from "../schema/readings";
import type { Database } from "./connection";
import { duePlan } from "./due-plan";
import { measuredLengths, measuredPositions } from "./measured";
import { moveEvents, seriesEvents } from "./orders";
import { present, some } from "./plan-rows";
import { planRecord } from "./test-plan";

/** A test as it stands: its plan with what was measured and ordered since, and every reading with its status. */
export function recordOf(db: Database, test: string): TestRecord {
  const record = planRecord(db, test);
  const ordered = duePlan(db, test)?.ordered;
  const runs = moveProgress(
    record.moves.map(({ no }) => no),
    moveEvents(db, test),
  );
  return {
    ...record,
    stations: stationsAsMeasured(db, record),
    moves: movesAsRun(db, record, runs, ordered),
    readings: standingReadings(db, record),
  };
}

function standingReadings(db: Database, { moves, test }: TestRecord): TestRecord["readings"] {
  const rows = db
    .select({ reading: readings, slot: slots.slot, reader: accounts.name })
    .from(readings)
    .innerJoin(slots, and(eq(slots.test, readings.test), eq(slots.slotKey, readings.slotKey)))
    .leftJoin(accounts, eq(accounts.id, readings.author))
    .where(eq(readings.test, test.id))
    .orderBy(asc(readings.slotKey), asc(readings.serverSeq))
    .all();
  const standing = rows.map(({ reading, slot, reader }) => recorded(reading, slot, reader));
  const { freeboards, conditions, ...always } = readingsOfRecord(standing, (no) => moves.find((move) => move.no === no)?.session);
  return { ...always, ...some("freeboards", freeboards), ...some("conditions", conditions) };
}

// a correction is a value of its own in the record: it can't go by the name of the reading it corrects
function recorded(row: typeof readings.$inferSelect, slot: Slot, reader: string | null) {
  const { event, reading, corrects, value, source, status, device, capturedAt, reason } = row;
  return { id: corrects ? event : reading, slot, value, source, status, device, takenAt: capturedAt, ...present({ reader, reason }) };
}

function movesAsRun(
  db: Database,
  { moves, test }: TestRecord,
  runs: readonly MoveRun[],
  ordered: Ordered | undefined,
): TestRecord["moves"] {
  const measured = measuredPositions(db, test.id);
  return moves.map((move) => {
    const repeat = ordered?.repeats.get(move.no) ?? 1;
    const run = runs.find((one) => one.move === move.no && one.repeat === repeat);
    const told = present({ openedAt: run?.openedAt, closedAt: run?.closedAt, excluded: run?.excluded });
    return { ...move, ...(repeat > 1 ? { repeat } : {}), ...told, positions: { ...move.positions, ...measured.get(move.no) } };
  });
}

/** Stations with the series ordered since and the lengths that were measured. */
function stationsAsMeasured(db: Database, { stations, test }: TestRecord): TestRecord["stations"] {
  const ordered = seriesEvents(db, test.id);
  const measured = measuredLengths(db, test.id);
  return stations.map((station) => {
    const told = new Map(seriesPlanned(station).map((one) => [one.no, one.length ?? one.span]));
    for (const { payload } of ordered)
      if (payload.station === station.id) told.set(payload.series, payload.length ?? told.get(payload.series));
    for (const { series, length } of measured) if (series.station === station.id && series.no > 1) told.set(series.no, length);
    const first = measured.find(({ series }) => series.station === station.id && series.no === 1)?.length;
    return withSeries(station, first, told);
  });
}

type Station = TestRecord["stations"][number];

function withSeries(station: Station, first: number | undefined, told: ReadonlyMap<number, number | undefined>): Station {
  const numbers = [...told].map(([no, length]) => ({ no, length }));
  const series = numbers.length > 0 ? numbers : undefined;
  switch (station.instrument) {
    case "pendulum":
      return {
        ...station,
        length: first ?? station.length,
        ...present({ series: series?.map(({ no, length }) => ({ no, ...present({ length }) })) }),
      };
    case "u-tube":
      return {
        ...station,
        span: first ?? station.span,
        ...present({ series: series?.map(({ no, length }) => ({ no, ...present({ span: length }) })) }),
      };
    case "inclinometer":
      return { ...station, ...present({ series: series?.map(({ no }) => ({ no })) }) };
  }
}

function seriesPlanned(station: Station): readonly { no: number; length?: number; span?: number }[] {
  return station.series ?? [];
}
