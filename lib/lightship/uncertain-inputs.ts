import { type CountedReadings, type Looks, readingsThatCount } from "@/lib/inclining/readings-that-count";
import type { SoundingReading } from "@/lib/inclining/test-readings";
import type { UncertainInput } from "@/lib/uncertainty/uncertain-input";
import type { LightshipTestData } from "./inclining-result";
import {
  type Listed,
  type PlaceOfWeight,
  placeKey,
  withEntry,
  withLength,
  withLiquidDensity,
  withMass,
  withPlace,
  withTankVolume,
  withVolume,
  withZero,
} from "./shifted-plan";
import { type MarkRead, withDensity, withMarkReading, withSlope, withSounding } from "./shifted-readings";
import type { StatedUncertainty } from "./stated-uncertainty";

export type TestInput = UncertainInput<LightshipTestData> & { readonly cause: Cause };

/** What could be measured better: the lines of the budget. */
export type Cause =
  | "line"
  | "weights"
  | "weight-places"
  | "lengths"
  | "drafts"
  | "mark-zeros"
  | "density"
  | "items"
  | "persons"
  | "soundings"
  | "tank-tables"
  | "liquid-density"
  | "hydrostatics";

/** How well the slope of the line is known, relative to it; degrees of freedom where its own scatter says so. */
export type LineUncertainty = { readonly relative: number; readonly degreesOfFreedom: number | null };

/**
 * Everything in a test that is not known exactly, each with its standard uncertainty, shared causes kept shared: one error
 * of each weight in all its moves, one of each place whenever a weight stands there again, one of each pendulum in all its
 * tangents, one of each mark's zero in all its readings, one of each draft, sample, item and tank.
 *
 * The readings of the battens enter as what they leave open in the slope, `line`. Inputs without uncertainty are left out.
 * A tank sounded exactly empty or exactly full is known to be so: its sounding is certain, or a millimetre would put a free
 * surface into it. Errors of a place act athwartships only: along and upward a few millimetres of a test weight do not count.
 * Source: JCGM 100:2008, 5.2 and F.1.2 *from memory*.
 */
export function uncertainInputs(test: LightshipTestData, stated: StatedUncertainty, line: LineUncertainty): readonly TestInput[] {
  const counted = readingsThatCount(test);
  const inputs: readonly TestInput[] = [
    lineInput(line),
    ...test.weights.map(({ id, mass }) => input("weights", stated.weightRelative * mass, (given, by) => withMass(given, id, by))),
    ...placesOf(test).map((place) => input("weight-places", stated.distance, (given, by) => withPlace(given, place, by))),
    ...test.stations.map(({ id }) => input("lengths", stated.length, (given, by) => withLength(given, id, by))),
    ...marksRead(counted).map((reading) => input("drafts", stated.draft, (given, by) => withMarkReading(given, reading, by))),
    ...test.draftMarks.map(({ id }) => input("mark-zeros", stated.markZero, (given, by) => withZero(given, id, by))),
    ...idsOf(counted.water).map((id) => input("density", stated.density, (given, by) => withDensity(given, id, by))),
    ...listInputs("items", test.items, stated),
    ...listInputs("persons", test.aboard, stated),
    ...slackSoundings(test, counted).map((id) => input("soundings", stated.sounding, (given, by) => withSounding(given, id, by))),
    ...test.tanks.map(({ id }) => input("tank-tables", stated.tankVolumeRelative, (given, by) => withTankVolume(given, id, by))),
    ...test.tanks.map(({ id }) => input("liquid-density", stated.liquidDensity, (given, by) => withLiquidDensity(given, id, by))),
    input("hydrostatics", stated.volumeRelative, withVolume),
  ];
  return inputs.filter(({ standard }) => standard > 0);
}

type Shifted = TestInput["shifted"];

function input(cause: Cause, standard: number, shifted: Shifted): TestInput {
  return { cause, standard, degreesOfFreedom: null, shifted };
}

function lineInput({ relative, degreesOfFreedom }: LineUncertainty): TestInput {
  return { cause: "line", standard: relative, degreesOfFreedom, shifted: withSlope };
}

function placesOf({ moves }: LightshipTestData): readonly PlaceOfWeight[] {
  const places = moves.flatMap(({ positions }) => Object.entries(positions).map(([weight, place]) => ({ weight, place })));
  return [...new Map(places.map((one) => [placeKey(one), one])).values()];
}

/** Mass, place along and height of each entry; across the ship they move no number that gets an interval. */
function listInputs(list: "items" | "persons", entries: readonly Listed[], stated: StatedUncertainty): TestInput[] {
  return entries.flatMap(({ mass }, i) => [
    input(list, stated.itemMassRelative * mass, (given, by) => withEntry(given, list, i, "mass", by)),
    input(list, stated.itemPosition, (given, by) => withEntry(given, list, i, "x", by)),
    input(list, stated.itemPosition, (given, by) => withEntry(given, list, i, "z", by)),
  ]);
}

function marksRead({ drafts, freeboards }: CountedReadings): MarkRead[] {
  return [
    ...idsOf(drafts).map((id): MarkRead => ({ list: "drafts", id })),
    ...idsOf(freeboards).map((id): MarkRead => ({ list: "freeboards", id })),
  ];
}

function idsOf(slots: readonly Looks<{ readonly id: string }>[]): string[] {
  return slots.flatMap((looks) => looks.map(({ value }) => value.id));
}

function slackSoundings({ tanks }: LightshipTestData, { soundings, ballast }: CountedReadings): string[] {
  const isEnd = ({ tank, value }: SoundingReading) => {
    const table = tanks.find(({ id }) => id === tank)?.table ?? [];
    const full = Math.max(...table.map(({ volume }) => volume));
    return table.some(({ level, volume }) => level === value && (volume === 0 || volume === full));
  };
  return [...soundings, ...ballast].flatMap((looks) => looks.filter(({ value }) => !isEnd(value)).map(({ value }) => value.id));
}
