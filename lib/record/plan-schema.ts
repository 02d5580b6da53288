import { z } from "zod";
import { name, nonNegative, number, ordinal, place, positive, text, time, wholeNumber } from "./quantities";

const sited = { x: number, y: number };

export const draftMarkSchema = z.strictObject({
  id: name,
  ...sited,
  /** height of the mark's zero above the baseline */
  zero: number,
  /** raked or curved marks: [reading, x, y, z] */
  table: z
    .array(z.tuple([number, number, number, number]))
    .min(2)
    .optional(),
});

export const freeboardMarkSchema = z.strictObject({ id: name, ...sited, deckEdge: number });

const seriesOfLength = z.array(z.strictObject({ no: ordinal, length: positive.optional() })).optional();
const seriesOfSpan = z.array(z.strictObject({ no: ordinal, span: positive.optional() })).optional();
const seriesOfAngle = z.array(z.strictObject({ no: ordinal })).optional();

const mounted = { id: name, x: number.optional(), reversed: z.boolean().optional() };

/** Length and span may be 0 in a document: the reduction refuses them with the station's name. */
export const stationSchema = z.discriminatedUnion("instrument", [
  z.strictObject({ ...mounted, instrument: z.literal("pendulum"), length: nonNegative, series: seriesOfLength }),
  z.strictObject({ ...mounted, instrument: z.literal("u-tube"), span: nonNegative, series: seriesOfSpan }),
  z.strictObject({ ...mounted, instrument: z.literal("inclinometer"), series: seriesOfAngle }),
]);

export const weightSchema = z.strictObject({ id: name, mass: positive, certificate: text.optional() });

export const moveSchema = z.strictObject({
  no: wholeNumber,
  session: ordinal.optional(),
  repeat: ordinal.optional(),
  openedAt: time.optional(),
  closedAt: time.optional(),
  excluded: text.optional(),
  positions: z.record(name, place),
});

const tankLevelSchema = z.strictObject({
  trim: number.optional(),
  level: nonNegative,
  volume: nonNegative,
  lcg: number,
  tcg: number,
  vcg: number,
  inertia: nonNegative,
  inertiaLongitudinal: nonNegative.optional(),
});

const between = z.tuple([number, number]).refine(([from, to]) => from < to, "from a lower to a higher number");

export const tankSchema = z.strictObject({
  id: name,
  contents: text,
  density: positive,
  kind: z.enum(["deep", "double-bottom"]).optional(),
  measure: z.enum(["sounding", "ullage"]),
  pipe: z.tuple([number, number]).optional(),
  table: z.array(tankLevelSchema).min(1),
  /** six walls square to the ship, where the tank is a box: its liquid is then followed exactly as she heels */
  box: z.strictObject({ x: between, y: between, z: between }).optional(),
  shifts: z.boolean().optional(),
});

export const aboardSchema = z.strictObject({
  label: text,
  mass: positive,
  x: number,
  y: number,
  z: number,
  during: z.enum(["drafts", "moves", "both"]).optional(),
});

const item = { label: text, mass: positive, x: number, y: number, z: number };

export const itemSchema = z.discriminatedUnion("action", [
  z.strictObject({ action: z.literal("deduct"), ...item }),
  z.strictObject({ action: z.literal("add"), ...item }),
  z.strictObject({ action: z.literal("relocate"), ...item, toX: number, toY: number, toZ: number }),
]);

export const hydrometerSchema = z.strictObject({
  id: name,
  scale: z.enum(["density-vacuum", "density-air", "specific-gravity"]),
  correction: number.optional(),
  certificate: text.optional(),
});

export const previousSchema = z.strictObject({
  kind: z.enum(["earlier", "sister"]),
  displacement: positive,
  vcg: number,
  lcg: number,
});
