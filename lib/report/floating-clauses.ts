import type { Clauses, FloatingRefusal } from "./known-refusal";
import { shortFigure } from "./rounding";

export const floatingClauses: Clauses<FloatingRefusal> = {
  TooFewSections: ({ got, needed }) => `a hull needs at least ${needed} sections, ${got} given`,
  SectionsAtOnePlace: ({ x }) => `two sections stand at x = ${metres(x)}`,
  EmptySection: ({ x }) => `the section at x = ${metres(x)} has no points`,
  NegativeHalfBreadth: ({ x, halfBreadth, z }) =>
    `the section at x = ${metres(x)} has a half-breadth of ${metres(halfBreadth)} at height ${metres(z)}`,
  SectionFromDeckToKeel: ({ x }) => `the section at x = ${metres(x)} runs from the deck to the keel; its points go from the keel upwards`,
  HullWithoutVolume: ({ sections }) => `the ${sections} sections enclose nothing`,
  OutsideHydrostaticTable: ({ quantity, value, lowest, highest }) =>
    `the ${quantity} of ${metres(value)} lies outside the hydrostatic table, which runs from ${metres(lowest)} to ${metres(highest)}`,
  EmptyHydrostaticTable: () => "the hydrostatic table has no rows",
  RepeatedDraft: ({ draft, trim }) => `the hydrostatic table has two rows for draft ${metres(draft)} at trim ${metres(trim)}`,
  EmptyTankTable: ({ tank }) => `the table of tank ${tank} has no rows`,
  FreeSurfaceUnknown: ({ tank, level }) =>
    `tank ${tank} is slack at ${metres(level)}, and its table gives no free surface between empty and full`,
  RepeatedTankLevel: ({ tank, level, trim }) => `the table of tank ${tank} has two rows for level ${metres(level)} at trim ${metres(trim)}`,
  OutsideTankTable: ({ tank, quantity, value, lowest, highest }) =>
    `the ${quantity} of ${metres(value)} lies outside the table of tank ${tank}, which runs from ${metres(lowest)} to ${metres(highest)}`,
  NoWaterSamples: () => "no sample of the water's density counts, at least 1 needed",
  UnknownHydrometer: ({ hydrometer }) => `hydrometer ${hydrometer} is not in the plan`,
  UnknownMark: ({ mark }) => `mark ${mark} is not in the plan`,
  MarkReadTwice: ({ mark }) => `mark ${mark} is read twice`,
  OutsideMarkTable: ({ mark, value, lowest, highest }) =>
    `the reading ${metres(value)} lies outside the table of mark ${mark}, which runs from ${metres(lowest)} to ${metres(highest)}`,
  TooFewMarks: ({ got, needed }) => `a waterline needs at least ${needed} marks that count, ${got} read`,
  MarksAtOneLength: ({ x, marks }) => `all ${marks} marks stand at x = ${metres(x)} and can't tell the trim`,
  MarksAtOneBreadth: ({ y, marks }) => `all ${marks} marks stand at y = ${metres(y)} and can't tell the heel`,
  MarksInOneLine: ({ marks }) => `the ${marks} marks stand in one line and can't tell trim from heel`,
  NoWaterInHull: ({ keel, draftAtAp }) => `the water does not reach the hull: draft at AP ${metres(draftAtAp)}, keel at ${metres(keel)}`,
  HullUnderWater: ({ top, draftAtAp }) => `the hull lies wholly under water: draft at AP ${metres(draftAtAp)}, top at ${metres(top)}`,
  NoBalance: ({ draftGap, trimArm, heelArm }) =>
    `no position of rest was found; missing are ${metres(draftGap)} of draft, ${metres(trimArm)} of trimming and ${metres(heelArm)} of heeling arm`,
  VolumeOutOfReach: ({ volume, smallest, largest }) =>
    `the hull displaces ${shortFigure(smallest)} to ${shortFigure(largest)} m³, not ${shortFigure(volume)} m³`,
  UnstableAtRest: ({ gmTransverse }) => `the ship is not stable at rest: GM ${metres(gmTransverse)}`,
};

function metres(value: number): string {
  return `${shortFigure(value)} m`;
}
