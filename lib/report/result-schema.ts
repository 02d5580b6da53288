import { z } from "zod";
import type { ResultDocument } from "./result-document";

const number = z.number();
const interval = z.tuple([number, number]);
const byName = z.record(z.string(), number);
const round = { draftAft: number, draftForward: number, draftMidships: number, trim: number, heelDegrees: number, sag: number };
const inclined = z.strictObject({ displacement: number, gm: number, vcg: number, lcg: number, tcg: number });
const centre = { lcg: number, tcg: number, vcg: number };

/** The result of a test as `reduce` prints it: the published shape of `ResultDocument`. Metres, tonnes, tangents, shares of 1. */
export const resultSchema = z.strictObject({
  waterline: z.strictObject({
    density: number,
    ...round,
    residuals: byName,
    sagFitted: z.boolean(),
    marks: z.array(
      z.strictObject({
        mark: z.string(),
        kind: z.enum(["draft", "freeboard"]),
        value: number,
        estimates: number,
        scatter: number.nullable(),
        residual: number,
        change: number.nullable(),
      }),
    ),
    after: z.strictObject(round).nullable(),
  }),
  hydrostatics: z.strictObject({
    source: z.enum(["offsets", "table"]),
    volume: number,
    displacement: number,
    lcb: number,
    vcb: number,
    tcb: number.nullable(),
    kmt: number,
    lcf: number,
  }),
  fit: z.strictObject({
    slope: number,
    slopeUncertainty: number,
    degreesOfFreedom: number,
    halfWidth95: number,
    betweenMoves: number,
    withinMoves: number.nullable(),
    stations: z.array(
      z.strictObject({
        id: z.string(),
        series: number,
        session: number,
        slope: number.nullable(),
        intercept: number.nullable(),
        residuals: byName,
      }),
    ),
    moves: z.array(z.strictObject({ no: number, session: number, moment: number, tanHeel: number, gm: number.nullable() })),
  }),
  asInclined: z.strictObject({
    displacement: number,
    gmFluid: number,
    freeSurfaceCorrection: number,
    gmSolid: number,
    ...centre,
    uncertainty: inclined,
  }),
  generalised: z.strictObject({ vcg: number, tcg: number }).nullable(),
  lightship: z.strictObject({
    displacement: number,
    ...centre,
    vcgGeneralised: number.nullable(),
    headline: z.enum(["classical", "generalised"]),
    interval95: z.strictObject({ displacement: interval, vcg: interval, lcg: interval, vcgGeneralised: interval.optional() }),
  }),
  budget: z.array(z.strictObject({ input: z.string(), share: number })),
  checks: z.array(
    z.strictObject({
      id: z.string(),
      verdict: z.enum(["met", "attention", "not-met"]),
      found: z.string(),
      limit: z.string(),
      source: z.string(),
    }),
  ),
  hints: z.array(z.strictObject({ cause: z.string(), moves: z.array(number), evidence: z.string() })),
  assumptions: z.array(z.string()),
});

/** A result as this schema reads it back. */
export type ReadResult = z.infer<typeof resultSchema>;

/** Every result we make is one that the schema reads: a key that is missing here would not compile. */
export function asReadResult(document: ResultDocument): ReadResult {
  return resultSchema.parse(document);
}
