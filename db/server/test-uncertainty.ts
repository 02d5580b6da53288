import type { TestRecord } from "@/lib/record/test-record";
import type { Result } from "@/lib/result";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { type PlanRefusal, planOf, planRecord, savePlan } from "./test-plan";

/** Changes what a test states of its uncertainties and nothing else of its plan; null: it states nothing. */
export function saveUncertainty(
  db: Database,
  test: string,
  uncertainty: TestRecord["uncertainty"] | null,
  act: Act,
): Result<string, PlanRefusal> {
  return inTransaction(db, () => {
    const { uncertainty: _, ...plan } = planOf(planRecord(db, test));
    return savePlan(db, test, uncertainty ? { ...plan, uncertainty } : plan, null, act);
  });
}
