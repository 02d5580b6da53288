import { describe, expect, it } from "vitest";
import { usualLimits } from "@/lib/inclining/checks/check-limits";
import type { CheckedTest } from "@/lib/inclining/checks/checked-test";
import { slackLevels, slackTanks } from "@/lib/inclining/checks/tank-checks";
import type { Liquid } from "@/lib/inclining/liquids";
import { sampleTest } from "../sample-test";

function liquid(id: string, lcg: number, tcg: number, change: Partial<Liquid> = {}): Liquid {
  return { id, density: 1, mass: 5, volume: 5, lcg, tcg, vcg: 0.5, freeSurfaceInertia: 8, level: 0.5, ...change };
}

function tank(id: string, change: Partial<CheckedTest["tanks"][number]> = {}): CheckedTest["tanks"][number] {
  const row = { lcg: 20, tcg: 0, vcg: 0.5 };
  const table = [
    { ...row, level: 0, volume: 0, inertia: 0 },
    { ...row, level: 1, volume: 10, inertia: 8 },
  ];
  return { id, density: 1, measure: "sounding", table, ...change };
}

const withTanks = (...tanks: CheckedTest["tanks"]): CheckedTest => ({ ...sampleTest(), tanks });

describe("slack tanks", () => {
  const test = withTanks(tank("P"), tank("S"), tank("C"), tank("B", { shifts: true }));
  const [port, starboard, centre] = [liquid("P", 20, -3), liquid("S", 20, 3), liquid("C", 40, 0)];

  it.each([
    ["none", [], 0, "met"],
    ["one on the centreline", [centre], 1, "met"],
    ["a pair", [port, starboard], 1, "met"],
    ["a pair and one more", [port, centre, starboard], 2, "attention"],
    ["two of one side", [port, liquid("S", 20, -4)], 2, "attention"],
    ["two apart along the ship", [port, liquid("S", 30, 3)], 2, "attention"],
  ] as const)("%s", (_, liquids, groups, verdict) => {
    expect(slackTanks(test, liquids, usualLimits)).toMatchObject({ verdict, found: { groups, slack: liquids.map(({ id }) => id) } });
  });

  it("are not those without a free surface, nor ballast that shifts", () => {
    const liquids = [liquid("P", 20, -3, { freeSurfaceInertia: 0 }), liquid("B", 30, 0), centre];
    expect(slackTanks(test, liquids, usualLimits)).toMatchObject({ verdict: "met", found: { slack: ["C"] } });
  });
});

describe("filling of slack tanks", () => {
  it.each([
    ["deep", 2, "met"],
    ["deep", 8.1, "attention"],
    ["double-bottom", 4, "met"],
    ["double-bottom", 3.9, "attention"],
  ] as const)("a %s tank of 10 m³ with %f m³ is %s", (kind, volume, verdict) => {
    const [finding] = slackLevels(withTanks(tank("T", { kind })), [liquid("T", 20, 0, { volume })], usualLimits);
    expect(finding?.verdict).toBe(verdict);
    const outside = verdict === "met" ? [] : [{ tank: "T", filled: expect.closeTo(volume / 10, 12) }];
    expect(finding?.found).toEqual({ outside, judged: 1 });
  });

  it("is not judged of tanks whose kind is not known", () => {
    expect(slackLevels(withTanks(tank("T")), [liquid("T", 20, 0)], usualLimits)).toEqual([]);
  });
});
