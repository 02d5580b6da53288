import { z } from "zod";
import { name, nonNegative, number, ordinal, positive, text, time, wholeNumber } from "./quantities";

export const sourceSchema = z.enum(["station", "radio", "paper"]);
export const statusSchema = z.enum(["accepted", "superseded", "void", "disagrees", "quarantined"]);
export const roundSchema = z.enum(["before", "after"]);
export const modeSchema = z.enum(["settled", "turning-points"]);

/** What was read, by kind of reading; the same shapes stand in events, in the projection and in the record. */
const swing = z.array(number).min(1).max(60);
export const battenValueSchema = z.union([
  z.strictObject({ mode: modeSchema, valuesMm: swing }),
  z.strictObject({ mode: modeSchema, portMm: swing, starboardMm: swing }),
  z.strictObject({ mode: modeSchema, valuesDegrees: swing }),
]);
export const markValueSchema = z.strictObject({ value: number, estimates: z.array(number).min(1).max(60).optional() });
export const soundingValueSchema = z.strictObject({ value: nonNegative });
export const waterValueSchema = z.strictObject({ density: positive, hydrometer: name.optional(), temperature: number.optional() });
export const conditionValueSchema = z.strictObject({
  wind: text.optional(),
  underKeel: number.optional(),
  moorings: text.optional(),
  headcount: wholeNumber.optional(),
  bobFree: z.boolean().optional(),
  note: text.optional(),
});

const provenance = {
  reader: text.optional(),
  device: z.uuid().optional(),
  takenAt: time.optional(),
  source: sourceSchema.optional(),
  reason: text.optional(),
  status: statusSchema.optional(),
};

const battenAt = {
  id: z.uuid(),
  move: wholeNumber,
  station: name,
  series: ordinal.optional(),
  repeat: ordinal.optional(),
  session: ordinal.optional(),
  mode: modeSchema,
  ...provenance,
};

export const battenReadingSchema = z.union([
  z.strictObject({ ...battenAt, valuesMm: swing }),
  z.strictObject({ ...battenAt, portMm: swing, starboardMm: swing }),
  z.strictObject({ ...battenAt, valuesDegrees: swing }),
]);

export const draftReadingSchema = z.strictObject({
  id: z.uuid(),
  mark: name,
  round: roundSchema,
  ...markValueSchema.shape,
  ...provenance,
});

export const soundingReadingSchema = z.strictObject({
  id: z.uuid(),
  tank: name,
  round: roundSchema.optional(),
  move: wholeNumber.optional(),
  ...soundingValueSchema.shape,
  ...provenance,
});

export const waterReadingSchema = z.strictObject({
  id: z.uuid(),
  place: name,
  depth: nonNegative,
  round: roundSchema.optional(),
  ...waterValueSchema.shape,
  ...provenance,
});

export const conditionReadingSchema = z.strictObject({
  id: z.uuid(),
  move: wholeNumber,
  ...conditionValueSchema.shape,
  ...provenance,
});
