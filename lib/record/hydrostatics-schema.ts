import { z } from "zod";
import { name, nonNegative, number, positive } from "./quantities";

const sectionSchema = z.strictObject({
  x: number,
  /** [half-breadth, z] from the keel to the deck edge */
  points: z.array(z.tuple([nonNegative, number])).min(1),
});

const appendageSchema = z.strictObject({ label: name, volume: number, x: number, y: number, z: number });

export const offsetsSchema = z.strictObject({
  kind: z.literal("offsets"),
  sections: z.array(sectionSchema).min(2),
  shellFactor: positive.optional(),
  appendages: z.array(appendageSchema).optional(),
});

const hydrostaticRowSchema = z.strictObject({
  trim: number,
  draft: positive,
  volume: positive,
  lcb: number,
  vcb: number,
  lcf: number,
  waterplaneArea: positive,
  kmt: number,
  kml: number,
});

export const hydrostaticTableSchema = z.strictObject({
  kind: z.literal("table"),
  rows: z.array(hydrostaticRowSchema).min(2),
  sagFraction: nonNegative.max(1).optional(),
});

export const hydrostaticsSchema = z.discriminatedUnion("kind", [offsetsSchema, hydrostaticTableSchema]);
