import { asc, eq } from "drizzle-orm";
import { z } from "zod";
import { name, nonNegative, number, text } from "@/lib/record/quantities";
import { roundSchema } from "@/lib/record/readings-schema";
import { planMoves, planSettings, planStations, planWaterPlaces } from "../schema/plan";
import type { Database } from "./connection";
import { present } from "./plan-rows";

/** What readers need beside the record: where a thing hangs or stands in words, the batten's scale, where water is drawn, which rounds there are. */
export const sheetWordsSchema = z.strictObject({
  stations: z.record(name, z.strictObject({ where: text.optional(), scale: z.tuple([number, number]).optional() })),
  marks: z.record(name, text),
  moves: z.record(z.string(), text),
  water: z.array(z.strictObject({ place: name, depth: nonNegative })),
  rounds: z.array(roundSchema).min(1),
  /** tanks whose sounding pipe stands in a gas-dangerous space; left out: judged from what they hold */
  gasDangerous: z.array(name).optional(),
});
export type SheetWords = z.infer<typeof sheetWordsSchema>;

export function sheetWords(db: Database, test: string): SheetWords {
  const settings = planSettingsRow(db, test);
  const stations = db.select().from(planStations).where(eq(planStations.test, test)).all();
  const moves = db.select().from(planMoves).where(eq(planMoves.test, test)).all();
  return {
    stations: Object.fromEntries(stations.map((row) => [row.id, present({ where: row.where, scale: scaleOf(row) })])),
    marks: settings?.markPlaces ?? {},
    moves: Object.fromEntries(moves.flatMap(({ no, label }) => (label === null ? [] : [[no, label]]))),
    water: waterPlacesOf(db, test),
    rounds: settings?.rounds ?? ["before", "after"],
    ...present({ gasDangerous: settings?.gasDangerous ?? null }),
  };
}

/** What the plan has once for the record: method, limits and uncertainties. */
export function planSettingsOf(db: Database, test: string) {
  const row = planSettingsRow(db, test);
  return { settings: row?.settings ?? null, uncertainty: row?.uncertainty ?? null };
}

function planSettingsRow(db: Database, test: string) {
  return db.select().from(planSettings).where(eq(planSettings.test, test)).get();
}

function waterPlacesOf(db: Database, test: string): SheetWords["water"] {
  const { where, depth, place } = planWaterPlaces;
  return db.select({ place: where, depth }).from(planWaterPlaces).where(eq(planWaterPlaces.test, test)).orderBy(asc(place)).all();
}

function scaleOf({ scaleFrom, scaleTo }: typeof planStations.$inferSelect): [number, number] | null {
  return scaleFrom === null || scaleTo === null ? null : [scaleFrom, scaleTo];
}
