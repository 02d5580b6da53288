import type { EquilibriumRefusal } from "@/lib/hydrostatics/equilibrium";
import type { HullRefusal } from "@/lib/hydrostatics/hull";
import type { TableRefusal } from "@/lib/hydrostatics/hydrostatic-table";
import type { TankRefusal } from "@/lib/hydrostatics/tank";
import type { WaterRefusal } from "@/lib/hydrostatics/water-density";
import type { WaterlineRefusal } from "@/lib/hydrostatics/waterline";
import type { HeelAgainstMoment } from "@/lib/inclining/as-inclined";
import type { TermIsZero, TermsMissing } from "@/lib/inclining/classical-relation";
import type { NoBattenReadings } from "@/lib/inclining/common-line";
import type { NoSpreadInMoment } from "@/lib/inclining/common-slope";
import type { TooFewMoves } from "@/lib/inclining/inclining-test";
import type { ZeroLength } from "@/lib/inclining/instrument";
import type { NoBallastSounding, NoSounding } from "@/lib/inclining/liquids";
import type { NoOffsets, NoRestExpected } from "@/lib/inclining/prediction";
import type { WrongKindOfValue } from "@/lib/inclining/reading-shown";
import type { NoMarks, TooFewTurningPoints } from "@/lib/inclining/resting-point";
import type { NoPosition, NoReferenceMove } from "@/lib/inclining/shift-moments";
import type { NoZeroReading, UnknownStation } from "@/lib/inclining/station-series";
import type { UncertaintyNotPositive } from "@/lib/inclining/weighted-slope";
import type { NothingLeft } from "@/lib/lightship/lightship";
import type { OutsideTable } from "@/lib/numerics/interpolation";
import type { RankDeficient, TooFewRows } from "@/lib/numerics/least-squares";
import type { NoSpread, TooFewPoints } from "@/lib/numerics/linear-fit";
import type { NoSignChange } from "@/lib/numerics/root";
import type { RecordFault } from "@/lib/record/record-faults";
import type { UploadRefusal } from "@/lib/spreadsheet/uploaded-sheets";
import type { SheetFault } from "@/lib/vessel/sheet-faults";

export type NumericsRefusal = TooFewPoints | NoSpread | TooFewRows | RankDeficient | OutsideTable | NoSignChange;

export type FloatingRefusal = HullRefusal | TableRefusal | TankRefusal | WaterRefusal | WaterlineRefusal | EquilibriumRefusal;

export type InclinedRefusal =
  | TooFewTurningPoints
  | NoMarks
  | WrongKindOfValue
  | ZeroLength
  | UnknownStation
  | NoZeroReading
  | NoReferenceMove
  | NoPosition
  | NoBattenReadings
  | NoSpreadInMoment
  | UncertaintyNotPositive
  | TooFewMoves
  | HeelAgainstMoment
  | NoSounding
  | NoBallastSounding
  | TermsMissing
  | TermIsZero
  | NoOffsets
  | NoRestExpected
  | NothingLeft;

export type KnownRefusal = NumericsRefusal | FloatingRefusal | InclinedRefusal | RecordFault | UploadRefusal | SheetFault;

/** A clause for each refusal of a kind, without capital and full stop: it also stands behind a path. */
export type Clauses<R extends { readonly type: string }> = {
  readonly [Type in R["type"]]: (refusal: Extract<R, { readonly type: Type }>) => string;
};
