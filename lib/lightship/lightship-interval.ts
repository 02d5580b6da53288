import type { Faults } from "@/lib/inclining/faults";
import type { JudgedLine } from "@/lib/inclining/inclining-test";
import { type InclinedShip, incliningTest } from "@/lib/inclining/inclining-test";
import { studentTTwoSided95 } from "@/lib/numerics/student-t";
import { answer, type Result } from "@/lib/result";
import { type BudgetLine, budgetOf } from "@/lib/uncertainty/budget";
import { type LocalExpansion, localExpansion } from "@/lib/uncertainty/local-expansion";
import type { LightshipTestData } from "./inclining-result";
import { generalisedVcgOf, lightshipBalance, lightshipOf } from "./lightship";
import { reducedTest } from "./reduced-test";
import { statedUncertainty } from "./stated-uncertainty";
import { type Cause, type LineUncertainty, type TestInput, uncertainInputs } from "./uncertain-inputs";

/** The numbers of a lightship that get an interval, in the order in which an expansion holds them; the last only where it is known. */
export const numbersWithInterval = ["displacement", "vcg", "lcg", "vcgGeneralised"] as const;
export type NumberWithInterval = (typeof numbersWithInterval)[number];

/** A test's result with all that is uncertain in it, ready to be drawn from. */
export type UncertainLightship = {
  readonly expansion: LocalExpansion;
  /** the last one is the metacentre's height, which shifts nothing in the test itself */
  readonly inputs: readonly TestInput[];
};

/**
 * How the lightship follows from everything that is not known exactly. The whole reduction is done again for each input,
 * a standard uncertainty up and down; the metacentre's own uncertainty stands in KG as it is.
 *
 * `reduced`: the test's own reduction, where it has been done already.
 * Refused: what the reduction refuses. See `uncertainInputs` for what is uncertain and by how much.
 */
export function uncertainLightship(
  test: LightshipTestData & Stating,
  reduced: Result<{ readonly ship: InclinedShip }, Faults> = reducedTest(test),
): Result<UncertainLightship, Faults> {
  if (!reduced.ok) return reduced;
  const { ship } = reduced.value;
  const stated = statedUncertainty(test.uncertainty);
  const inputs = uncertainInputs(test, stated, lineUncertainty(ship.line));
  const expansion = localExpansion<LightshipTestData, Faults>(
    (given, input) => (input?.cause === "items" ? lightshipNumbers(ship, given) : reducedNumbers(given)),
    test,
    inputs,
  );
  if (!expansion.ok) return expansion;
  const { displacement } = ship.asInclined;
  const inVcg = (stated.kmt * displacement) / (expansion.value.values[0] ?? displacement);
  return answer({
    expansion: {
      values: expansion.value.values,
      linear: [...expansion.value.linear, [0, inVcg, 0, inVcg]],
      quadratic: [...expansion.value.quadratic, [0, 0, 0, 0]],
    },
    inputs: [...inputs, { cause: "hydrostatics", standard: stated.kmt, degreesOfFreedom: null, shifted: (given) => given }],
  });
}

/** A test that may state its uncertainties. */
export type Stating = { readonly uncertainty?: Parameters<typeof statedUncertainty>[0] };

/** What contributes how much to the lightship's KG by one of the reductions, the largest first. */
export function budgetOfVcg(
  { expansion, inputs }: UncertainLightship,
  number: "vcg" | "vcgGeneralised" = "vcg",
): readonly (BudgetLine & { readonly cause: Cause })[] {
  return budgetOf(expansion, inputs, numbersWithInterval.indexOf(number)) as readonly (BudgetLine & { readonly cause: Cause })[];
}

function reducedNumbers(test: LightshipTestData): Result<readonly number[], Faults> {
  const ship = incliningTest(test);
  return ship.ok ? lightshipNumbers(ship.value, test) : ship;
}

function lightshipNumbers(ship: InclinedShip, test: LightshipTestData): Result<readonly number[], Faults> {
  const balance = lightshipBalance(ship, test);
  if (!balance.ok) return { ok: false, refusal: { type: "Faults", faults: [balance.refusal] } };
  const lightship = lightshipOf(balance.value);
  const { displacement, vcg, lcg } = lightship;
  const vcgGeneralised = generalisedVcgOf(lightship, ship);
  return answer([displacement, vcg, lcg, ...(vcgGeneralised === null ? [] : [vcgGeneralised])]);
}

/**
 * How well the slope is known: by its scatter with Student's t of its degrees of freedom, or by what the readings' own
 * uncertainty gives, whichever leaves the wider 95 % interval. What scatter shows holds for gusts that every station felt
 * as well as for each reading's own error.
 */
function lineUncertainty({ slope, spread }: JudgedLine): LineUncertainty {
  const { byScatter, degreesOfFreedom, slopeUncertainty } = spread;
  const isScatter = studentTTwoSided95(degreesOfFreedom) * byScatter >= 1.959964 * slopeUncertainty;
  if (isScatter) return { relative: byScatter / slope, degreesOfFreedom };
  return { relative: slopeUncertainty / slope, degreesOfFreedom: null };
}
