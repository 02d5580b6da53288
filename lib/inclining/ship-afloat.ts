import { trimOf, waterplaneHeight } from "@/lib/frame";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { tableHydrostatics } from "@/lib/hydrostatics/hydrostatic-table";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import type { MarkReading as MarkPlace } from "@/lib/hydrostatics/mark-point";
import type { Attitude } from "@/lib/hydrostatics/tank";
import { type Hydrometer, type WaterDensity, type WaterSample, waterDensity } from "@/lib/hydrostatics/water-density";
import { type Waterline, type WaterlineRefusal, waterlineFromMarks } from "@/lib/hydrostatics/waterline";
import { mean } from "@/lib/numerics/sum";
import { answer, type Result } from "@/lib/result";
import { type Faults, faultsOf, gathered, inside, refuseFaults } from "./faults";
import type { CountedReadings, Looks } from "./readings-that-count";
import type { IncliningTestData } from "./test-data";
import type { MarkReading, WaterReading } from "./test-readings";

/** Hydrostatics at the measured waterline [m, t]; metacentres local to the measured list. */
export type ShipHydrostatics = {
  readonly source: "offsets" | "table";
  readonly volume: number;
  readonly displacement: number;
  readonly lcb: number;
  readonly vcb: number;
  /** null by a table, which does not know it */
  readonly tcb: number | null;
  readonly kmt: number;
  readonly kml: number;
  readonly lcf: number;
  readonly waterplaneArea: number;
};

/** How the ship floats at the reference state. */
export type ShipAfloat = {
  readonly waterline: Waterline;
  readonly water: WaterDensity;
  readonly hydrostatics: ShipHydrostatics;
};

/**
 * The ship afloat at the reference state: the waterplane that all marks agree on, the water's density, and the hydrostatics
 * there by offsets or by table; displacement = volume · density.
 *
 * Refused, all at once and each with its place: too few marks, no water sample, a waterline that the hydrostatics do not hold.
 */
export function shipAfloat(test: IncliningTestData, counted: CountedReadings): Result<ShipAfloat, Faults> {
  const waterline = waterlineAtZero(test, counted);
  const water = waterAtZero(test, counted);
  if (!waterline.ok || !water.ok) return refuseFaults(faultsOf(waterline, water));
  const hydrostatics = inside("hydrostatics", hydrostaticsAtZero(test, waterline.value, water.value.density));
  if (!hydrostatics.ok) return hydrostatics;
  return answer({ waterline: waterline.value, water: water.value, hydrostatics: hydrostatics.value });
}

/** How the ship lies under a waterline. */
export function attitudeUnder({ plane }: Waterline): Attitude {
  return { trim: trimOf(plane), tanHeel: plane.tanHeel, lbp: plane.lbp };
}

/** How a ship is taken to lie while her marks are not read. */
export function uprightOnEvenKeel({ vessel }: IncliningTestData): Attitude {
  return { trim: 0, tanHeel: 0, lbp: vessel.lbp };
}

/** Height of the water at the centre of flotation on the centreline: where a small weight sinks the ship in parallel [m]. */
export function waterAtFlotation({ waterline, hydrostatics }: ShipAfloat): number {
  return waterplaneHeight(waterline.plane, hydrostatics.lcf, 0);
}

/** The waterplane that the marks of the counted round agree on. */
export function waterlineAtZero(test: IncliningTestData, { drafts, freeboards }: CountedReadings): Result<Waterline, Faults> {
  const waterline = waterlineFromMarks({
    lbp: test.vessel.lbp,
    draftMarks: test.draftMarks,
    freeboardMarks: test.freeboardMarks,
    drafts: drafts.map(meanOfLooks),
    freeboards: freeboards.map(meanOfLooks),
  });
  return waterline.ok ? waterline : inside(placeOf(waterline.refusal, [...drafts, ...freeboards]), waterline);
}

// several looks at one depth count once, or a place read twice at one depth would lean towards it
function waterAtZero({ hydrometers }: IncliningTestData, { water }: CountedReadings): Result<WaterDensity, Faults> {
  const samples = gathered(water.map((looks) => inside(looks[0]?.path ?? "", sampleOf(looks, hydrometers))));
  return samples.ok ? inside("readings.water", waterDensity(samples.value)) : samples;
}

function sampleOf(looks: Looks<WaterReading>, hydrometers: readonly Hydrometer[] | undefined): Result<WaterSample> {
  const values = looks.map(({ value }) => value);
  const density = waterDensity(values, hydrometers);
  const { place, depth } = values[0] ?? { place: "", depth: 0 };
  return density.ok ? answer({ place, depth, density: density.value.density }) : density;
}

function meanOfLooks(looks: Looks<MarkReading>): MarkPlace {
  const [only, ...others] = looks.map(({ value }) => value);
  const mark = only?.mark ?? "";
  if (only !== undefined && others.length === 0) return { mark, value: only.value, estimates: only.estimates };
  const each = looks.map(({ value: { value, estimates } }) => (estimates && estimates.length > 0 ? mean(estimates) : value));
  return { mark, value: mean(each), estimates: each };
}

function placeOf(refusal: WaterlineRefusal, marks: readonly Looks<MarkReading>[]): string {
  if (!("mark" in refusal)) return "readings.drafts";
  return marks.flat().find(({ value }) => value.mark === refusal.mark)?.path ?? "readings.drafts";
}

function hydrostaticsAtZero({ hydrostatics }: IncliningTestData, waterline: Waterline, density: number): Result<ShipHydrostatics> {
  const source = hydrostatics.kind;
  if (hydrostatics.kind === "table") {
    const at = tableHydrostatics(hydrostatics, waterline);
    return at.ok ? answer({ ...at.value, tcb: null, source, displacement: at.value.volume * density }) : at;
  }
  const hull = hullFromOffsets(hydrostatics);
  if (!hull.ok) return hull;
  const at = hydrostaticsAt(hull.value, waterline.plane);
  return at.ok ? answer({ ...at.value, source, displacement: at.value.volume * density }) : at;
}
