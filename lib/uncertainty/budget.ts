import { studentTTwoSided95 } from "@/lib/numerics/student-t";
import { sum } from "@/lib/numerics/sum";
import type { LocalExpansion } from "./local-expansion";
import type { UncertainInput } from "./uncertain-input";

/** What one cause adds to the interval of a number. */
export type BudgetLine = {
  readonly cause: string;
  /** of the whole, 0 to 1 */
  readonly share: number;
  /** the 95 % half width that this cause would leave alone */
  readonly halfWidth: number;
};

/**
 * Which cause contributes how much to one number of a model, the largest first; causes that add nothing are left out.
 *
 *     Uₖ² = k₉₅²·(aₖ² + 2·bₖ²),   share = Σ of a cause / Σ of all
 *
 * k₉₅: Student's t of the input's degrees of freedom, 1.96 where its uncertainty is stated; a, b: see `localExpansion`
 * (2·b² is the variance of b·z²). Source: JCGM 100:2008, 5.1.2 and annex G *from memory*.
 */
export function budgetOf(
  { linear, quadratic }: LocalExpansion,
  inputs: readonly Pick<UncertainInput<never>, "cause" | "degreesOfFreedom">[],
  number: number,
): readonly BudgetLine[] {
  const squares = new Map<string, number>();
  for (const [k, { cause, degreesOfFreedom }] of inputs.entries()) {
    const factor = degreesOfFreedom === null ? 1.959964 : studentTTwoSided95(degreesOfFreedom);
    const square = factor ** 2 * ((linear[k]?.[number] ?? 0) ** 2 + 2 * (quadratic[k]?.[number] ?? 0) ** 2);
    squares.set(cause, (squares.get(cause) ?? 0) + square);
  }
  const whole = sum([...squares.values()]);
  const lines = [...squares].filter(([, square]) => square > 0);
  return lines.map(([cause, square]) => ({ cause, share: square / whole, halfWidth: Math.sqrt(square) })).sort((a, b) => b.share - a.share);
}
