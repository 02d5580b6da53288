import { describe, expect, it } from "vitest";
import { incliningTest } from "@/lib/inclining/inclining-test";
import { type LightshipItem, lightshipBalance, lightshipOf } from "@/lib/lightship/lightship";
import { promised } from "@/lib/result";
import { sampleTest } from "../inclining/sample-test";

const test = sampleTest({
  aboard: [
    { label: "wheelhouse", mass: 0.5, x: 40, y: 0, z: 9 },
    { label: "boat's party, for the drafts", mass: 0.2, x: 30, y: 0, z: 6, during: "drafts" },
    { label: "deck gang, for the moves", mass: 0.3, x: 30, y: 0, z: 6, during: "moves" },
  ],
});
const ship = promised(incliningTest(test));
const items: LightshipItem[] = [
  { action: "deduct", label: "staging", mass: 2, x: 10, y: 1, z: 6 },
  { action: "add", label: "chain", mass: 3, x: 55, y: 0, z: 2 },
  { action: "relocate", label: "cover", mass: 4, x: 20, y: 2, z: 5, toX: 40, toY: 0, toZ: 6 },
];

describe("from as inclined to lightship", () => {
  const balance = promised(lightshipBalance(ship, { ...test, items }));

  it("takes off the test weights where they stood at move 0", () => {
    expect(balance.testWeights).toEqual({ mass: 20, along: 600, athwart: 0, upward: 100 });
  });

  it("takes off those who were aboard for the drafts, to which the ship as inclined belongs", () => {
    expect(balance.persons.mass).toBeCloseTo(0.7, 12);
    expect(balance.persons.upward).toBeCloseTo(0.5 * 9 + 0.2 * 6, 12);
  });

  it("takes off, puts aboard and shifts the items", () => {
    expect(balance.deducted).toEqual({ mass: 2, along: 20, athwart: 2, upward: 12 });
    expect(balance.added).toEqual({ mass: 3, along: 165, athwart: 0, upward: 6 });
    expect(balance.relocated).toEqual({ mass: 0, along: 80, athwart: -8, upward: 4 });
  });

  it("leaves the lightship, mass and moments", () => {
    const { displacement, vcg, lcg } = ship.asInclined;
    const left = lightshipOf(balance);
    expect(left.displacement).toBeCloseTo(displacement - 20 - 0.7 - 2 + 3, 9);
    expect(left.vcg).toBeCloseTo((displacement * vcg - 100 - 5.7 - 12 + 6 + 4) / left.displacement, 9);
    expect(left.lcg).toBeCloseTo((displacement * lcg - 600 - 26 - 20 + 165 + 80) / left.displacement, 9);
    expect(left.tcg).toBeCloseTo((-2 - 8) / left.displacement, 9);
  });

  it("refuses to take off more than floats", () => {
    const heavy: LightshipItem[] = [{ action: "deduct", label: "a mistyped mass", mass: 2000, x: 0, y: 0, z: 0 }];
    expect(lightshipBalance(ship, { ...test, items: heavy })).toMatchObject({ ok: false, refusal: { type: "NothingLeft" } });
  });
});
