import type { Clauses, NumericsRefusal } from "./known-refusal";
import { shortFigure } from "./rounding";

export const numericsClauses: Clauses<NumericsRefusal> = {
  TooFewPoints: ({ got, needed }) => `a line needs at least ${needed} points, ${got} given`,
  NoSpread: ({ value, points }) => `all ${points} points stand at ${shortFigure(value)}, no line can be laid through them`,
  TooFewRows: ({ got, needed }) => `at least ${needed} measurements are needed, ${got} given`,
  RankDeficient: ({ column, columns }) => `the measurements can't tell unknown ${column + 1} of ${columns} from the others`,
  OutsideTable: ({ value, lowest, highest }) =>
    `${shortFigure(value)} lies outside the table, which runs from ${shortFigure(lowest)} to ${shortFigure(highest)}`,
  NoSignChange: ({ low, high }) => `no solution lies between ${shortFigure(low)} and ${shortFigure(high)}`,
};
