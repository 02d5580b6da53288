import { expect, it } from "vitest";
import { usualLimits } from "@/lib/inclining/checks/check-limits";
import { completeness } from "@/lib/lightship/completeness";

const place = { label: "x", x: 1, y: 0, z: 1 };
const lightship = { displacement: 1000, lcg: 30, tcg: 0, vcg: 5 };

it.each([
  [20, 40, ["met", "met"]],
  [20.1, 40, ["attention", "met"]],
  [0, 40.1, ["met", "attention"]],
])("a ship of 1000 t that lacks %f t and has %f t too much", (lacks, over, verdicts) => {
  const findings = completeness(
    [
      { ...place, action: "add", mass: lacks },
      { ...place, action: "deduct", mass: over },
      { ...place, action: "relocate", mass: 500, toX: 2, toY: 0, toZ: 1 },
    ],
    lightship,
    usualLimits,
  );
  expect(findings.map(({ verdict }) => verdict)).toEqual(verdicts);
  expect(findings.map(({ found }) => found)).toEqual([lacks, over].map((mass) => ({ share: expect.closeTo(mass / 1000, 12) })));
});
