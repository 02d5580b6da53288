import { type CheckLimits, limitsOf } from "@/lib/inclining/checks/check-limits";
import type { Finding } from "@/lib/inclining/checks/finding";
import { uncertaintyOfMove } from "@/lib/inclining/checks/movement-checks";
import type { Faults } from "@/lib/inclining/faults";
import { type Hint, plotHints } from "@/lib/inclining/plot-hints";
import { answer, type Result } from "@/lib/result";
import { type CheckedTest, checksOf } from "./checks";
import { type ReducedTest, reducedTest } from "./reduced-test";

/** What there is to say about how a test was done. */
export type Examination = { readonly checks: readonly Finding[]; readonly hints: readonly Hint[] };

/** The findings of a test and what its plot tells, by the ship and the lightship that it found. */
export function examinationOf(test: CheckedTest, { ship, lightship }: ReducedTest, limits: CheckLimits = limitsOf(test)): Examination {
  return { checks: checksOf(test, ship, lightship, limits), hints: plotHints(ship.line, uncertaintyOfMove(test, ship.line)) };
}

/** The same from the test alone. Refused: what the reduction refuses. */
export function examined(test: CheckedTest): Result<Examination, Faults> {
  const reduced = reducedTest(test);
  return reduced.ok ? answer(examinationOf(test, reduced.value)) : reduced;
}
