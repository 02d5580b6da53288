import { z } from "zod";
import { name, nonNegative, number, ordinal, positive, text, time, wholeNumber } from "@/lib/record/quantities";
import { roundSchema } from "@/lib/record/readings-schema";

export const roleSchema = z.enum(["reader", "lead", "engineer", "witness", "administrator"]);
export type Role = z.infer<typeof roleSchema>;

export const testStateSchema = z.enum(["planning", "open", "closed", "reconciled", "issued"]);
export type TestState = z.infer<typeof testStateSchema>;

const stationOnSheet = z.strictObject({
  id: name,
  instrument: z.enum(["pendulum", "u-tube", "inclinometer"]),
  /** where it hangs, in words */
  place: text.nullable(),
  /** length of the pendulum or span of the U-tube in the current series [m]; null for an inclinometer */
  length: positive.nullable(),
  /** the batten's scale: what can be read on it at all [mm, or degrees for an inclinometer] */
  scale: z.tuple([number, number]),
  series: ordinal,
});

/** Everything a phone needs for one test. A reader's sheet holds no predictions and nobody's readings. */
export const jobSheetSchema = z.strictObject({
  format: z.literal("battenbook-job"),
  /** SHA-256 of the plan part; stands in every event captured by this sheet */
  tag: z.string(),
  test: z.strictObject({ id: z.uuid(), title: text, date: z.iso.date(), place: text, timeZone: text, state: testStateSchema }),
  vessel: z.strictObject({ name: text, lbp: positive }),
  person: z.strictObject({ id: z.uuid(), name: text, roles: z.array(roleSchema) }),
  stations: z.array(stationOnSheet),
  weights: z.array(z.strictObject({ id: name })),
  /** the highest repeat ordered so far, and whether readings are being taken now */
  moves: z.array(z.strictObject({ no: wholeNumber, label: text, repeat: ordinal, state: z.enum(["due", "open", "closed"]) })),
  draftMarks: z.array(z.strictObject({ id: name, place: text })),
  freeboardMarks: z.array(z.strictObject({ id: name, place: text })),
  tanks: z.array(
    z.strictObject({ id: name, contents: text, measure: z.enum(["sounding", "ullage"]), gasDangerous: z.boolean(), shifts: z.boolean() }),
  ),
  water: z.array(z.strictObject({ place: name, depth: nonNegative })),
  hydrometers: z.array(name),
  rounds: z.array(roundSchema),
  issuedAt: time,
});
export type JobSheet = z.infer<typeof jobSheetSchema>;
