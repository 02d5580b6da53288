import { and, eq } from "drizzle-orm";
import type { ReadingValue } from "@/lib/sync/event";
import { valueSchemas } from "@/lib/sync/event";
import type { Slot, SlotKind } from "@/lib/sync/slot";
import { readings, slots } from "../schema/readings";
import type { Database } from "./connection";

type Place = [number, number, number];

/** Where each weight was measured to stand, by move; of several accepted measurements their mean. */
export function measuredPositions(db: Database, test: string): Map<number, Record<string, Place>> {
  const places = new Map<number, Record<string, Place>>();
  for (const { slot, values } of accepted(db, test, "position")) {
    if (slot.kind !== "position") continue;
    const measured = values.map((value) => valueSchemas.position.parse(value).place);
    const place: Place = [mean(measured.map(([x]) => x)), mean(measured.map(([, y]) => y)), mean(measured.map(([, , z]) => z))];
    places.set(slot.move, { ...places.get(slot.move), [slot.weight]: place });
  }
  return places;
}

export type MeasuredLength = { readonly series: { readonly station: string; readonly no: number }; readonly length: number };

/** The length of each pendulum or U-tube as it was measured, by series [m]. */
export function measuredLengths(db: Database, test: string): MeasuredLength[] {
  return accepted(db, test, "length").flatMap(({ slot, values }) => {
    if (slot.kind !== "length") return [];
    const length = mean(values.map((value) => valueSchemas.length.parse(value).length));
    return [{ series: { station: slot.station, no: slot.series }, length }];
  });
}

function accepted(db: Database, test: string, kind: SlotKind): { slot: Slot; values: ReadingValue[] }[] {
  const rows = db
    .select({ key: slots.slotKey, slot: slots.slot, value: readings.value })
    .from(readings)
    .innerJoin(slots, and(eq(slots.test, readings.test), eq(slots.slotKey, readings.slotKey)))
    .where(and(eq(readings.test, test), eq(readings.status, "accepted")))
    .all();
  const bySlot = new Map<string, { slot: Slot; values: ReadingValue[] }>();
  for (const { key, slot, value } of rows.filter((row) => row.slot.kind === kind)) {
    bySlot.set(key, { slot, values: [...(bySlot.get(key)?.values ?? []), value] });
  }
  return [...bySlot.values()];
}

function mean(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0) / values.length;
}
