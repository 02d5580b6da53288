import { z } from "zod";
import { hydrostaticsSchema } from "./hydrostatics-schema";
import {
  aboardSchema,
  draftMarkSchema,
  freeboardMarkSchema,
  hydrometerSchema,
  itemSchema,
  moveSchema,
  previousSchema,
  stationSchema,
  tankSchema,
  weightSchema,
} from "./plan-schema";
import { name, nonNegative, positive, text, time } from "./quantities";
import {
  battenReadingSchema,
  conditionReadingSchema,
  draftReadingSchema,
  soundingReadingSchema,
  waterReadingSchema,
} from "./readings-schema";
import { settingsSchema } from "./settings-schema";

/** Standard uncertainties; a key left out is zero. */
const uncertaintySchema = z
  .strictObject({
    weightRelative: nonNegative,
    distance: nonNegative,
    length: nonNegative,
    readingMm: nonNegative,
    readingDegrees: nonNegative,
    draft: nonNegative,
    markZero: nonNegative,
    density: nonNegative,
    itemMassRelative: nonNegative,
    itemPosition: nonNegative,
    sounding: nonNegative,
    tankVolumeRelative: nonNegative,
    liquidDensity: nonNegative,
    volumeRelative: nonNegative,
    kmt: nonNegative,
  })
  .partial();

/**
 * One file that holds a whole test: plan, readings, decisions. Metres, tonnes, t/m³; the frame of `lib/frame.ts`.
 * Unknown keys are refused with their path.
 */
export const testRecordSchema = z.strictObject({
  format: z.literal("battenbook-record"),
  version: z.literal(1),
  test: z.strictObject({ id: z.uuid(), title: text, date: z.iso.date(), place: text, note: text.optional() }),
  vessel: z.strictObject({ name: text, hullNumber: name.optional(), lbp: positive, breadth: positive, depth: positive }),
  hydrostatics: hydrostaticsSchema,
  draftMarks: z.array(draftMarkSchema),
  freeboardMarks: z.array(freeboardMarkSchema).optional(),
  stations: z.array(stationSchema),
  weights: z.array(weightSchema),
  moves: z.array(moveSchema),
  tanks: z.array(tankSchema),
  aboard: z.array(aboardSchema),
  items: z.array(itemSchema),
  hydrometers: z.array(hydrometerSchema).optional(),
  previous: previousSchema.optional(),
  readings: z.strictObject({
    battens: z.array(battenReadingSchema),
    drafts: z.array(draftReadingSchema),
    freeboards: z.array(draftReadingSchema).optional(),
    soundings: z.array(soundingReadingSchema),
    water: z.array(waterReadingSchema),
    conditions: z.array(conditionReadingSchema).optional(),
  }),
  settings: settingsSchema.optional(),
  uncertainty: uncertaintySchema.optional(),
  people: z.array(z.unknown()).optional(),
  devices: z.array(z.strictObject({ id: z.uuid(), publicKey: z.record(z.string(), z.unknown()) })).optional(),
  files: z.array(z.strictObject({ sha256: z.string(), type: z.string(), of: z.string() })).optional(),
  attestations: z.array(z.strictObject({ role: name, name: text, at: time, head: z.string() })).optional(),
  events: z.array(z.unknown()).optional(),
  ledger: z.array(z.unknown()).optional(),
});

export type TestRecord = z.infer<typeof testRecordSchema>;
