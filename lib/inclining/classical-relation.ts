import { answer, type Result, refuse } from "@/lib/result";

/** The terms of a single shift: tonnes and metres; heel as a tangent. */
export type ClassicalTerms = {
  readonly gmFluid: number;
  readonly displacement: number;
  readonly weight: number;
  readonly distance: number;
  readonly tanHeel: number;
  readonly deflection: number;
  readonly length: number;
};
export type ClassicalTerm = keyof ClassicalTerms;

export type TermsMissing = { readonly type: "TermsMissing"; readonly wanted: ClassicalTerm; readonly missing: readonly ClassicalTerm[] };
export type TermIsZero = { readonly type: "TermIsZero"; readonly wanted: ClassicalTerm; readonly zero: readonly ClassicalTerm[] };

/**
 * Any one term of the classical relation of a shift, from the others.
 *
 *     gmFluid · displacement · tanHeel = weight · distance        tanHeel = deflection / length
 *
 * Valid at small heel of a ship whose sides are upright about the waterline. Any consistent units; the heel is a tangent.
 * The heel may be given as itself or by deflection and length.
 * Refused: terms that are missing; a zero in a divisor.
 * Source: IMO 2008 IS Code, part B annex 1 *from memory*.
 */
export function classicalTerm(wanted: ClassicalTerm, given: Partial<ClassicalTerms>): Result<number, TermsMissing | TermIsZero> {
  const { above, below } = relationFor(wanted, given);
  const missing = [...above, ...below].filter((term) => given[term] === undefined);
  if (missing.length > 0) return refuse({ type: "TermsMissing", wanted, missing });
  const zero = below.filter((term) => given[term] === 0);
  if (zero.length > 0) return refuse({ type: "TermIsZero", wanted, zero });
  return answer(product(above, given) / product(below, given));
}

type Quotient = { readonly above: readonly ClassicalTerm[]; readonly below: readonly ClassicalTerm[] };

/** The wanted term as a product of terms over a product of terms, through the heel as it is given. */
function relationFor(wanted: ClassicalTerm, given: Partial<ClassicalTerms>): Quotient {
  const heel = heelFor(wanted, given);
  switch (wanted) {
    case "gmFluid":
      return { above: ["weight", "distance", ...heel.below], below: ["displacement", ...heel.above] };
    case "displacement":
      return { above: ["weight", "distance", ...heel.below], below: ["gmFluid", ...heel.above] };
    case "weight":
      return { above: ["gmFluid", "displacement", ...heel.above], below: ["distance", ...heel.below] };
    case "distance":
      return { above: ["gmFluid", "displacement", ...heel.above], below: ["weight", ...heel.below] };
    case "tanHeel":
      return heel;
    case "deflection":
      return { above: ["length", ...heel.above], below: heel.below };
    case "length":
      return { above: ["deflection", ...heel.below], below: heel.above };
  }
}

const byItself: Quotient = { above: ["tanHeel"], below: [] };
const byBatten: Quotient = { above: ["deflection"], below: ["length"] };
const byShift: Quotient = { above: ["weight", "distance"], below: ["gmFluid", "displacement"] };

function heelFor(wanted: ClassicalTerm, given: Partial<ClassicalTerms>): Quotient {
  const isKnownByBatten = given.deflection !== undefined && given.length !== undefined;
  if (wanted === "tanHeel") return isKnownByBatten ? byBatten : byShift;
  if (given.tanHeel !== undefined) return byItself;
  return wanted === "deflection" || wanted === "length" ? byShift : byBatten;
}

function product(terms: readonly ClassicalTerm[], given: Partial<ClassicalTerms>): number {
  return terms.reduce((total, term) => total * (given[term] ?? 1), 1);
}
