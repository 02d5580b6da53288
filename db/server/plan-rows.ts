import type { TestRecord } from "@/lib/record/test-record";
import type { planAboard, planHydrometers, planItems, planMoves, planSeries, planStations, planWeights } from "../schema/plan";

/** A plan as the record writes it, and as rows: the one place that knows both. */

type Station = TestRecord["stations"][number];
type StationRow = typeof planStations.$inferSelect;
type SeriesRow = typeof planSeries.$inferSelect;

export type StationWords = { readonly where?: string; readonly scale?: readonly [number, number] };

export function stationToRow(test: string, station: Station, place: number, words: StationWords | undefined): StationRow {
  const [scaleFrom = null, scaleTo = null] = words?.scale ?? [];
  const { id, instrument, x = null, reversed = null } = station;
  return { test, place, id, instrument, x, reversed, measure: measureOf(station), where: words?.where ?? null, scaleFrom, scaleTo };
}

export function seriesToRows(test: string, station: Station): SeriesRow[] {
  const series: readonly { no: number; length?: number; span?: number }[] = station.series ?? [];
  return series.map(({ no, length, span }, place) => ({ test, place, station: station.id, no, measure: length ?? span ?? null }));
}

export function stationFromRow(row: StationRow, seriesRows: readonly SeriesRow[]): Station {
  const { id, instrument } = row;
  const own = seriesRows.filter(({ station }) => station === id);
  const mounted = { id, ...present({ x: row.x, reversed: row.reversed }) };
  if (instrument === "inclinometer")
    return {
      ...mounted,
      instrument,
      ...some(
        "series",
        own.map(({ no }) => ({ no })),
      ),
    };
  const measure = row.measure ?? 0;
  if (instrument === "u-tube") {
    return {
      ...mounted,
      instrument,
      span: measure,
      ...some(
        "series",
        own.map(({ no, measure }) => ({ no, ...present({ span: measure }) })),
      ),
    };
  }
  return {
    ...mounted,
    instrument,
    length: measure,
    ...some(
      "series",
      own.map(({ no, measure }) => ({ no, ...present({ length: measure }) })),
    ),
  };
}

export function weightFromRow({ id, mass, certificate }: typeof planWeights.$inferSelect): TestRecord["weights"][number] {
  return { id, mass, ...present({ certificate }) };
}

export function moveFromRow({ no, session, positions }: typeof planMoves.$inferSelect): TestRecord["moves"][number] {
  return { no, ...present({ session }), positions };
}

export function hydrometerFromRow(row: typeof planHydrometers.$inferSelect): NonNullable<TestRecord["hydrometers"]>[number] {
  const { id, scale, correction, certificate } = row;
  return { id, scale, ...present({ correction, certificate }) };
}

export function aboardFromRow(row: typeof planAboard.$inferSelect): TestRecord["aboard"][number] {
  const { label, mass, x, y, z, during } = row;
  return { label, mass, x, y, z, ...present({ during }) };
}

export function itemFromRow(row: typeof planItems.$inferSelect): TestRecord["items"][number] {
  const { label, mass, x, y, z, action } = row;
  if (action !== "relocate") return { action, label, mass, x, y, z };
  return { action, label, mass, x, y, z, toX: row.toX ?? x, toY: row.toY ?? y, toZ: row.toZ ?? z };
}

export function some<K extends string, T>(name: K, list: readonly T[]): { [key in K]?: T[] } {
  return list.length > 0 ? ({ [name]: [...list] } as { [key in K]?: T[] }) : {};
}

type Present<T> = { [K in keyof T]?: NonNullable<T[K]> };

/** The members that a row holds: the record leaves out what the database keeps as null. */
export function present<T extends Record<string, unknown>>(members: T): Present<T> {
  return Object.fromEntries(Object.entries(members).filter(([, value]) => value !== null && value !== undefined)) as Present<T>;
}

function measureOf(station: Station): number | null {
  if (station.instrument === "pendulum") return station.length;
  return station.instrument === "u-tube" ? station.span : null;
}
