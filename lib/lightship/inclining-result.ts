import type { Waterline } from "@/lib/hydrostatics/waterline";
import { gmOfMove } from "@/lib/inclining/as-inclined";
import { draftRounds, type MarkRead, marksRead } from "@/lib/inclining/draft-rounds";
import type { Faults } from "@/lib/inclining/faults";
import type { GeneralisedShip } from "@/lib/inclining/generalised-ship";
import type { AsInclined, SlopeSpread, StationLine } from "@/lib/inclining/inclined-ship";
import type { InclinedShip } from "@/lib/inclining/inclining-test";
import type { ShipHydrostatics } from "@/lib/inclining/ship-afloat";
import type { IncliningTestData } from "@/lib/inclining/test-data";
import { answer, type Result } from "@/lib/result";
import { type InclinedUncertainty, inclinedUncertainty } from "./inclined-uncertainty";
import { generalisedVcgOf, type Lightship, type LightshipItem } from "./lightship";
import { type ReducedTest, reducedTest } from "./reduced-test";

/** A test together with what separates the ship as inclined from the lightship; a test record is one of these. */
export type LightshipTestData = IncliningTestData & {
  readonly items: readonly LightshipItem[];
  readonly settings?: { readonly method?: Method; readonly seed?: number; readonly draws?: number };
};

/** Which of the two reductions is the headline. */
export type Method = "classical" | "generalised";

/** The result of a test in the shape in which the command `reduce` prints it. */
export type IncliningResult = {
  readonly waterline: {
    readonly density: number;
    readonly draftAft: number;
    readonly draftForward: number;
    readonly draftMidships: number;
    readonly trim: number;
    readonly heelDegrees: number;
    readonly sag: number;
    readonly residuals: Readonly<Record<string, number>>;
    /** false: the marks could not tell the sag */
    readonly sagFitted: boolean;
    readonly marks: readonly MarkRead[];
    /** of the round after the moves, fitted apart; null where there is none, or where it is the one that counts */
    readonly after: RoundResult | null;
  };
  readonly hydrostatics: Omit<ShipHydrostatics, "kml" | "waterplaneArea">;
  readonly fit: Omit<SlopeSpread, "byScatter"> & {
    readonly slope: number;
    readonly stations: readonly StationResult[];
    readonly moves: readonly MoveResult[];
  };
  readonly asInclined: AsInclined & { readonly uncertainty: InclinedUncertainty };
  /** null where the hydrostatics can't give it */
  readonly generalised: GeneralisedShip | null;
  /** `vcg` by the classical reduction */
  readonly lightship: Lightship & { readonly vcgGeneralised: number | null; readonly headline: Method };
};

/** How the ship floats by the marks of one round. */
export type RoundResult = Readonly<Record<"draftAft" | "draftForward" | "draftMidships" | "trim" | "heelDegrees" | "sag", number>>;

export type StationResult = {
  readonly id: string;
  readonly series: number;
  readonly session: number;
  readonly slope: number | null;
  readonly intercept: number | null;
  /** by the number of the move */
  readonly residuals: Readonly<Record<string, number>>;
};

export type MoveResult = {
  readonly no: number;
  readonly session: number;
  readonly moment: number;
  readonly tanHeel: number;
  readonly gm: number | null;
};

/**
 * The whole result of a test: how she floats, the line, the ship as inclined, the lightship.
 *
 * A station's slope, intercept and residuals are of its own line; moments are those that act at the heel of each move.
 * Refused with every fault and its place in the record.
 */
export function incliningResult(test: LightshipTestData): Result<IncliningResult, Faults> {
  const reduced = reducedTest(test);
  return reduced.ok ? answer(resultOf(test, reduced.value)) : reduced;
}

/** The same of a test that is reduced already. */
export function resultOf(test: LightshipTestData, { ship, lightship }: ReducedTest): IncliningResult {
  return {
    waterline: waterlineResult(ship, test),
    hydrostatics: hydrostaticsResult(ship),
    fit: fitResult(ship, test),
    asInclined: { ...ship.asInclined, uncertainty: inclinedUncertainty(test, ship.afloat, ship.line, ship.asInclined.gmFluid) },
    generalised: ship.generalised,
    lightship: lightshipResult(lightship, ship, test),
  };
}

function lightshipResult(lightship: Lightship, ship: InclinedShip, { settings }: LightshipTestData): IncliningResult["lightship"] {
  const vcgGeneralised = generalisedVcgOf(lightship, ship);
  const isGeneralised = settings?.method === "generalised" && vcgGeneralised !== null;
  return { ...lightship, vcgGeneralised, headline: isGeneralised ? "generalised" : "classical" };
}

function waterlineResult({ afloat: { waterline, water } }: InclinedShip, test: LightshipTestData): IncliningResult["waterline"] {
  const { residuals, sagFitted } = waterline;
  const { before, after } = draftRounds(test);
  return {
    density: water.density,
    ...roundResult(waterline),
    residuals,
    sagFitted,
    marks: marksRead(test, waterline),
    after: before && after ? roundResult(after) : null,
  };
}

function roundResult({ draftAft, draftForward, draftMidships, trim, heelDegrees, plane }: Waterline): RoundResult {
  return { draftAft, draftForward, draftMidships, trim, heelDegrees, sag: plane.sag };
}

function hydrostaticsResult({ afloat }: InclinedShip): IncliningResult["hydrostatics"] {
  const { source, volume, displacement, lcb, vcb, tcb, kmt, lcf } = afloat.hydrostatics;
  return { source, volume, displacement, lcb, vcb, tcb, kmt, lcf };
}

function fitResult({ line, afloat }: InclinedShip, { aboard }: LightshipTestData): IncliningResult["fit"] {
  const { byScatter: _, ...spread } = line.spread;
  return {
    slope: line.slope,
    ...spread,
    stations: line.stations.map(stationResult),
    moves: line.moves.map((move) => {
      const { no, session, moment, tanHeel } = move;
      return { no, session, moment, tanHeel, gm: gmOfMove(afloat, line.moves, aboard, move) };
    }),
  };
}

function stationResult({ id, series, session, slope, intercept, residuals }: StationLine): StationResult {
  const byMove = Object.fromEntries(residuals.map(({ move, residual }) => [move, residual]));
  return { id, series, session, slope, intercept, residuals: byMove };
}
