import type { Offsets } from "@/lib/hydrostatics/hull";
import type { HydrostaticTable } from "@/lib/hydrostatics/hydrostatic-table";
import type { DraftMark, FreeboardMark } from "@/lib/hydrostatics/mark-point";
import type { Tank } from "@/lib/hydrostatics/tank";
import type { Hydrometer } from "@/lib/hydrostatics/water-density";
import type { LineWeights } from "./line-weights";
import type { ReadingUncertainty } from "./reading-uncertainty";
import type { Aboard, Move, Station, TestWeight } from "./test-plan";
import type { TestReadings } from "./test-readings";

/** Where a ship's hydrostatics come from: the offsets of her hull, or a table. */
export type HydrostaticSource = ({ readonly kind: "offsets" } & Offsets) | ({ readonly kind: "table" } & HydrostaticTable);

/** A tank of the ship, and whether its liquid is the shifting weight. */
export type TestTank = Tank & { readonly shifts?: boolean };

/** All that the reduction of an inclining test needs; a test record is one of these. */
export type IncliningTestData = {
  readonly vessel: { readonly lbp: number };
  readonly hydrostatics: HydrostaticSource;
  readonly draftMarks: readonly DraftMark[];
  readonly freeboardMarks?: readonly FreeboardMark[];
  readonly stations: readonly Station[];
  readonly weights: readonly TestWeight[];
  readonly moves: readonly Move[];
  readonly tanks: readonly TestTank[];
  readonly aboard: readonly Aboard[];
  readonly hydrometers?: readonly Hydrometer[];
  readonly readings: TestReadings;
  readonly uncertainty?: Partial<ReadingUncertainty>;
  readonly settings?: { readonly weights?: LineWeights };
};
