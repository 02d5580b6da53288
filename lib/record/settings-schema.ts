import { z } from "zod";
import { nonNegative, number, ordinal, positive } from "./quantities";

const agreementSchema = z.strictObject({
  battenMm: positive,
  degrees: positive,
  draft: positive,
  sounding: positive,
  density: positive,
});

const range = z.tuple([nonNegative, positive]).refine(([low, high]) => low < high, "a lower limit below the upper one");
const shareBelowOne = positive.lt(1);

/** Limits of the checks in place of the usual ones; a key left out keeps its usual limit. Degrees, metres, shares of 1. */
const limitsSchema = z
  .strictObject({
    heel: range,
    deflectionMm: positive,
    stations: z.strictObject({ recommended: ordinal, least: ordinal }),
    smallShip: nonNegative,
    equalLengths: nonNegative,
    stationSlope: positive,
    zeroDrift: positive,
    movements: z.strictObject({ full: ordinal, straight: ordinal }),
    straightness: shareBelowOne,
    initialList: positive,
    trim: nonNegative,
    freeboards: ordinal,
    largeShip: nonNegative,
    markError: positive,
    draftChange: positive,
    soundingChange: positive,
    slackGroups: z.number().int().nonnegative(),
    deepTank: range,
    doubleBottomTank: range,
    underKeel: nonNegative,
    missing: nonNegative,
    surplus: nonNegative,
  })
  .partial();

/** The ship as she is expected to be inclined, from which a plan is predicted; KG with the liquids free. */
export const expectedShipSchema = z.strictObject({ displacement: positive, lcg: number, tcg: number, vcg: number, density: positive });

/** How a test is reduced and what it is held against. Every key may be left out: then the usual holds. */
export const settingsSchema = z.strictObject({
  method: z.enum(["classical", "generalised"]).optional(),
  weights: z.enum(["equal", "readings"]).optional(),
  seed: z.number().int().optional(),
  draws: ordinal.optional(),
  agreement: agreementSchema.optional(),
  limits: limitsSchema.optional(),
  expected: expectedShipSchema.optional(),
});

export type TestSettings = z.infer<typeof settingsSchema>;
