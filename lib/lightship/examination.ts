import { type CheckLimits, limitsOf } from "@/lib/inclining/checks/check-limits";
import type { Finding } from "@/lib/inclining/checks/finding";
import { uncertaintyOfMove } from "@/lib/inclining/checks/movement-checks";
import { type Faults, inside } from "@/lib/inclining/faults";
import { type InclinedShip, incliningTest } from "@/lib/inclining/inclining-test";
import { type Hint, plotHints } from "@/lib/inclining/plot-hints";
import { answer, type Result } from "@/lib/result";
import { type CheckedTest, checksOf } from "./checks";
import { type Lightship, lightshipBalance, lightshipOf } from "./lightship";

/** What there is to say about how a test was done. */
export type Examination = { readonly checks: readonly Finding[]; readonly hints: readonly Hint[] };

/** The findings of a test and what its plot tells, by the ship and the lightship that it found. */
export function examinationOf(
  test: CheckedTest,
  ship: InclinedShip,
  lightship: Lightship,
  limits: CheckLimits = limitsOf(test),
): Examination {
  return { checks: checksOf(test, ship, lightship, limits), hints: plotHints(ship.line, uncertaintyOfMove(test, ship.line)) };
}

/** The same from the test alone. Refused: what the reduction refuses. */
export function examined(test: CheckedTest): Result<Examination, Faults> {
  const ship = incliningTest(test);
  if (!ship.ok) return ship;
  const balance = inside("items", lightshipBalance(ship.value, test));
  return balance.ok ? answer(examinationOf(test, ship.value, lightshipOf(balance.value))) : balance;
}
