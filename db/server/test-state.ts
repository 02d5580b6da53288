import type { Result } from "@/lib/result";
import { refuse } from "@/lib/result";
import type { TestState } from "@/lib/sync/job-sheet";
import { type OwedBeforeReconciled, owedBeforeReconciled } from "@/lib/sync/reconciling";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { liveSnapshot } from "./live-snapshot";
import { changeState, type StateRefusal } from "./tests";

export type AdvanceRefusal = StateRefusal | { readonly type: "NotReconciled"; readonly owed: readonly OwedBeforeReconciled[] };

/** Takes a test one state on, or back. Refused besides what `changeState` refuses: reconciled, while something is owed for it. */
export function advanceTest(db: Database, test: string, to: TestState, act: Act): Result<TestState, AdvanceRefusal> {
  return inTransaction(db, () => {
    const snapshot = to === "reconciled" ? liveSnapshot(db, test, act.at) : null;
    const owed = snapshot === null ? [] : owedBeforeReconciled(snapshot);
    return owed.length > 0 ? refuse({ type: "NotReconciled", owed }) : changeState(db, test, to, act);
  });
}
