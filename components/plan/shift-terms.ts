import { typedNumber } from "@/components/ui/typed-number";
import { type ClassicalTerm, type ClassicalTerms, classicalTerm } from "@/lib/inclining/classical-relation";
import { refusalSentence } from "@/lib/report/refusal-sentence";
import { figure } from "@/lib/report/rounding";

type Field = { readonly term: ClassicalTerm; readonly label: string; readonly unit: string; readonly decimals: number };

/** The terms of one shift as a person types them: heel in degrees, deflection in millimetres. */
export const shiftFields: readonly Field[] = [
  { term: "weight", label: "Weight", unit: "t", decimals: 2 },
  { term: "distance", label: "Distance athwart", unit: "m", decimals: 2 },
  { term: "tanHeel", label: "Heel", unit: "°", decimals: 2 },
  { term: "length", label: "Pendulum length", unit: "m", decimals: 2 },
  { term: "deflection", label: "Deflection", unit: "mm", decimals: 0 },
  { term: "displacement", label: "Displacement", unit: "t", decimals: 1 },
  { term: "gmFluid", label: "GM fluid", unit: "m", decimals: 3 },
];

export type ShiftTyped = Readonly<Record<ClassicalTerm, string>>;
export type Solved = { readonly figure: string } | { readonly sentence: string };

/** The wanted term from those that are typed. */
export function solvedTerm(wanted: ClassicalTerm, typed: ShiftTyped): Solved {
  const given: Partial<Record<ClassicalTerm, number>> = {};
  for (const { term } of shiftFields) {
    const value = typedNumber(typed[term]);
    if (term !== wanted && value !== null) given[term] = toTerm(term, value);
  }
  // the heel is one thing, given in two ways: the angle counts where it is typed
  const { tanHeel, ...others } = given;
  const terms: Partial<ClassicalTerms> = tanHeel === undefined || wanted === "tanHeel" ? others : given;
  const solved = classicalTerm(wanted, terms);
  if (!solved.ok) return { sentence: refusalSentence(solved.refusal) };
  const { decimals } = shiftFields.find(({ term }) => term === wanted) ?? { decimals: 2 };
  return { figure: figure(fromTerm(wanted, solved.value), decimals) };
}

function toTerm(term: ClassicalTerm, value: number): number {
  if (term === "tanHeel") return Math.tan((value * Math.PI) / 180);
  return term === "deflection" ? value / 1000 : value;
}

function fromTerm(term: ClassicalTerm, value: number): number {
  if (term === "tanHeel") return (Math.atan(value) * 180) / Math.PI;
  return term === "deflection" ? value * 1000 : value;
}
