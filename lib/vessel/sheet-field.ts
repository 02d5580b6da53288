import type { DecimalMark } from "@/lib/spreadsheet/number-in-cell";
import { inOwnUnit, type Quantity, toNano } from "./units";

/** What a column of a sheet may hold. */
export type Field<Key extends string = string> = {
  readonly key: Key;
  readonly label: string;
  readonly quantity: Quantity;
  /** the headings that mean it, in small letters without units and signs */
  readonly headings: RegExp;
  readonly isOptional?: true;
  /** counted from where, or towards where, the sheet says */
  readonly axis?: "along" | "athwart" | "trim";
  readonly limit?: Limit;
};
export type Limit = "above 0" | "0 or more";

/** How the numbers of a sheet are meant: what its headings do not say. */
export type Reading = {
  readonly mark: DecimalMark;
  /** of the liquid that tonnes are of, where a volume, an area or a surface is given by mass [t/m³] */
  readonly density: number;
  readonly alongFrom: AlongFrom;
  readonly athwart: "starboard" | "port";
  readonly trimBy: "stern" | "bow";
  readonly lbp: number;
};
export type AlongFrom = "ap" | "midships-forward" | "midships-aft" | "fp-aft";

/** Numbers in the frame of the ship, tonnes of sea water. */
export function usualReading(lbp: number): Reading {
  return { mark: "point", density: 1.025, alongFrom: "ap", athwart: "starboard", trimBy: "stern", lbp };
}

/** A value of a field in the program's units and in the ship's frame: x forward of AP, y to starboard, trim by the stern. */
export function valueInFrame(value: number, field: Field, unit: string, reading: Reading): number {
  const own = inOwnUnit(value, field.quantity, unit, reading.density);
  switch (field.axis) {
    case "along":
      return alongInFrame(own, reading);
    case "athwart":
      return reading.athwart === "port" ? toNano(0 - own) : own;
    case "trim":
      return reading.trimBy === "bow" ? toNano(0 - own) : own;
    default:
      return own;
  }
}

function alongInFrame(x: number, { alongFrom, lbp }: Reading): number {
  switch (alongFrom) {
    case "ap":
      return x;
    case "midships-forward":
      return toNano(lbp / 2 + x);
    case "midships-aft":
      return toNano(lbp / 2 - x);
    case "fp-aft":
      return toNano(lbp - x);
  }
}
