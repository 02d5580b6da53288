import type { z } from "zod";
import { settingsSchema, type TestSettings } from "@/lib/record/settings-schema";
import type { Result } from "@/lib/result";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { type PlanRefusal, planOf, planRecord, savePlan } from "./test-plan";

/** What the engineer chooses for a test; the seed and number of draws stay with the record. */
export const chosenSchema = settingsSchema.pick({ method: true, weights: true, agreement: true, limits: true });
export type ChosenSettings = z.infer<typeof chosenSchema>;

/** Changes what is chosen for a test and nothing else of its plan; what is left out falls back to the usual, null: all of it. */
export function saveSettings(db: Database, test: string, chosen: ChosenSettings | null, act: Act): Result<string, PlanRefusal> {
  return inTransaction(db, () => {
    const { settings: before = {}, ...plan } = planOf(planRecord(db, test));
    const { method, weights, agreement, limits, ...kept } = before;
    const settings: TestSettings = { ...kept, ...chosen };
    return savePlan(db, test, Object.keys(settings).length > 0 ? { ...plan, settings } : plan, null, act);
  });
}

/** Changes the ship as she is expected to be and nothing else; null: she is no longer stated. */
export function saveExpected(db: Database, test: string, expected: TestSettings["expected"] | null, act: Act): Result<string, PlanRefusal> {
  return inTransaction(db, () => {
    const { settings = {}, ...plan } = planOf(planRecord(db, test));
    const { expected: _, ...kept } = settings;
    const changed: TestSettings = expected ? { ...kept, expected } : kept;
    return savePlan(db, test, Object.keys(changed).length > 0 ? { ...plan, settings: changed } : plan, null, act);
  });
}
