import { z } from "zod";
import { numberSchema, numbersSchema } from "@/components/ui/number-schema";
import type { TestRecord } from "@/lib/record/test-record";
import { type ReadingValue, valueSchemas } from "@/lib/sync/event";
import type { ReadingDue } from "@/lib/sync/live";
import type { Slot } from "@/lib/sync/slot";

/** A value called over the radio, as the lead types it. */
export type RadioTyped = { slotKey: string; mode: "settled" | "turning-points"; value: string; port: string; starboard: string };
export type RadioReading = { readonly slot: Slot; readonly value: ReadingValue };
export type EntryKind = "swing" | "legs" | "angle" | "metres" | "density";

type Stations = TestRecord["stations"];

export const radioEmpty: Omit<RadioTyped, "slotKey"> = { mode: "settled", value: "", port: "", starboard: "" };

const battenLimits = { least: -3000, most: 3000, sense: "A batten is read in millimetres: not more than 3000 to either side." };
const angleLimits = { least: -20, most: 20, sense: "An inclinometer is read in degrees: not more than 20 to either side." };
const metresLimits = { least: 0, most: 40, sense: "Marks and soundings are read in metres, from 0 to 40." };
const densityLimits = { least: 0.95, most: 1.1, sense: "Water is between 0.95 and 1.1 t/m³: type 1.025, not 1025." };

/** How a slot's value is typed. */
export function entryKind(slot: Slot, stations: Stations): EntryKind {
  if (slot.kind === "water") return "density";
  if (slot.kind !== "batten") return "metres";
  const instrument = stations.find((station) => station.id === slot.station)?.instrument;
  return instrument === "u-tube" ? "legs" : instrument === "inclinometer" ? "angle" : "swing";
}

/** Whether a slot can be filled by a value that is called out. */
export function isCalledByRadio(due: ReadingDue): boolean {
  return ["batten", "draft", "freeboard", "sounding", "ballast", "water"].includes(due.slot.kind);
}

/** The form's rule: what was typed becomes a reading of its slot, or a sentence beside the field. */
export function radioSchema(due: readonly ReadingDue[], stations: Stations) {
  const typed = z.object({
    slotKey: z.string(),
    mode: z.enum(["settled", "turning-points"]),
    value: z.string(),
    port: z.string(),
    starboard: z.string(),
  });
  return typed.transform((entry, context): RadioReading => {
    const slot = due.find((each) => each.slotKey === entry.slotKey)?.slot;
    if (!slot) return refused(context, "slotKey", "Choose which reading was called.");
    const value = readingValue(entry, entryKind(slot, stations), context);
    if (context.issues.length > 0) return z.NEVER;
    const fits = valueSchemas[slot.kind].safeParse(value);
    return fits.success ? { slot, value: fits.data } : refused(context, "value", "That does not fit this reading.");
  });
}

type Context = z.RefinementCtx;

function readingValue(entry: RadioTyped, kind: EntryKind, context: Context): ReadingValue {
  switch (kind) {
    case "swing":
      return enough(entry.mode, { valuesMm: field(context, "value", numbersSchema(battenLimits), entry.value) }, context);
    case "angle":
      return enough(entry.mode, { valuesDegrees: field(context, "value", numbersSchema(angleLimits), entry.value) }, context);
    case "legs":
      return legs(entry, context);
    case "metres":
      return { value: field(context, "value", numberSchema(metresLimits), entry.value) };
    case "density":
      return { density: field(context, "value", numberSchema(densityLimits), entry.value) };
  }
}

function legs(entry: RadioTyped, context: Context): ReadingValue {
  const portMm = field(context, "port", numbersSchema(battenLimits), entry.port);
  const starboardMm = field(context, "starboard", numbersSchema(battenLimits), entry.starboard);
  return { mode: "settled", portMm, starboardMm };
}

function enough<V extends { valuesMm: number[] } | { valuesDegrees: number[] }>(mode: RadioTyped["mode"], values: V, context: Context) {
  const read = "valuesMm" in values ? values.valuesMm : values.valuesDegrees;
  if (mode === "settled" || !Array.isArray(read) || read.length >= 3) return { mode, ...values };
  return refused(context, "value", `A swing needs at least 3 turning points in order; ${read.length} given.`);
}

function field<T>(context: Context, path: keyof RadioTyped, schema: z.ZodType<T, string>, typed: string): T {
  const read = schema.safeParse(typed);
  return read.success ? read.data : refused(context, path, read.error.issues[0]?.message ?? "That cannot be read.");
}

function refused(context: Context, path: keyof RadioTyped, message: string): never {
  context.addIssue({ code: "custom", path: [path], message });
  return z.NEVER;
}
