import { describe, expect, it } from "vitest";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { classicalTerm } from "@/lib/inclining/classical-relation";
import { linearFit } from "@/lib/numerics/linear-fit";
import type { KnownRefusal } from "@/lib/report/known-refusal";
import { refusalLine, refusalSentence } from "@/lib/report/refusal-sentence";

const m = { lowest: 1, highest: 4 };
const inSheet = { sheet: "Tanks", cell: "C14", column: "Volume" };

/** One refusal of every type; the mapped type fails to compile where one is missing. */
const everyRefusal: { readonly [Type in KnownRefusal["type"]]: Extract<KnownRefusal, { readonly type: Type }> } = {
  TooFewPoints: { type: "TooFewPoints", got: 1, needed: 3 },
  NoSpread: { type: "NoSpread", value: 2, points: 4 },
  TooFewRows: { type: "TooFewRows", got: 1, needed: 2 },
  RankDeficient: { type: "RankDeficient", column: 1, columns: 3, independentPart: 0 },
  OutsideTable: { type: "OutsideTable", value: 5, ...m },
  NoSignChange: { type: "NoSignChange", low: 0, high: 1, atLow: 1, atHigh: 2 },
  TooFewSections: { type: "TooFewSections", got: 1, needed: 2 },
  SectionsAtOnePlace: { type: "SectionsAtOnePlace", x: 10 },
  EmptySection: { type: "EmptySection", x: 10 },
  NegativeHalfBreadth: { type: "NegativeHalfBreadth", x: 10, halfBreadth: -1, z: 2 },
  SectionFromDeckToKeel: { type: "SectionFromDeckToKeel", x: 10, area: -5 },
  HullWithoutVolume: { type: "HullWithoutVolume", sections: 2 },
  OutsideHydrostaticTable: { type: "OutsideHydrostaticTable", quantity: "draft", value: 5, ...m },
  EmptyHydrostaticTable: { type: "EmptyHydrostaticTable", rows: 0 },
  RepeatedDraft: { type: "RepeatedDraft", draft: 2, trim: 0 },
  EmptyTankTable: { type: "EmptyTankTable", tank: "FO" },
  FreeSurfaceUnknown: { type: "FreeSurfaceUnknown", tank: "FO", level: 1 },
  RepeatedTankLevel: { type: "RepeatedTankLevel", tank: "FO", level: 1, trim: 0 },
  OutsideTankTable: { type: "OutsideTankTable", tank: "FO", quantity: "level", value: 5, asRead: 5, ...m },
  NoWaterSamples: { type: "NoWaterSamples", got: 0, needed: 1 },
  UnknownHydrometer: { type: "UnknownHydrometer", hydrometer: "H1", place: "aft" },
  UnknownMark: { type: "UnknownMark", mark: "AP" },
  MarkReadTwice: { type: "MarkReadTwice", mark: "AP" },
  OutsideMarkTable: { type: "OutsideMarkTable", mark: "AP", value: 5, ...m },
  TooFewMarks: { type: "TooFewMarks", got: 2, needed: 3 },
  MarksAtOneLength: { type: "MarksAtOneLength", x: 10, marks: 3 },
  MarksAtOneBreadth: { type: "MarksAtOneBreadth", y: 0, marks: 3 },
  MarksInOneLine: { type: "MarksInOneLine", marks: 3 },
  NoWaterInHull: { type: "NoWaterInHull", keel: 0, draftAtAp: -1, slopeAlong: 0 },
  HullUnderWater: { type: "HullUnderWater", top: 5, draftAtAp: 9, slopeAlong: 0 },
  NoBalance: { type: "NoBalance", draftGap: 1, trimArm: 2, heelArm: 3 },
  VolumeOutOfReach: { type: "VolumeOutOfReach", volume: 9, smallest: 0, largest: 5 },
  UnstableAtRest: { type: "UnstableAtRest", gmTransverse: -0.1, gmLongitudinal: 80, tanHeel: 0 },
  TooFewTurningPoints: { type: "TooFewTurningPoints", got: 2, needed: 3 },
  NoMarks: { type: "NoMarks" },
  WrongKindOfValue: { type: "WrongKindOfValue", instrument: "inclinometer", needed: "valuesDegrees" },
  ZeroLength: { type: "ZeroLength", length: 0 },
  UnknownStation: { type: "UnknownStation", station: "Z", path: "readings.battens[0].station" },
  NoZeroReading: { type: "NoZeroReading", station: "I", series: 2 },
  NoReferenceMove: { type: "NoReferenceMove", path: "moves" },
  NoPosition: { type: "NoPosition", weight: "W1", move: 3 },
  NoBattenReadings: { type: "NoBattenReadings" },
  NoSpreadInMoment: { type: "NoSpreadInMoment", points: 4, moments: [0] },
  UncertaintyNotPositive: { type: "UncertaintyNotPositive", uncertainty: 0 },
  TooFewMoves: { type: "TooFewMoves", got: 2, needed: 3 },
  HeelAgainstMoment: { type: "HeelAgainstMoment", slope: -0.001 },
  NoSounding: { type: "NoSounding", tank: "FO" },
  NoBallastSounding: { type: "NoBallastSounding", tank: "BW", move: 2 },
  TermsMissing: { type: "TermsMissing", wanted: "gmFluid", missing: ["weight", "distance"] },
  TermIsZero: { type: "TermIsZero", wanted: "gmFluid", zero: ["deflection"] },
  NoOffsets: { type: "NoOffsets", path: "hydrostatics" },
  NoRestExpected: { type: "NoRestExpected", move: 2, vcg: 6.4 },
  NothingLeft: { type: "NothingLeft", mass: -3 },
  NotJson: { type: "NotJson", reason: "unexpected end", path: "record" },
  NotAsNeeded: { type: "NotAsNeeded", needed: "a number", given: "null", path: "vessel.lbp" },
  UnknownKey: { type: "UnknownKey", key: "colour", path: "vessel.colour" },
  RepeatedName: { type: "RepeatedName", name: "A", first: "stations[0].id", path: "stations[1].id" },
  UnknownReference: { type: "UnknownReference", kind: "move", name: "9", path: "readings.battens[0].move" },
  SoundingWithoutPlace: { type: "SoundingWithoutPlace", given: "both", path: "readings.soundings[0]" },
  NotBallast: { type: "NotBallast", tank: "FO", path: "readings.soundings[0].move" },
  FileTooLarge: { type: "FileTooLarge", got: 20 * 1024 * 1024, most: 5 * 1024 * 1024 },
  EmptyFile: { type: "EmptyFile" },
  NotASpreadsheet: { type: "NotASpreadsheet", kind: "program" },
  NotAWorkbook: { type: "NotAWorkbook", holds: "open-document" },
  BrokenWorkbook: { type: "BrokenWorkbook", part: "xl/workbook.xml" },
  WorkbookUnpacksTooLarge: { type: "WorkbookUnpacksTooLarge", got: 9e8, most: 6e7 },
  BrokenCsv: { type: "BrokenCsv", line: 7 },
  SheetTooLarge: { type: "SheetTooLarge", sheet: "Tanks", cell: "A20001" },
  EmptyCell: { type: "EmptyCell", ...inSheet },
  NotANumber: { type: "NotANumber", given: "abc", ...inSheet },
  OtherDecimalMark: { type: "OtherDecimalMark", given: "1,5", mark: "point", ...inSheet },
  FormulaCell: { type: "FormulaCell", formula: "=A1*2", ...inSheet },
  ErrorCell: { type: "ErrorCell", error: "#N/A", ...inSheet },
  DateCell: { type: "DateCell", ...inSheet },
  ColumnMissing: { type: "ColumnMissing", ...inSheet },
  RowsMissing: { type: "RowsMissing", got: 1, needed: 2, ...inSheet },
  OutOfLimits: { type: "OutOfLimits", value: -1, limit: "above 0", ...inSheet },
  OutOfOrder: { type: "OutOfOrder", value: 0.4, before: 0.5, order: "rise", ...inSheet },
  NotAbove: { type: "NotAbove", value: 1, other: "KB", than: 2, ...inSheet },
  TooManyWords: { type: "TooManyWords", got: 80, most: 60, ...inSheet },
  RepeatedInSheet: { type: "RepeatedInSheet", what: "level", first: "A3", ...inSheet },
  SectionInTwoPlaces: { type: "SectionInTwoPlaces", x: 12, first: "A3", ...inSheet },
  HullInSheet: { type: "HullInSheet", because: { type: "EmptySection", x: 10 }, ...inSheet },
  TankInSheet: { type: "TankInSheet", because: { type: "FreeSurfaceUnknown", tank: "FO", level: 1 }, ...inSheet },
};

describe("refusals in words", () => {
  it.each(Object.values(everyRefusal))("$type is one plain sentence", (refusal) => {
    const sentence = refusalSentence(refusal);
    expect(sentence).toMatch(/^[A-Z0−\d].{10,}[^.]\.$/);
    expect(sentence).not.toMatch(/undefined|NaN|\[object|the data do not allow/);
  });

  it("name the sheet and the cell they are about, or the cell alone where it was typed", () => {
    expect(refusalSentence(everyRefusal.NotANumber)).toBe("Sheet “Tanks”, cell C14: “abc” is not a number (Volume).");
    expect(refusalSentence({ ...everyRefusal.OutOfOrder, sheet: "" } as KnownRefusal)).toBe(
      "Cell C14: 0.4 comes after 0.5, but must rise from row to row (Volume).",
    );
  });

  it("carry the numbers that caused them", () => {
    expect(refusalSentence(everyRefusal.OutsideHydrostaticTable)).toBe(
      "The draft of 5 m lies outside the hydrostatic table, which runs from 1 m to 4 m.",
    );
    expect(refusalSentence(everyRefusal.TermsMissing)).toBe("The GM needs the weight and the distance.");
  });

  it("stand behind their place in a record", () => {
    expect(refusalLine({ ...everyRefusal.TooFewTurningPoints, path: "readings.battens[3].valuesMm" })).toBe(
      "readings.battens[3].valuesMm: at least 3 turning points, 2 given",
    );
    expect(refusalLine(everyRefusal.TooFewMoves)).toBe("record: at least 3 moves that were read, 2 given");
  });

  it("are found for what our functions refuse", () => {
    const refused = [linearFit([1], [1]), hullFromOffsets({ sections: [] }), classicalTerm("weight", {})];
    const sentences = refused.map((result) => (result.ok ? "" : refusalSentence(result.refusal)));
    expect(sentences).toEqual([
      "A line needs at least 3 points, 1 given.",
      "A hull needs at least 2 sections, 0 given.",
      "The weight needs the GM and the displacement and the deflection and the distance and the length.",
    ]);
  });

  it("say so where a refusal is of another part of the program", () => {
    expect(refusalSentence({ type: "SomethingElse" })).toBe("The data do not allow it (SomethingElse).");
  });
});
