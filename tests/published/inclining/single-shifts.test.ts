import { describe, expect, it } from "vitest";
import { type ClassicalTerm, type ClassicalTerms, classicalTerm } from "@/lib/inclining/classical-relation";
import { promised } from "@/lib/result";

type Shift = {
  readonly name: string;
  readonly given: Partial<ClassicalTerms>;
  readonly wanted: ClassicalTerm;
  readonly published: number;
  /** half of the last digit that is printed, unless said otherwise */
  readonly within: number;
};

// The relation holds in any consistent units: tons with feet, tonnes with metres.

/** Source: a fluid mechanics textbook, example 2.7, p. 56; Nicholls's Seamanship and Nautical Knowledge, printed pages 532 and 536. */
const seen: readonly Shift[] = [
  {
    name: "2000 tons, 15 tons over 24 ft, 3 in on a pendulum of 5 ft",
    given: { displacement: 2000, weight: 15, distance: 24, deflection: 3 / 12, length: 5 },
    wanted: "gmFluid",
    published: 3.6,
    within: 0.05,
  },
  {
    name: "9000 tons, 100 tons over 30 ft, heel of 8°",
    given: { displacement: 9000, weight: 100, distance: 30, tanHeel: tangent(8) },
    wanted: "gmFluid",
    published: 2.37,
    within: 0.005,
  },
];

/** Source: Derrett, Ship Stability for Masters and Mates, chapter on the inclining experiment, examples and exercise; from memory. */
const recalled: readonly Shift[] = [
  {
    name: "example 1: GM",
    given: { displacement: 8000, weight: 25, distance: 15, deflection: 0.2, length: 4 },
    wanted: "gmFluid",
    published: 0.94,
    within: 0.005,
  },
  {
    name: "example 2: displacement",
    given: { gmFluid: 0.6, weight: 10, distance: 12, deflection: 0.25, length: 10 },
    wanted: "displacement",
    published: 8000,
    within: 0.5,
  },
  {
    name: "exercise 1: deflection",
    given: { displacement: 8000, gmFluid: 7.3 - 6.1, weight: 25, distance: 15, length: 4 },
    wanted: "deflection",
    published: 0.156,
    within: 0.0005,
  },
  {
    name: "exercise 2: displacement",
    given: { gmFluid: 1, weight: 10, distance: 12, tanHeel: tangent(3.5) },
    wanted: "displacement",
    published: 1962,
    within: 0.6,
  },
  {
    name: "exercise 2: length",
    given: { deflection: 0.25, tanHeel: tangent(3.5) },
    wanted: "length",
    published: 4.09,
    within: 0.005,
  },
  {
    name: "exercise 3: GM of 6.1 − 4.58 m",
    given: { displacement: 3150, weight: 15, distance: 10, deflection: 0.25, length: 8 },
    wanted: "gmFluid",
    published: 6.1 - 4.58,
    within: 0.005,
  },
  {
    name: "exercise 4: displacement",
    given: { gmFluid: 0.5, weight: 25, distance: 10, deflection: 0.4, length: 4 },
    wanted: "displacement",
    published: 5000,
    within: 0.5,
  },
  {
    name: "exercise 5: deflection",
    given: { displacement: 2304, gmFluid: 1.2, weight: 15, distance: 10, length: 7.2 },
    wanted: "deflection",
    published: 0.39,
    within: 0.001,
  },
  {
    name: "exercise 6: distance",
    given: { displacement: 4000, gmFluid: 10.2 - 7, weight: 12, deflection: 0.075, length: 7.5 },
    wanted: "distance",
    published: 10.67,
    within: 0.005,
  },
  {
    name: "exercise 9: GM",
    given: { displacement: 8000, weight: 4, distance: 19, deflection: 0.12, length: 6 },
    wanted: "gmFluid",
    published: 0.475,
    within: 0.0005,
  },
];

/** Source: Reed's Naval Architecture, an inclining of 4300 t from which the distance is asked; from memory. */
const inverse: Shift = {
  name: "4300 t: distance of 14 m",
  given: { displacement: 4300, gmFluid: 7.25 - 5.46, weight: 6, deflection: 0.12, length: 11 },
  wanted: "distance",
  published: 14,
  // the VCG used here was itself rounded to the centimetre, by 0.0007 m: 0.005 m of distance
  within: 0.02,
};

/**
 * Sources: Barrass and Derrett, exercises 14.2 and 14.4 (tawhid07.blogspot.com); marineteacher.com, chapter 11;
 * Nicholls's Seamanship and Nautical Knowledge, printed page 536.
 */
const lists: readonly Shift[] = [
  {
    name: "1500 t, 10 t over 10 m: 9° 27′",
    given: { displacement: 1500, gmFluid: 3.1 - 2.7, weight: 10, distance: 10 },
    wanted: "tanHeel",
    published: 9.45,
    // printed to the minute, truncated from 9° 27.7′
    within: 1 / 60,
  },
  {
    name: "5000 t, 20 t over 5 m",
    given: { displacement: 5000, gmFluid: 0.3, weight: 20, distance: 5 },
    wanted: "tanHeel",
    published: 3.8,
    within: 0.05,
  },
  {
    name: "8000 t, four shifts of together 1200 t·m",
    given: { displacement: 8000, gmFluid: 2, weight: 1, distance: 200 * 4 - 100 * 2 - 100 * 4 + 50 * 20 },
    wanted: "tanHeel",
    published: 4.29,
    within: 0.005,
  },
  {
    name: "1600 tons, 8 tons over 20 ft: 3° 49′",
    given: { displacement: 1600, gmFluid: 11.5 - 10, weight: 8, distance: 20 },
    wanted: "tanHeel",
    published: 3.8166666666666664,
    within: 0.5 / 60,
  },
];

describe("published single shifts", () => {
  it.each([...seen, ...recalled, inverse])("$name", ({ given, wanted, published, within }) => {
    expect(Math.abs(promised(classicalTerm(wanted, given)) - published)).toBeLessThanOrEqual(within);
  });

  it.each(lists)("list: $name", ({ given, wanted, published, within }) => {
    const degrees = (Math.atan(promised(classicalTerm(wanted, given))) * 180) / Math.PI;
    expect(Math.abs(degrees - published)).toBeLessThanOrEqual(within);
  });

  it("4515 t listed 2°: 15 t go 4.2 m", () => {
    const distance = classicalTerm("distance", { displacement: 4515, gmFluid: 5.8 - 5.4, weight: 15, tanHeel: tangent(2) });
    expect(Math.abs(promised(distance) - 4.2)).toBeLessThanOrEqual(0.05);
  });

  it("1500 t, 10 t over 10 m: G moves 0.0667 m across", () => {
    const tanHeel = promised(classicalTerm("tanHeel", { displacement: 1500, gmFluid: 0.4, weight: 10, distance: 10 }));
    expect(0.4 * tanHeel).toBeCloseTo(0.0667, 4);
  });
});

/** Source: Nicholls's Seamanship and Nautical Knowledge, printed pages 527 and 536. */
describe("published righting moments at small heel", () => {
  it.each([
    { name: "5000 tons at 7°", displacement: 5000, gmFluid: 18 - 15.8, degrees: 7, published: 1340, within: 1 },
    // the printed moment uses the lever rounded to 0.306 ft; the unrounded one gives 1837.1
    { name: "6000 tons at 8°", displacement: 6000, gmFluid: 16 - 13.8, degrees: 8, published: 1836, within: 1.5 },
  ])("$name", ({ displacement, gmFluid, degrees, published, within }) => {
    // the shift that holds her there, as seen by the heeled ship: w·d·cos θ = Δ·GM·sin θ
    const shift = promised(classicalTerm("weight", { displacement, gmFluid, distance: 1, tanHeel: tangent(degrees) }));
    expect(Math.abs(shift * Math.cos((degrees * Math.PI) / 180) - published)).toBeLessThanOrEqual(within);
  });
});

function tangent(degrees: number): number {
  return Math.tan((degrees * Math.PI) / 180);
}
