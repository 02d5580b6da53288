import { z } from "zod";
import { name, ordinal, place, positive, text, time, wholeNumber } from "@/lib/record/quantities";
import {
  battenValueSchema,
  conditionValueSchema,
  markValueSchema,
  soundingValueSchema,
  sourceSchema,
  waterValueSchema,
} from "@/lib/record/readings-schema";
import { photographNamesSchema } from "./photograph-names";
import { slotSchema } from "./slot";

/** What a reading holds, by the kind of its slot. Millimetres only on battens; metres, t/m³ and °C elsewhere. */
export const valueSchemas = {
  batten: battenValueSchema,
  draft: markValueSchema,
  freeboard: markValueSchema,
  sounding: soundingValueSchema,
  ballast: soundingValueSchema,
  water: waterValueSchema,
  position: z.strictObject({ place }),
  length: z.strictObject({ length: positive }),
  condition: conditionValueSchema,
  note: z.strictObject({ text }),
} as const;

export const readingValueSchema = z.union([
  battenValueSchema,
  markValueSchema,
  soundingValueSchema,
  waterValueSchema,
  valueSchemas.position,
  valueSchemas.length,
  valueSchemas.note,
  conditionValueSchema,
]);
export type ReadingValue = z.infer<typeof readingValueSchema>;

const eventId = z.uuid();
const hash = z.string().regex(/^[0-9a-f]{64}$/);

/** Every act carries who, where and when; the device numbers its own acts without gaps from 1. */
const act = {
  v: z.literal(1),
  id: eventId,
  device: z.uuid(),
  seq: ordinal,
  test: z.uuid(),
  jobTag: z.string().min(1).max(64),
  author: z.uuid(),
  capturedAt: time,
  clockOffsetMs: z.number().int().nullable(),
  reason: text.nullable(),
};
const noReading = { reading: z.null(), base: z.null(), slot: z.null(), source: z.null() };
const moveRun = z.strictObject({ move: wholeNumber, repeat: ordinal });

/** The choice that settles a disagreement: one of the heads, their mean, a new value, or none of them. */
export const choiceSchema = z.discriminatedUnion("choice", [
  z.strictObject({ choice: z.literal("one"), head: eventId }),
  z.strictObject({ choice: z.literal("mean") }),
  z.strictObject({ choice: z.literal("new"), value: readingValueSchema }),
  z.strictObject({ choice: z.literal("none") }),
]);

/**
 * A person's act, as one immutable event. `base` is the event the person was looking at
 * (correct, void), or every head that a resolve settles.
 */
export const eventBodySchema = z.discriminatedUnion("type", [
  z.strictObject({
    ...act,
    type: z.literal("record"),
    reading: z.uuid(),
    base: z.null(),
    slot: slotSchema,
    payload: readingValueSchema,
    source: sourceSchema,
    photographs: photographNamesSchema.optional(),
  }),
  z.strictObject({
    ...act,
    type: z.literal("correct"),
    reading: z.uuid(),
    base: eventId,
    slot: slotSchema,
    payload: readingValueSchema,
    source: sourceSchema,
    photographs: photographNamesSchema.optional(),
  }),
  z.strictObject({
    ...act,
    type: z.literal("void"),
    reading: z.uuid(),
    base: eventId,
    slot: slotSchema,
    payload: z.strictObject({}),
    source: z.null(),
  }),
  z.strictObject({
    ...act,
    type: z.literal("resolve"),
    reading: z.null(),
    base: z.array(eventId).min(1),
    slot: slotSchema.nullable(),
    payload: choiceSchema,
    source: z.null(),
  }),
  z.strictObject({ ...act, type: z.literal("assign"), ...noReading, slot: slotSchema, payload: z.strictObject({ event: eventId }) }),
  z.strictObject({ ...act, type: z.literal("release"), ...noReading, payload: z.strictObject({ event: eventId }) }),
  z.strictObject({ ...act, type: z.literal("move.open"), ...noReading, payload: moveRun }),
  z.strictObject({ ...act, type: z.literal("move.close"), ...noReading, payload: moveRun }),
  z.strictObject({ ...act, type: z.literal("move.repeat"), ...noReading, payload: moveRun }),
  z.strictObject({ ...act, type: z.literal("move.exclude"), ...noReading, payload: moveRun }),
  z.strictObject({
    ...act,
    type: z.literal("station.series"),
    ...noReading,
    payload: z.strictObject({ station: name, series: ordinal, length: positive.optional() }),
  }),
  z.strictObject({ ...act, type: z.literal("session.open"), ...noReading, payload: z.strictObject({ session: ordinal }) }),
  z.strictObject({ ...act, type: z.literal("session.close"), ...noReading, payload: z.strictObject({ session: ordinal }) }),
  z.strictObject({ ...act, type: z.literal("device.writeOff"), ...noReading, payload: z.strictObject({ device: z.uuid() }) }),
  z.strictObject({ ...act, type: z.literal("attest"), ...noReading, payload: z.strictObject({ head: hash }) }),
]);

export type EventBody = z.infer<typeof eventBodySchema>;
export type EventType = EventBody["type"];
export type EventOf<T extends EventType> = Extract<EventBody, { type: T }>;
export type ReadingEvent = EventOf<"record" | "correct" | "void">;
