import type { ClassicalTerm } from "@/lib/inclining/classical-relation";
import type { Clauses, InclinedRefusal } from "./known-refusal";
import { shortFigure } from "./rounding";

export const inclinedClauses: Clauses<InclinedRefusal> = {
  TooFewTurningPoints: ({ got, needed }) => `at least ${needed} turning points, ${got} given`,
  NoMarks: () => "at least 1 mark, none given",
  WrongKindOfValue: ({ instrument, needed }) => `a reading of ${withArticle(instrument)} needs ${needed}`,
  ZeroLength: ({ length }) => `a length above 0 needed, ${shortFigure(length)} given`,
  UnknownStation: ({ station }) => `station ${station} is not in the plan`,
  NoZeroReading: ({ station, series }) => `inclinometer ${station} has no reading at zero in series ${series}`,
  NoReferenceMove: () => "no move 0, from which all moments count",
  NoPosition: ({ weight, move }) => `move ${move} lacks the position of weight ${weight}`,
  NoBattenReadings: () => "no batten reading counts",
  NoSpreadInMoment: ({ points, moments }) =>
    `the ${points} readings have one moment only (${moments.map((moment) => shortFigure(moment)).join(", ")} t·m), no line can be laid through them`,
  UncertaintyNotPositive: ({ uncertainty }) => `a tangent cannot be weighed by an uncertainty of ${shortFigure(uncertainty)}`,
  TooFewMoves: ({ got, needed }) => `at least ${needed} moves that were read, ${got} given`,
  HeelAgainstMoment: ({ slope }) =>
    `the ship does not heel towards the moment: slope ${shortFigure(slope)} per t·m; look for stations mounted the other way`,
  NoSounding: ({ tank }) => `tank ${tank} has no sounding that counts`,
  NoBallastSounding: ({ tank, move }) => `the ballast in tank ${tank} was not sounded at move ${move}`,
  TermsMissing: ({ wanted, missing }) => `the ${words[wanted]} needs the ${missing.map((term) => words[term]).join(" and the ")}`,
  TermIsZero: ({ wanted, zero }) => `the ${words[wanted]} can't be found with ${zero.map((term) => words[term]).join(" and ")} of 0`,
  NoOffsets: () => "the offsets of the hull are needed, a table is given",
  NoRestExpected: ({ move, vcg }) => `with a VCG of ${shortFigure(vcg)} m the ship would find no rest at move ${move}`,
  NothingLeft: ({ mass }) => `nothing is left of the ship after all deductions: ${shortFigure(mass)} t`,
};

const words: Readonly<Record<ClassicalTerm, string>> = {
  gmFluid: "GM",
  displacement: "displacement",
  weight: "weight",
  distance: "distance",
  tanHeel: "heel",
  deflection: "deflection",
  length: "length",
};

function withArticle(instrument: string): string {
  return instrument.startsWith("i") ? `an ${instrument}` : `a ${instrument}`;
}
